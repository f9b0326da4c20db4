import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { boltGroup, boltPattern } from '@shared/engine/groups/bolt-group.ts';
import {
  elasticBoltForces,
  elasticBoltMultiplier,
  worstElasticBolt,
} from '@shared/engine/groups/bolt-group-elastic.ts';
import { boltGroupIc } from '@shared/engine/groups/bolt-group-ic.ts';
import { unitLoadThrough, type GroupLoad } from '@shared/engine/groups/group-load.ts';
import { coefficientsOf } from '@shared/engine/groups/ic-cache.ts';
import { weldGroup } from '@shared/engine/groups/weld-group.ts';
import { worstElasticWeld } from '@shared/engine/groups/weld-group-elastic.ts';
import { weldGroupIc } from '@shared/engine/groups/weld-group-ic.ts';
import { boltCases, boltLines, weldCases } from './support/group-cases.ts';
import {
  centreHolds,
  elasticBalances,
  elasticIsBelow,
  fallsWithDistance,
  turnsAlong,
  weldCentreHolds,
} from './support/group-properties.ts';

const strength = (points: ReturnType<typeof boltPattern>, load: GroupLoad) => {
  const found = boltGroupIc(boltGroup(points), load);
  if (!found.ok) throw new Error(found.reason);
  return found;
};

describe('the instantaneous centre of bolts', () => {
  it('is found for every pattern and load, on a bolt or beside one too; forces and moment balance', () => {
    fc.assert(fc.property(boltCases, centreHolds), { numRuns: 4000 });
  });

  it('is not below the elastic method by more than the normalisation', () => {
    fc.assert(fc.property(boltLines, elasticIsBelow), { numRuns: 1500 });
  });

  it('turns with the group, and falls as the load moves away', () => {
    const angle = fc.double({ min: 0, max: 2 * Math.PI, noNaN: true });
    const further = fc.double({ min: 0, max: 500, noNaN: true });
    fc.assert(fc.property(boltLines, angle, turnsAlong), { numRuns: 500 });
    fc.assert(fc.property(boltLines, further, fallsWithDistance), { numRuns: 500 });
  });

  it('is the other bolt where the load passes through one of two, which carries it all', () => {
    // By hand: R(Δ_max) = (1 - e^-3.4)^0.55 = 0.9666267^0.55 = 0.981505, and nothing in the other.
    const found = strength(boltPattern(2, 1, 80, 0), { fx: 1, fy: 0, moment: -40 });
    expect(found.multiplier).toBeCloseTo(0.981505, 6);
    expect(found.centre?.y).toBeCloseTo(-40, 6);
    expect(Math.hypot(found.forces[0]!, found.forces[1]!)).toBeLessThan(1e-9);
    expect(found.forces[2]).toBeCloseTo(0.981505, 6);
  });

  it('is the middle bolt of three under a moment alone', () => {
    // By hand: C' = 2 · 0.981505 · 3 in = 5.889 in, which AISC Manual Table 7-6 prints as 5.89.
    const found = strength(boltPattern(3, 1, 3, 0), { fx: 0, fy: 0, moment: 1 });
    expect(found.multiplier).toBeCloseTo(5.88903, 5);
  });

  it.each([
    [8, 100, 150],
    [5, 130, 260],
    [10, 50, 275],
    [4, 130, 325],
  ])('is found although the elastic centre falls on a bolt: %d at %d mm, %d mm away', (rows, pitch, e) => {
    // The elastic centre is Σr²/(n e) from the middle: for the first 420 000/(8 · 150) = 350 mm, the outermost bolt.
    centreHolds({ group: boltGroup(boltPattern(rows, 1, pitch, 0)), load: { fx: 1, fy: 0, moment: e } });
  });

  it('of one bolt is its force, and no moment; of no load and no bolts there is none', () => {
    const one = boltGroup([{ x: 30, y: -7 }]);
    expect(boltGroupIc(one, unitLoadThrough(0.4, 30, -7))).toMatchObject({ ok: true });
    expect(boltGroupIc(one, unitLoadThrough(0.4, 0, 0))).toMatchObject({ reason: 'no-moment-resistance' });
    expect(boltGroupIc(one, { fx: 0, fy: 0, moment: 0 })).toMatchObject({ reason: 'no-load' });
    const two = boltGroup(boltPattern(2, 1, 70, 0));
    expect(boltGroupIc(two, { fx: 0, fy: 0, moment: 0 })).toMatchObject({ reason: 'no-load' });
    expect(boltGroupIc(two, { fx: NaN, fy: 0, moment: 0 })).toMatchObject({ reason: 'no-load' });
    expect(boltGroupIc(boltGroup([]), { fx: 1, fy: 0, moment: 0 })).toMatchObject({ reason: 'no-group' });
  });

  it('is kept by pattern and load line: the second time is the first', () => {
    const cached = coefficientsOf(4, 2, 75, 60, 'ultimate');
    expect(coefficientsOf(4, 2, 75, 60, 'ultimate')).toBe(cached);
    const direct = strength(boltPattern(4, 2, 75, 60), { fx: 0.6, fy: 0.8, moment: 90 });
    expect(cached.coefficient(0.8, 90)).toBeCloseTo(direct.multiplier, 12);
    expect(cached.coefficient(-0.8, -90)).toBe(cached.coefficient(0.8, 90));
    expect(coefficientsOf(1, 1, 70, 0, 'ultimate').coefficient(1, 60)).toBe(0);
  });

  it('has the same coefficient whichever way force and moment point', () => {
    const of = (fx: number, fy: number, moment: number) =>
      strength(boltPattern(5, 2, 70, 60), { fx, fy, moment }).multiplier;
    for (const [fx, fy, moment] of [
      [0.6, 0.8, -90],
      [-0.6, 0.8, 90],
      [0.6, -0.8, 90],
      [-0.6, -0.8, -90],
    ] as const) {
      expect(of(fx, fy, moment)).toBeCloseTo(of(0.6, 0.8, 90), 9);
    }
  });
});

describe('the elastic method', () => {
  it('balances the load and the moment', () => {
    fc.assert(fc.property(boltLines, elasticBalances), { numRuns: 500 });
  });

  it('gives bolts at one place a force and no moment, and a group without members nothing', () => {
    const one = boltGroup([{ x: 10, y: 20 }]);
    expect(worstElasticBolt(one, unitLoadThrough(1, 10, 20)).force).toBeCloseTo(1, 12);
    expect(worstElasticBolt(one, { fx: 0, fy: 1, moment: 0 }).force).toBe(Infinity);
    expect(elasticBoltMultiplier(one, { fx: 0, fy: 1, moment: 0 })).toBe(0);
    expect(elasticBoltMultiplier(boltGroup([]), { fx: 0, fy: 1, moment: 0 })).toBe(0);
    const forces = new Float64Array(2);
    elasticBoltForces(one, { fx: 0, fy: 1, moment: 0 }, forces);
    expect([...forces]).toEqual([Infinity, Infinity]);
    expect(worstElasticWeld(weldGroup([]), { fx: 0, fy: 1, moment: 0 })).toBe(Infinity);
  });
});

describe('the instantaneous centre of welds', () => {
  /** Two fillets across the load of `k` each, `L` apart. */
  const across = (k: number, L: number) =>
    weldGroup([0, L].map((y) => ({ from: { x: 0, y }, to: { x: k, y } })));

  it('is found for lines, pairs, channels, angles and boxes, and is worth 0.8 of the elastic method or more', () => {
    fc.assert(fc.property(weldCases, weldCentreHolds), { numRuns: 400 });
  });

  it('is found where the imbalance has a hollow beside it', () => {
    const group = across(127.22626624260437, 486.3582432968542);
    const load = { fx: 1, fy: 0, moment: 3638.0198651800156 - group.centroid.y };
    expect(weldGroupIc(group, load)).toMatchObject({ ok: true });
  });

  it('is that of the least load where several balance: fillets at 12.6° to a load through their middle', () => {
    // By hand: Δ_u = 1.087 · 18.6^-0.65 w = 0.16257 w, Δ_m = 0.209 · 14.6^-0.32 w = 0.08862 w, p = 1.8344,
    // [p (1.9 - 0.9 p)]^0.3 = 0.79055, 1 + 0.5 sin^1.5 12.6° = 1.05094: 0.83083 of the longitudinal strength of 200 mm
    // where the plate only moves; where it turns as well it balances at 0.98.
    const angle = (12.6 * Math.PI) / 180;
    const group = across(100, 300);
    const found = weldGroupIc(group, unitLoadThrough(angle, group.centroid.x, group.centroid.y));
    if (!found.ok) throw new Error(found.reason);
    const p = (1.087 * 18.6 ** -0.65) / (0.209 * 14.6 ** -0.32);
    const strengthThere = (1 + 0.5 * Math.sin(angle) ** 1.5) * (p * (1.9 - 0.9 * p)) ** 0.3;
    expect(strengthThere).toBeCloseTo(0.83083, 5);
    expect(found.multiplier / 200).toBeCloseTo(strengthThere, 6);
    expect(found.centre).toBeNull();
  });

  it('of no load and no weld is none', () => {
    expect(weldGroupIc(weldGroup([]), { fx: 1, fy: 0, moment: 0 })).toMatchObject({ reason: 'no-group' });
    expect(weldGroupIc(across(50, 80), { fx: 0, fy: 0, moment: 0 })).toMatchObject({ reason: 'no-load' });
    expect(weldGroupIc(across(50, 80), { fx: NaN, fy: 0, moment: 0 })).toMatchObject({ reason: 'no-load' });
  });
});
