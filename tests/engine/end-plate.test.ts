import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  type BasisId,
  bases,
  findKind,
  type ParameterValues,
  type PreparedDetail,
  toRadians,
} from '@shared/engine/index.ts';
import { endPlateValues } from './support/end-plate-values.ts';
import { catalogue } from './support/gusset.ts';

const kind = findKind('end-plate')!;
const codes = kind.limitStates.map(({ code }) => code);
const EN = 'en-1993-1-8-2005';
const AISC = 'aisc-360-2022-lrfd';

function prepare(basis: BasisId, values: ParameterValues): PreparedDetail {
  const prepared = kind.prepare(values, basis, catalogue);
  if (!prepared.ok) throw new Error(JSON.stringify(prepared.faults));
  return prepared.detail;
}
/** Capacities by code, kN. */
function capacities(basis: BasisId, values: ParameterValues, angle: number): Record<string, number> {
  const detail = prepare(basis, values);
  const out = new Float64Array(codes.length);
  const governing = detail.at(toRadians(angle), 'tension', out);
  if (governing < 0) throw new Error(JSON.stringify(detail.rejections));
  return Object.fromEntries(codes.map((code, at) => [code, out[at]! / 1000]));
}

/** Lengths that all differ, so that swapped arguments show; four rows of two M20 8.8. */
const plain: ParameterValues = {
  support_thickness: 13,
  support_steel: { fy: 265, fu: 410 },
  plate_thickness: 11,
  plate_steel: { fy: 275, fu: 430 },
  plate_width: 170,
  plate_end_distance: 45,
  hole_making: 'drilled',
  weld_leg: 7,
  electrode: { xu: 480 },
  bolt_size: { d: 20, stressArea: 245 },
  bolt_grade: { fyb: 640, fub: 800 },
  hole_diameter: 22,
  rows: 4,
  pitch: 72,
  gauge: 100,
  beam_section: {
    shape: 'i',
    depth: 400,
    width: 180,
    webThickness: 8.6,
    flangeThickness: 13.5,
    rootRadius: 21,
  },
  beam_steel: { fy: 345, fu: 460 },
};
/** h_p = 3 · 72 + 2 · 45 = 306; e_2 = (170 − 100)/2 = 35; (100 − 8.6)/2 = 45.7 to the web. */
const height = 306;

describe('EN 1993-1-8, the beam bearing at 90°', () => {
  const at90 = capacities(EN, plain, 90);

  it('weld to the web, directional: √3 τ ≤ f_u/(β_w γ_M2)', () => {
    // Plate S275 is the weaker: 430/(0.85 · 1.25) against 460/(0.9 · 1.25); two fillets of 7/√2 over 306 mm.
    const fvw = Math.min(430 / (0.85 * 1.25), 460 / (0.9 * 1.25)) / Math.sqrt(3);
    expect(at90.WM).toBeCloseTo((2 * 306 * (7 / Math.SQRT2) * fvw) / 1000, 6);
  });

  it('plate in shear: gross over 1.27, net, block with 0.5 on its tension', () => {
    expect(at90.PV).toBeCloseTo((2 * height * 11 * 275) / (1.27 * Math.sqrt(3)) / 1000, 6);
    expect(at90.PN).toBeCloseTo((2 * 11 * (height - 4 * 22) * 430) / (Math.sqrt(3) * 1.25) / 1000, 6);
    // Shear plane 216 + 45 less 3.5 holes; tension plane 35 less half a hole; on both sides of the web.
    const block = (0.5 * 11 * (35 - 11) * 430) / 1.25 + (11 * (261 - 3.5 * 22) * 275) / Math.sqrt(3);
    expect(at90.PX).toBeCloseTo((2 * block) / 1000, 6);
  });

  it('bolts: 0.8 of eight in single shear, threads in the plane', () => {
    expect(at90.BS).toBeCloseTo((0.8 * 8 * 0.6 * 800 * 245) / 1.25 / 1000, 6);
    expect(capacities(EN, { ...plain, support_bolts: 'full' }, 90).BS).toBeCloseTo(752.64, 6);
  });

  it('bearing on the plate by 3.7, and on the support without a free edge', () => {
    // k_1 = min(2.8 · 35/22 − 1.7, 1.4 · 100/22 − 1.7, 2.5) = 2.5; ends 45/66 = 0.6818, inner 72/66 − 0.25 = 0.8409.
    const endBolt = (2.5 * (45 / 66) * 430 * 20 * 11) / 1.25;
    const inner = (2.5 * (72 / 66 - 0.25) * 430 * 20 * 11) / 1.25;
    // F_v,Rd = 94 080 is below both: eight times the least.
    expect(Math.min(endBolt, inner)).toBeGreaterThan(94_080);
    expect(at90.PB).toBeCloseTo((8 * endBolt) / 1000, 6);
    expect(at90.SB).toBeCloseTo((8 * 2.5 * (72 / 66 - 0.25) * 410 * 20 * 13) / 1.25 / 1000, 6);
    expect(capacities(EN, { ...plain, support_thickness: 0 }, 90).SB).toBe(Infinity);
  });

  it('web of the beam over 0.9 of the height', () => {
    expect(at90.MV).toBeCloseTo((0.9 * 306 * 8.6 * 345) / Math.sqrt(3) / 1000, 6);
    expect(at90.MW).toBeCloseTo(at90.MV!, 6);
  });

  it('nothing that only a pull loads applies', () => {
    for (const code of ['PF', 'BT', 'BC', 'MT']) expect(at90[code], code).toBe(Infinity);
  });
});

describe('EN 1993-1-8, the beam pulling at 0°', () => {
  const at0 = capacities(EN, plain, 0);
  /** m = 45.7 − 0.8 · 7 = 40.1; e = 35; n = min(35, 50.1) = 35. */
  const m = 40.1;
  /** M_pl of one millimetre of l_eff. */
  const moment = 0.25 * 11 * 11 * 275;

  it('mode 1 of the group: ends 45 + 36 each and two inner rows of 72', () => {
    // Ends min(2m + 0.625e + 36, 81) = 81; Σl_eff = 306, below the circular patterns and the rows one by one.
    expect(at0.PF).toBeCloseTo((4 * 306 * moment) / m / 1000, 6);
  });

  it('the least of modes 1, 2 and 3 with 0.9 f_ub A_s/γ_M2 for each bolt', () => {
    const mode2 = (2 * 306 * moment + 35 * 8 * 141_120) / (m + 35);
    expect(at0.BT).toBeCloseTo(Math.min((4 * 306 * moment) / m, mode2, 8 * 141_120) / 1000, 6);
  });

  it('web and weld under the pull', () => {
    expect(at0.MT).toBeCloseTo((306 * 8.6 * 345) / 1000, 6);
    const limit = Math.min(430 / (0.85 * 1.25), 460 / (0.9 * 1.25));
    // Across a fillet σ_⊥ = τ_⊥ = n/(a √2): √(σ² + 3σ²) = 2σ.
    expect(at0.WM).toBeCloseTo((2 * 306 * (7 / Math.SQRT2) * (Math.SQRT2 / 2) * limit) / 1000, 3);
  });

  it('bending with f_u/1.1 for tying', () => {
    const tying = capacities(EN, { ...plain, plate_bending: 'tensile' }, 0);
    expect(tying.PF).toBeCloseTo((4 * 306 * 0.25 * 121 * (430 / 1.1)) / m / 1000, 6);
  });
});

describe('AISC 360-22, LRFD', () => {
  it('at 90°: J4.2, J4.3 with U_bs 0.5, J3.7, J3.11 bolt by bolt', () => {
    const at90 = capacities(AISC, plain, 90);
    expect(at90.PV).toBeCloseTo((1 * 0.6 * 275 * 2 * height * 11) / 1000, 6);
    // 2 mm more than the hole are deducted.
    expect(at90.PN).toBeCloseTo((0.75 * 0.6 * 430 * 2 * 11 * (height - 4 * 24)) / 1000, 6);
    const shear = Math.min(0.6 * 430 * 11 * (261 - 3.5 * 24), 0.6 * 275 * 11 * 261);
    // One column: U_bs = 1.0 at a beam end with a single line.
    expect(at90.PX).toBeCloseTo((2 * 0.75 * (shear + 430 * 11 * (35 - 12))) / 1000, 6);
    const bolt = 0.75 * 0.45 * 800 * Math.PI * 100;
    expect(at90.BS).toBeCloseTo((8 * bolt) / 1000, 6);
    const tearOut = 0.75 * 1.2 * (45 - 11) * 11 * 430;
    expect(at90.PB).toBeCloseTo((2 * Math.min(tearOut, bolt) + 6 * bolt) / 1000, 6);
    expect(at90.MV).toBeCloseTo((0.6 * 345 * 306 * 8.6) / 1000, 6);
  });

  it('at 0°: the plate as pried, two hinges', () => {
    // b = 45.7, b' = 35.7, a' = min(35, 57.1) + 10 = 45; p: ends 45 + 36, inner 72, mean 76.5; δ = 1 − 22/76.5.
    const K = (0.9 * 275 * 76.5 * 121) / (4 * 35.7);
    const group = 8 * K * (2 - 22 / 76.5);
    const alone = (p: number) => ((0.9 * 275 * p * 121) / (4 * 35.7)) * (2 - 22 / p);
    const rows = 4 * alone(81) + 4 * alone(72);
    expect(capacities(AISC, plain, 0).PF).toBeCloseTo(Math.min(group, rows) / 1000, 6);
  });
});

const values = endPlateValues(false);
const basis = fc.constantFrom(...bases.map(({ id }) => id));
const degrees = fc.double({ min: -90, max: 90, noNaN: true });
const easy = { fit_checks: 'waived', practice_rules: 'waived', exposure: 'sheltered' };

describe('for any parameters', () => {
  it('no capacity is NaN or negative, the same up and down, and the sheet has the same numbers', () => {
    let permitted = 0;
    fc.assert(
      fc.property(values, basis, degrees, (given, id, angle) => {
        const detail = prepare(id, { ...given, ...easy } as ParameterValues);
        const out = new Float64Array(codes.length);
        const governing = detail.at(toRadians(angle), 'tension', out);
        const outcome = detail.outcome(toRadians(angle), 'tension');
        if (governing < 0) {
          expect(outcome.status === 'not-permitted' && outcome.rejections.length > 0).toBe(true);
          return;
        }
        permitted++;
        expect(out.every((capacity) => capacity > 0)).toBe(true);
        expect(Number.isFinite(out[governing])).toBe(true);
        const mirrored = new Float64Array(codes.length);
        detail.at(toRadians(-angle), 'tension', mirrored);
        out.forEach((capacity, at) => expect(mirrored[at]! / capacity || 1).toBeCloseTo(1, 9));
        const sections = detail.record(toRadians(angle), 'tension');
        codes.forEach((code, at) => {
          const section = sections.find(({ title }) => title.startsWith(`${code} `))!;
          const last = section.lines.at(-1)!;
          if (out[at] === Infinity) expect(last.value).toBe('does not apply');
          else expect(Number(last.value)).toBeCloseTo(out[at]! / 1000, 6);
        });
      }),
      { numRuns: 1500 },
    );
    expect(permitted).toBeGreaterThan(100);
  });

  it('never falls when a strength, the plate or the weld grows', () => {
    fc.assert(
      fc.property(values, basis, degrees, (given, id, angle) => {
        const start = {
          ...given,
          ...easy,
          plate_steel: { fy: 275, fu: 430 },
          support_steel: { fy: 275, fu: 430 },
          beam_steel: { fy: 355, fu: 470 },
        } as ParameterValues;
        const lesser = prepare(id, start);
        const out = new Float64Array(codes.length);
        if (lesser.at(toRadians(angle), 'tension', out) < 0) return;
        const capacity = Math.min(...out);
        const changes: ParameterValues[] = [
          { plate_steel: { fy: 300, fu: 460 }, support_steel: { fy: 300, fu: 460 } },
          { plate_thickness: Number(start.plate_thickness) * 1.2 },
          { beam_steel: { fy: 420, fu: 520 } },
        ];
        for (const change of changes) {
          const greater = new Float64Array(codes.length);
          if (prepare(id, { ...start, ...change }).at(toRadians(angle), 'tension', greater) < 0) continue;
          expect(Math.min(...greater)).toBeGreaterThanOrEqual(capacity * (1 - 1e-9));
        }
      }),
      { numRuns: 300 },
    );
  });
});

describe('rules', () => {
  const broken = (change: ParameterValues, id: BasisId = EN) =>
    prepare(id, { ...plain, ...change }).rejections.map(({ rule, limit }) => [
      rule,
      Math.round(limit * 10) / 10,
    ]);

  it('a sound detail keeps all', () => {
    for (const { id } of bases) expect(broken({}, id)).toEqual([]);
  });

  it('name what is wrong with its limit', () => {
    // t ≤ 20/1.9 √(800/275) = 17.95.
    expect(broken({ plate_thickness: 18 })).toEqual([['ductile-thickness', 18]]);
    expect(broken({ gauge: 80 })).toEqual([['gauge-practice-least', 90]]);
    expect(broken({ rows: 5 })).toContainEqual(['plate-inside-web', 34.5]);
    expect(broken({ depth: 'flush' })).toContainEqual(['plate-flush', 400]);
    expect(broken({ plate_end_distance: 26 })).toContainEqual(['plate-end-least', 26.4]);
    expect(broken({ pitch: 48 })).toContainEqual(['pitch-least', 48.4]);
  });

  it('a push and angles beyond the face are not covered', () => {
    const detail = prepare(EN, plain);
    expect(detail.outcome(0, 'compression').status).toBe('not-covered');
    expect(detail.outcome(toRadians(91), 'tension').status).toBe('not-covered');
  });
});

it('is drawn with its bolts from the side and its holes on the face', () => {
  const { views, bolts, outline } = prepare(EN, plain).geometry(0);
  expect(bolts).toHaveLength(4);
  expect(views?.[0]?.holes).toHaveLength(8);
  expect(Math.max(...outline.map(({ y }) => y)) * 2).toBe(height);
  expect(prepare(EN, plain).quantities).toMatchObject({ boltCount: 8, weldVolume: 306 * 49 });
});
