import { describe, expect, it } from 'vitest';
import { findKind, type ParameterValues } from '@shared/engine/index.ts';
import { broken, capacities, catalogue, plain, prepare } from './support/gusset.ts';

const CSA = 'csa-s16-2019';
const LRFD = 'aisc-360-2022-lrfd';
const ASD = 'aisc-360-2022-asd';

/** Every expected value is worked by hand from the clauses of the standard, beside the numbers it stands on. */
const AB = (Math.PI * 20 * 20) / 4;
/** Half width of the tapered plate at the first row, from 205 at the face to 33 + 47 at 468 mm, less half of the gauge. */
const SIDE = 80 + ((205 - 80) * (468 - 260)) / 468 - 33;
/** Half of the spread width: two pitches at 30 degrees and half of the gauge. */
const SPREAD = 150 * Math.tan(Math.PI / 6) + 33;

function expectAll(values: Readonly<Record<string, number>>, expected: Readonly<Record<string, number>>) {
  for (const [code, value] of Object.entries(expected)) expect(values[code]! / value, code).toBeCloseTo(1, 9);
}

describe('CSA S16:19, plain detail at 0°', () => {
  const mean = 0.6 * ((340 + 470) / 2);
  const meanBrace = 0.6 * ((345 + 460) / 2);

  it('every limit state in tension', () => {
    const block = 0.75 * (14 * (66 - 22) * 470 + 14 * 416 * mean);
    const oneSide = 0.75 * (0.6 * 14 * (66 + SIDE - 33) * 470 + 14 * 208 * mean);
    const strips = 0.75 * (14 * (2 * SIDE - 22) * 470 + 14 * 416 * mean);
    const tornOut = 0.75 * 14 * 4 * 208 * mean;
    const braceTwo = 0.75 * (0.6 * 12 * (66 - 22) * 460 + 12 * 404 * meanBrace);
    const braceOne = 0.75 * (0.6 * 12 * (66 + 39 - 33) * 460 + 12 * 202 * meanBrace);
    expectAll(capacities(CSA, plain, 0), {
      WM: 0.67 * 0.67 * (9 / Math.SQRT2) * 480 * 1.5 * 820,
      WB: 0.67 * 0.67 * 9 * 470 * 820,
      PW: 0.9 * 340 * 14 * 410,
      BS: 6 * 0.6 * 0.8 * 2 * AB * 800 * 0.7,
      GB: 6 * 3 * 0.8 * 14 * 20 * 470,
      MB: 6 * 3 * 0.8 * 24 * 20 * 460,
      GX: Math.min(block, oneSide, strips, tornOut),
      MX: 2 * Math.min(braceTwo, braceOne),
      WH: Math.min(0.9 * 340 * 14 * 2 * SPREAD, 0.75 * 470 * 14 * (2 * SPREAD - 44)),
      MN: 2 * 0.75 * 0.6 * (3010 - 2 * 22 * 12) * 460,
      MY: 0.9 * 2 * 3010 * 345,
    });
  });

  it('tear-out governs the block where the end distance is short and the plate wide', () => {
    const wide = { ...plain, lines: 1, gusset_end_distance: 34, rows: 2, gusset_edge_distance: 140 };
    expect(capacities(CSA, wide, 0).GX).toBeCloseTo(0.75 * 14 * 2 * (34 + 75) * mean, 3);
  });

  it('buckling of the strip, and the base metal left to a matching electrode', () => {
    const lambda = ((1.2 * 260 * Math.sqrt(12)) / 14 / Math.PI) * Math.sqrt(340 / 200_000);
    const { GC, MX } = capacities(CSA, plain, 0, 'compression');
    expect(GC).toBeCloseTo(0.9 * 14 * 2 * SPREAD * 340 * (1 + lambda ** 2.68) ** (-1 / 1.34), 3);
    expect(MX).toBe(Infinity);
    expect(capacities(CSA, { ...plain, electrode_match: 'matching' }, 0).WB).toBe(Infinity);
  });

  it('punched holes are deducted 2 mm more', () => {
    const { MN } = capacities(CSA, { ...plain, hole_making: 'punched' }, 0);
    expect(MN).toBeCloseTo(2 * 0.75 * 0.6 * (3010 - 2 * 24 * 12) * 460, 3);
  });
});

describe('ANSI/AISC 360-22, plain detail at 0°', () => {
  const v = 360 * AB * 2;
  const yielding: Record<string, number> = {
    PW: 340 * 14 * 410,
    MY: 345 * 2 * 3010,
  };
  const plate = (ant: number, length: number, planes: number) =>
    14 * Math.min(0.6 * 470 * (length - planes * 2.5 * 24), 0.6 * 340 * length) + 14 * 470 * ant;
  const brace = (ant: number, length: number, planes: number) =>
    12 * Math.min(0.6 * 460 * (length - planes * 2.5 * 24), 0.6 * 345 * length) + 12 * 460 * ant;
  const x = (160 * 12 + 100 * 100 - 12 * 12) / (2 * (160 + 100 - 12));
  const rupture: Record<string, number> = {
    WM: 0.6 * 480 * (9 / Math.SQRT2) * 1.5 * 820,
    WB: 470 * 7 * 820,
    BS: 6 * v,
    GB: 6 * v,
    MB: 6 * v,
    GX: Math.min(plate(66 - 24, 416, 2), plate(66 + SIDE - 36, 208, 1), plate(2 * SIDE - 24, 416, 2)),
    MX: 2 * Math.min(brace(66 - 24, 404, 2), brace(66 + 39 - 36, 202, 1)),
    MN: 2 * 460 * (1 - x / 150) * (3010 - 2 * 24 * 12),
  };

  it.each([
    [LRFD, 0.9, 0.75],
    [ASD, 1 / 1.67, 1 / 2],
  ] as const)('every limit state in tension, %s', (id, forYield, forRupture) => {
    const ours = capacities(id, plain, 0);
    for (const code of Object.keys(yielding))
      expect(ours[code as 'PW'] / (forYield * yielding[code]!)).toBeCloseTo(1, 9);
    for (const code of Object.keys(rupture)) {
      expect(ours[code as 'WM'] / (forRupture * rupture[code]!), code).toBeCloseTo(1, 9);
    }
    const net = forRupture * 470 * 14 * (2 * SPREAD - 48);
    expect(ours.WH / Math.min(forYield * 340 * 14 * 2 * SPREAD, net)).toBeCloseTo(1, 9);
  });

  it('buckling of the strip by Chapter E', () => {
    const slenderness = (1.2 * 260 * Math.sqrt(12)) / 14;
    const fe = (Math.PI ** 2 * 200_000) / slenderness ** 2;
    const { GC } = capacities(LRFD, plain, 0, 'compression');
    expect(GC).toBeCloseTo(0.9 * 0.658 ** (340 / fe) * 340 * 14 * 2 * SPREAD, 3);
  });

  it('an eccentric weld takes no directional increase', () => {
    const pull = 1 / 820 + (3 * 30) / 410 ** 2;
    const { WM } = capacities(LRFD, { ...plain, work_line_offset: 30 }, 0);
    expect(WM).toBeCloseTo((0.75 * 0.6 * 480 * (9 / Math.SQRT2)) / pull, 3);
  });

  it('each bolt counts for the least of its shear, its gusset and its brace', () => {
    const short: ParameterValues = {
      ...plain,
      brace: 'single',
      plate_thickness: 8,
      gusset_end_distance: 27,
      member_end_distance: 27,
    };
    const shear = 0.75 * 360 * AB;
    const gussetEnd = 0.75 * 1.2 * (27 - 11) * 8 * 470;
    const braceEnd = 0.75 * 1.2 * (27 - 11) * 12 * 460;
    const { BS, GB, MB } = capacities(LRFD, short, 0);
    expect(BS).toBeCloseTo(6 * shear, 3);
    expect(GB).toBeCloseTo(4 * shear + 2 * gussetEnd, 3);
    expect(MB).toBeCloseTo(2 * braceEnd + 2 * shear + 2 * gussetEnd, 3);
    // With holes free to lengthen the factor 1.2 becomes 1.5.
    const free = capacities(LRFD, { ...short, hole_deformation: 'accepted' }, 0);
    expect(free.GB).toBeCloseTo(4 * shear + 2 * 1.25 * gussetEnd, 3);
  });
});

describe('what a basis does not list', () => {
  const faults = (basis: typeof CSA | typeof LRFD | 'en-1993-1-8-2005', values: ParameterValues) => {
    const result = findKind('gusset-plate')!.prepare({ ...plain, ...values }, basis, catalogue);
    return result.ok ? [] : result.faults.map(({ field }) => field);
  };

  it('is a fault of its field, by name', () => {
    expect(faults(LRFD, { bolt_size: 'M18', hole_diameter: 0 })).toEqual(['bolt_size']);
    expect(faults(CSA, { bolt_size: 'M18', hole_diameter: 0 })).toEqual([]);
    expect(faults(LRFD, { bolt_size: 'M18', hole_diameter: 20 })).toEqual([]);
    expect(faults('en-1993-1-8-2005', { bolt_grade: 'A325M' })).toEqual(['bolt_grade']);
    expect(faults(LRFD, { bolt_grade: 'A325M' })).toEqual([]);
  });

  it('holes and stresses come from the tables of the basis: M24 has 27 mm in AISC and 26 mm in CSA', () => {
    const m24 = { ...plain, bolt_size: 'M24', bolt_grade: 'A490M', hole_diameter: 0, pitch: 90, gauge: 75 };
    const hole = (basis: typeof CSA | typeof LRFD) => prepare(basis, m24).geometry(0).holes[0]?.diameter;
    expect([hole(CSA), hole(LRFD)]).toEqual([26, 27]);
    // Table J3.2, Group 150, threads in the planes, as its MPa are printed: 469.
    const waived = { ...m24, fit_checks: 'waived' };
    expect(prepare(LRFD, waived).limitStates[3]?.clause).toBe('AISC 360 J3.7');
    expect(capacities(LRFD, waived, 0).BS).toBeCloseTo((6 * 2 * 0.75 * 469 * Math.PI * 24 * 24) / 4, 2);
  });
});

describe('rules with the clauses of their basis', () => {
  const rules = (basis: typeof CSA | typeof LRFD, values: ParameterValues) =>
    broken(basis, { ...plain, ...values }).map(({ rule, limit }) => [rule, limit]);

  it('pitch 2.7 d in CSA; 2 2/3 d and d clear in AISC, with an upper limit', () => {
    expect(rules(CSA, { pitch: 53 })).toEqual([['pitch-least', 54]]);
    expect(rules(LRFD, { pitch: 53 })).toEqual([['pitch-least', expect.closeTo(53.3333, 3)]]);
    expect(rules(LRFD, { pitch: 290 })).toContainEqual(['pitch-greatest', 288]);
  });

  it('edges of Table 6 in CSA, of Table J3.4M in AISC', () => {
    expect(rules(CSA, { gusset_edge_distance: 33 })).toEqual([['gusset-edge', 34]]);
    expect(rules(CSA, { gusset_edge_distance: 27, edge_finish: 'rolled' })).toEqual([]);
    expect(rules(LRFD, { gusset_edge_distance: 25 })).toEqual([['gusset-edge', 26]]);
  });

  it('weld leg by the thicker part in CSA, by the thinner in AISC', () => {
    expect(rules(CSA, { support_thickness: 25, weld_leg: 7 })).toEqual([['weld-leg-least', 8]]);
    expect(rules(LRFD, { support_thickness: 25, weld_leg: 6 })).toEqual([]);
    expect(rules(LRFD, { support_thickness: 25, weld_leg: 5 })).toEqual([['weld-leg-least', 6]]);
  });

  it('no hole larger than normal', () => {
    expect(rules(CSA, { hole_diameter: 24 })).toContainEqual(['hole-greatest', 22]);
    expect(rules(LRFD, { hole_diameter: 24 })).toContainEqual(['hole-greatest', 22]);
  });
});
