import { describe, expect, it } from 'vitest';
import { bases } from '@shared/engine/index.ts';
import {
  type Check,
  printed,
  rounding,
  threeFigures,
  toleranceOf,
  verdictOf,
} from '@shared/verification/check.ts';
import { disagreements, notYetAnswered } from '@shared/verification/disagreements.ts';
import { checks } from '@shared/verification/registry.ts';

describe('the engine gives the published value', () => {
  it.each(checks.map((check) => [`${check.id}: ${check.source}`, check] as const))('%s', (_name, check) => {
    const { ours, difference, tolerance } = verdictOf(check);
    expect(ours).toBeGreaterThan(0);
    expect(Math.abs(difference), `ours ${ours}`).toBeLessThanOrEqual(tolerance * (1 + 1e-9));
  });
});

describe('the registry', () => {
  const of = (basis: string, evidence: string) =>
    checks.filter((check) => check.basis === basis && check.evidence === evidence).length;

  it('names each check once, with its source, inputs and clause', () => {
    expect(new Set(checks.map(({ id }) => id)).size).toBe(checks.length);
    for (const { id, source, inputs, clause } of checks) {
      expect(Math.min(source.length, inputs.length, clause.length), id).toBeGreaterThan(1);
    }
  });

  it('rests on values from outside: 120 at least, and on printed ones in every basis', () => {
    const outside = checks.filter(({ evidence }) => evidence !== 'rule evaluation');
    expect(outside.length).toBeGreaterThanOrEqual(120);
    const counts = bases.map(({ id }) => `${id} ${of(id, 'found in text')}`);
    console.info(`found in text: ${counts.join(', ')}`);
    for (const { id } of bases) expect(of(id, 'found in text'), id).toBeGreaterThanOrEqual(20);
  });

  it('says of every disagreement what the source prints and why', () => {
    for (const { id, published, reason } of [...disagreements, ...notYetAnswered]) {
      expect(Math.min(published.length, reason.length), id).toBeGreaterThan(10);
    }
  });
});

describe('a tolerance', () => {
  const check = (published: Check['published'], roundedFirst?: Check['roundedFirst']): Check => ({
    id: 'x',
    basis: 'en-1993-1-8-2005',
    clause: '',
    source: '',
    evidence: 'found in text',
    inputs: '',
    unit: '',
    published,
    ours: () => 94.151,
    ...(roundedFirst === undefined ? {} : { roundedFirst }),
  });

  it('is half a unit of the last printed place', () => {
    expect(toleranceOf(check(printed('94.1')))).toBeCloseTo(0.05, 12);
    expect(toleranceOf(check(printed('0.620')))).toBeCloseTo(0.0005, 12);
    expect(toleranceOf(check(threeFigures(2220)))).toBe(5);
    expect(toleranceOf(check(threeFigures(53.04)))).toBeCloseTo(0.05, 12);
  });

  it('refuses what lies beyond it, and takes only the share of a rounded intermediate more', () => {
    expect(verdictOf(check(printed('94.1'))).agrees).toBe(false);
    expect(verdictOf(check(printed('94.2'))).agrees).toBe(true);
    expect(verdictOf(check(printed('94.1'), rounding('half', 0.5002, 0.5))).agrees).toBe(true);
  });
});
