import { spawnSync } from 'node:child_process';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { afterAll, describe, expect, it } from 'vitest';

const root = fileURLToPath(new URL('../..', import.meta.url));
const folder = mkdtempSync(join(tmpdir(), 'backmark-cases-'));
const MINUTE = 60_000;
afterAll(() => rmSync(folder, { recursive: true }));

function run(command: string, args: readonly string[], input = '') {
  const script = ['server/dev/run-cli.mjs', `server/cli/${command}.ts`, ...args];
  const { status, stdout, stderr } = spawnSync(process.execPath, script, {
    cwd: root,
    encoding: 'utf8',
    input,
    maxBuffer: 2 ** 28,
  });
  return { status, stdout, stderr };
}

function evaluate(cases: unknown) {
  const { status, stdout, stderr } = run('evaluate', ['-'], JSON.stringify(cases));
  expect(stderr).toBe('');
  expect(status).toBe(0);
  return JSON.parse(stdout);
}

const flatInTension = {
  kind: 'gusset-plate',
  basis: 'en-1993-1-8-2005',
  parameters: {
    plate_thickness: 12,
    plate_steel: { fy: 275, fu: 430 },
    member_steel: { fy: 275, fu: 430 },
    brace: 'flat',
    section: { shape: 'flat', width: 120, thickness: 10 },
    bolt_size: 'M20',
    bolt_grade: '8.8',
    rows: 4,
  },
  options: { threads: 'in_plane', fit_checks: 'waived' },
  angle: 0,
  sense: 'tension',
};

describe('npm run evaluate', { timeout: MINUTE }, () => {
  it('takes a band of load angles, and gives the lowest capacity anywhere in it', () => {
    const at = (angle: unknown) => ({ ...flatInTension, angle });
    const [band, ...single] = evaluate([at({ from: -20, to: 30 }), at(-20), at(0), at(17.3), at(30)]);
    expect(band).toMatchObject({ status: 'capacity', caution: expect.stringContaining('engineers') });
    expect(band.lowestAt).toBeGreaterThanOrEqual(-20);
    expect(band.lowestAt).toBeLessThanOrEqual(30);
    const [lowest] = evaluate([at(band.lowestAt)]);
    expect(band.capacity_kN).toBeCloseTo(lowest.capacity_kN, 6);
    for (const { capacity_kN } of single) {
      expect(capacity_kN).toBeGreaterThanOrEqual(band.capacity_kN - 1e-6);
    }
    const [wrong] = evaluate([at({ from: 30, to: 10 })]);
    expect(wrong).toMatchObject({ status: 'invalid', faults: [{ field: 'angle' }] });
  });

  it('answers each case in its order: capacity, broken rule, angle out of reach, faults', () => {
    const results = evaluate([
      flatInTension,
      { ...flatInTension, options: { pitch: 40 } },
      { ...flatInTension, angle: 95 },
      { ...flatInTension, parameters: { plate_thicknes: 12, rows: 1e9 }, sense: 'push', unit: 'kip' },
      null,
    ]);
    const [capacity, rejected, beyond, invalid, nothing] = results;
    const stateOf = (code: string) =>
      capacity.limitStates.find((state: { code: string }) => state.code === code);
    expect(capacity.status).toBe('capacity');
    // EN 1993-1-8 Table 3.4: 4 x 0.6 x 800 x 245/1.25 N; one plane through the threads.
    expect(stateOf('BS')).toMatchObject({
      capacity_kN: 376.32,
      applies: true,
      clause: 'EN 1993-1-8 Table 3.4',
    });
    // EN 1993-1-1 6.2.3: 120 x 10 x 275 N.
    expect(stateOf('MY').capacity_kN).toBe(330);
    // 0.9 x (120 - 22) x 10 x 430/1.25 N governs.
    expect(stateOf('MN').capacity_kN).toBeCloseTo(303.408, 9);
    expect(capacity).toMatchObject({ capacity_kN: stateOf('MN').capacity_kN, governing: { code: 'MN' } });
    expect(capacity.caution).toMatch(/licensed engineer/);
    expect(stateOf('GC')).toMatchObject({ capacity_kN: null, applies: false });
    // EN 1993-1-8 Table 3.3: 2.2 x 22 mm.
    expect(rejected.status).toBe('not-permitted');
    expect(rejected.rejections[0]).toMatchObject({ rule: 'pitch-least', value: 40, unit: 'mm' });
    expect(rejected.rejections[0].limit).toBeCloseTo(48.4, 9);
    expect(beyond).toMatchObject({ status: 'not-covered' });
    expect(invalid.status).toBe('invalid');
    expect(invalid.faults.map(({ field }: { field: string }) => field).sort()).toEqual([
      'plate_thicknes',
      'rows',
      'sense',
      'unit',
    ]);
    expect(nothing).toMatchObject({ status: 'invalid', faults: [{ field: 'case' }] });
  });

  it('reads one case from a file, and says why a name stands in two places', () => {
    const file = join(folder, 'one.json');
    writeFileSync(file, JSON.stringify({ ...flatInTension, options: { rows: 3 } }));
    const { status, stdout } = run('evaluate', [file]);
    expect(status).toBe(0);
    expect(JSON.parse(stdout)).toMatchObject([
      { status: 'invalid', faults: [{ field: 'options.rows', value: 3 }] },
    ]);
  });

  it('refuses factors that a basis would ignore, and takes those of a National Annex', () => {
    const [ignored, taken] = evaluate([
      { ...flatInTension, basis: 'sans-10162-1-2011', factors: { gammaM2: 1.1 } },
      { ...flatInTension, factors: { gammaM2: 1.1 } },
    ]);
    expect(ignored).toMatchObject({ status: 'invalid', faults: [{ field: 'factors' }] });
    const shear = taken.limitStates.find((state: { code: string }) => state.code === 'BS');
    expect(shear.capacity_kN).toBeCloseTo((4 * 0.6 * 800 * 0.245) / 1.1, 9);
  });

  it.each([
    ['no file named', [], '', /Name a JSON file/],
    ['a missing file', ['/nowhere/cases.json'], '', /no such file/],
    ['a folder', ['/'], '', /cannot be read/],
    ['nothing', ['-'], '  \n', /empty/],
    ['text', ['-'], 'kind: gusset-plate', /not JSON/],
    ['a number', ['-'], '42', /neither a case/],
  ])('ends with 2 and one line for %s', (_name, args, input, line) => {
    const { status, stdout, stderr } = run('evaluate', args, input);
    expect(status).toBe(2);
    expect(stdout).toBe('');
    expect(stderr).toMatch(line);
    expect(stderr.trimEnd().split('\n')).toHaveLength(1);
  });

  it('answers ten thousand cases in one call', () => {
    const many = Array.from({ length: 10_000 }, (_, index) => ({
      ...flatInTension,
      angle: (index % 161) - 80,
    }));
    const results = evaluate(many);
    expect(results).toHaveLength(10_000);
    expect(results[80].capacity_kN).toBe(results[80 + 161].capacity_kN);
  });
});

describe('npm run kinds', { timeout: MINUTE }, () => {
  it('prints what a case may hold', () => {
    const { status, stdout } = run('kinds', []);
    expect(status).toBe(0);
    const { kinds, bases, catalogueTypes } = JSON.parse(stdout);
    const gusset = kinds.find(({ id }: { id: string }) => id === 'gusset-plate');
    const pitch = gusset.parameters.find(({ name }: { name: string }) => name === 'pitch');
    expect(pitch).toMatchObject({ type: 'length', unit: 'mm', minimum: 10, maximum: 500, default: 70 });
    expect(pitch.meaning).toMatch(/along the brace/);
    expect(gusset.angle).toEqual({ unit: 'degrees', minimum: -80, maximum: 80 });
    expect(gusset.limitStates).toHaveLength(12);
    expect(bases.map(({ id }: { id: string }) => id)).toContain('sans-10162-1-2011');
    for (const { type } of gusset.parameters) {
      if (!['length', 'number', 'count', 'choice'].includes(type)) {
        expect(catalogueTypes[type].names.length, type).toBeGreaterThan(3);
        expect(catalogueTypes[type].forms[0].fields.length, type).toBeGreaterThan(0);
      }
    }
  });
});
