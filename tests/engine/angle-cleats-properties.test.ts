import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { NOT_COVERED, NOT_PERMITTED, type ParameterValues, toRadians } from '@shared/engine/index.ts';
import {
  capacities,
  cleatValues,
  codes,
  plain,
  prepare,
  single,
  thick,
  welded,
} from './support/angle-cleats.ts';
import { EN, everyBasis } from './support/fin-plate.ts';

const basis = fc.constantFrom(...everyBasis);
const degrees = fc.double({ min: -90, max: 90, noNaN: true });
/** Details that keep more rules than a random one. */
const waived = { fit_checks: 'waived', practice_rules: 'waived' };

describe('for any parameters', () => {
  it.each([false, true])('no capacity is NaN, negative or, where it governs, infinite (wide: %s)', (wide) => {
    let permitted = 0;
    const angles = fc.array(degrees, { minLength: 3, maxLength: 3 });
    fc.assert(
      fc.property(cleatValues(wide), basis, angles, (values, id, tried) => {
        const detail = prepare(id, wide ? values : { ...values, ...waived });
        const out = new Float64Array(codes.length);
        for (const angle of [...tried, 0, 90, -90]) {
          const index = detail.at(toRadians(angle), 'tension', out);
          if (index === NOT_PERMITTED) expect(detail.rejections.length).toBeGreaterThan(0);
          if (index < 0) continue;
          permitted++;
          expect(out.every((capacity) => capacity > 0)).toBe(true);
          expect(Number.isFinite(out[index])).toBe(true);
          expect(out[index]).toBeLessThanOrEqual(Math.min(...out) * (1 + 1e-8));
        }
      }),
      { numRuns: wide ? 1500 : 3000 },
    );
    if (!wide) expect(permitted).toBeGreaterThan(500);
  });

  it('every rejection has a message and finite numbers, and its rule is in the legend', () => {
    fc.assert(
      fc.property(cleatValues(true), basis, (values, id) => {
        for (const { rule, message, value, limit } of prepare(id, values).rejections) {
          expect(message.length, rule).toBeGreaterThan(10);
          expect(Number.isFinite(value) && Number.isFinite(limit), rule).toBe(true);
        }
      }),
      { numRuns: 1000 },
    );
  });

  it('quantities are positive and every point of the drawing is finite', () => {
    fc.assert(
      fc.property(cleatValues(true), basis, degrees, (values, id, angle) => {
        const detail = prepare(id, values);
        const { mass, boltCount, weldVolume } = detail.quantities;
        expect(mass > 0 && boltCount > 0 && weldVolume >= 0).toBe(true);
        const drawn = detail.geometry(toRadians(angle));
        const points = [
          ...drawn.outline,
          ...drawn.holes.map(({ centre }) => centre),
          ...drawn.member.flatMap((part) => part.outline),
          ...(drawn.bolts ?? []).flatMap(({ from, to }) => [from, to]),
          ...(drawn.views ?? []).flatMap((view) => view.parts.flatMap(({ outline }) => outline)),
          drawn.axis.to,
        ];
        expect(points.every(({ x, y }) => Number.isFinite(x) && Number.isFinite(y))).toBe(true);
      }),
      { numRuns: 300 },
    );
  });

  it('the sheet writes down the very capacities of the sweep', () => {
    let permitted = 0;
    fc.assert(
      fc.property(cleatValues(false), basis, degrees, (values, id, angle) => {
        const detail = prepare(id, { ...values, ...waived });
        const out = new Float64Array(codes.length);
        const index = detail.at(toRadians(angle), 'tension', out);
        const sheet = detail.record(toRadians(angle), 'tension');
        if (index < 0) {
          const sections = sheet.map((section) => section.id);
          expect(sections).toContain(index === NOT_COVERED ? 'result' : 'rules');
          return;
        }
        permitted++;
        detail.limitStates.forEach((state, position) => {
          const lines = sheet.find((section) => section.id === state.id)?.lines ?? [];
          const capacity = out[position] ?? NaN;
          expect(lines.at(-1)?.value).toBe(capacity === Infinity ? 'does not apply' : capacity / 1000);
        });
        const again = new Float64Array(codes.length);
        expect(detail.at(toRadians(angle), 'tension', again)).toBe(index);
        expect(again).toEqual(out);
      }),
      { numRuns: 600 },
    );
    expect(permitted).toBeGreaterThan(20);
  });

  it('a push is not covered, nor an angle beyond 90°, nor a pull that a welded heel cannot take', () => {
    const detail = prepare(EN, plain);
    const out = new Float64Array(codes.length);
    expect(detail.at(0, 'compression', out)).toBe(NOT_COVERED);
    expect(detail.at(toRadians(91), 'tension', out)).toBe(NOT_COVERED);
    expect(detail.at(NaN, 'tension', out)).toBe(NOT_COVERED);
    const free = prepare(EN, { ...welded, cleats: 1 });
    expect(free.outcome(toRadians(45), 'tension')).toMatchObject({ status: 'not-covered' });
    expect(free.outcome(toRadians(90), 'tension').status).toBe('capacity');
    expect(prepare(EN, { ...welded, cleats: 1, heel: 'held' }).outcome(0, 'tension').status).toBe('capacity');
  });
});

/** Every capacity of `less` is at most that of `more`, at several angles and in every basis. */
function neverRises(less: ParameterValues, more: ParameterValues): void {
  for (const id of everyBasis) {
    for (const angle of [-90, -50, -15, 0, 30, 60, 90]) {
      const low = capacities(id, less, angle);
      const high = capacities(id, more, angle);
      for (const code of codes) {
        expect(low[code], `${id} ${angle} ${code}`).toBeLessThanOrEqual(high[code]! * (1 + 1e-9));
      }
    }
  }
}

describe('what can only lower or raise a capacity', () => {
  const angle = (thickness: number) => ({ cleat_section: { ...plain.cleat_section, thickness } });

  it.each([
    ['thicker cleats', thick, angle(10), angle(14)],
    ['stronger cleats', plain, { cleat_steel: { fy: 240, fu: 360 } }, {}],
    ['stronger beam', plain, { beam_steel: { fy: 240, fu: 360 } }, {}],
    ['stronger bolts in the web', plain, { bolt_grade: { fyb: 480, fub: 600 } }, {}],
    ['stronger bolts at the support', thick, { support_bolt_grade: { fyb: 480, fub: 600 } }, {}],
    ['a known support', plain, {}, { support_thickness: 0 }],
    ['two cleats instead of one', plain, { cleats: 1 }, {}],
    ['two welded cleats instead of one', welded, { cleats: 1, heel: 'held' }, {}],
    ['a larger weld', welded, { weld_leg: 6 }, { weld_leg: 8 }],
    ['legs that bear on the web', welded, {}, { toe_weld: 'bearing' }],
    ['a heel that is held', single, {}, { heel: 'held' }],
    ['less eccentricity', plain, { eccentricity: 120 }, {}],
    ['one line of shear instead of both: the face', plain, {}, { shear_line: 'support' }],
    ['one line of shear instead of both: the bolts', plain, {}, { shear_line: 'bolts' }],
    ['the direction by the angle', plain, {}, { shear_direction: 'by_angle' }],
    ['own distances of each bolt', plain, {}, { bolt_bearing: 'each' }],
    ['no handbook factors', plain, {}, { gross_shear: 'full', support_bolts: 'full' }],
    ['an even pull on the block', plain, {}, { block_pull: 'even' }],
    ['no limit on single laps', single, {}, { single_lap: 'waived' }],
    ['bending by tensile strength', thick, {}, { leg_bending: 'tensile' }],
    ['drilled holes', plain, { hole_making: 'punched' }, {}],
  ] as const)('%s', (_name, base: ParameterValues, less: ParameterValues, more: ParameterValues) => {
    neverRises({ ...base, ...less }, { ...base, ...more });
  });
});

describe('what can only lower or raise the bolts', () => {
  it('legs that hold one another', () => {
    for (const id of everyBasis) {
      const counted = capacities(id, { ...plain, leg_eccentricity: 'always' }, 90);
      expect(counted.SS).toBeLessThan(capacities(id, plain, 90).SS!);
      expect(capacities(id, { ...thick, leg_eccentricity: 'always' }, 45).SC).toBeLessThan(
        capacities(id, thick, 45).SC!,
      );
    }
  });

  it('the instantaneous centre lies above the elastic method, but not in EN, which does not use it', () => {
    for (const id of everyBasis) {
      const elastic = capacities(id, single, 90);
      const centre = capacities(id, { ...single, bolt_group: 'centre' }, 90);
      for (const code of ['BS', 'SS']) {
        const gain = centre[code]! / elastic[code]!;
        expect(gain, `${id} ${code}`).toBeGreaterThan(id === EN ? 0.9999 : 1.02);
        expect(gain, `${id} ${code}`).toBeLessThan(id === EN ? 1.0001 : 1.6);
      }
    }
  });
});

describe('symmetry', () => {
  it('R(θ) = R(−θ) where the shear is taken either way', () => {
    fc.assert(
      fc.property(cleatValues(false), basis, degrees, (values, id, angle) => {
        const detail = prepare(id, { ...values, ...waived, shear_direction: 'either' });
        const up = new Float64Array(codes.length);
        const down = new Float64Array(codes.length);
        const first = detail.at(toRadians(angle), 'tension', up);
        expect(detail.at(toRadians(-angle), 'tension', down) >= 0).toBe(first >= 0);
        if (first >= 0) up.forEach((capacity, index) => expect(down[index]).toBeCloseTo(capacity, 3));
      }),
      { numRuns: 600 },
    );
  });

  it('bolts at the support that are given again are the same bolts', () => {
    const same = { ...plain, support_connection: 'bolted' };
    const given = {
      ...plain,
      support_bolt_size: plain.bolt_size,
      support_bolt_grade: plain.bolt_grade,
      support_hole_diameter: plain.hole_diameter,
    };
    for (const id of everyBasis) {
      for (const angle of [0, 40, 90]) {
        expect(capacities(id, given, angle)).toEqual(capacities(id, same, angle));
      }
    }
  });

  it('a length given by number is that of the rows and their end distances', () => {
    const long = { ...plain, cleat_length: 298, cleat_end_distance: 99 };
    expect(capacities(EN, long, 30)).toEqual(capacities(EN, plain, 30));
  });
});
