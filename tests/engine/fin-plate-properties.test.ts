import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { NOT_COVERED, NOT_PERMITTED, type ParameterValues, toRadians } from '@shared/engine/index.ts';
import { capacities, codes, EN, everyBasis, plain, prepare } from './support/fin-plate.ts';
import { finPlateValues } from './support/fin-plate-values.ts';

const basis = fc.constantFrom(...everyBasis);
const degrees = fc.double({ min: -90, max: 90, noNaN: true });
/** Details that keep more rules than a random one. */
const waived = { fit_checks: 'waived', practice_rules: 'waived', weld_size: 'as_designed' };

describe('for any parameters', () => {
  it.each([false, true])('no capacity is NaN, negative or, where it governs, infinite (wide: %s)', (wide) => {
    let permitted = 0;
    const angles = fc.array(degrees, { minLength: 3, maxLength: 3 });
    fc.assert(
      fc.property(finPlateValues(wide), basis, angles, (values, id, tried) => {
        const detail = prepare(id, wide ? values : { ...values, ...waived });
        const out = new Float64Array(codes.length);
        for (const angle of [...tried, 0, 90, -90]) {
          const index = detail.at(toRadians(angle), 'tension', out);
          if (index === NOT_PERMITTED) {
            expect(detail.rejections.length).toBeGreaterThan(0);
            continue;
          }
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

  it('every rejection has a message and finite numbers', () => {
    fc.assert(
      fc.property(finPlateValues(true), basis, (values, id) => {
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
      fc.property(finPlateValues(true), basis, degrees, (values, id, angle) => {
        const detail = prepare(id, values);
        const { mass, boltCount, weldVolume } = detail.quantities;
        expect(mass > 0 && boltCount > 0 && weldVolume > 0).toBe(true);
        const { outline, holes, member, axis } = detail.geometry(toRadians(angle));
        const points = [
          ...outline,
          ...holes.map(({ centre }) => centre),
          ...member.flatMap((part) => part.outline),
          axis.to,
        ];
        expect(points.every(({ x, y }) => Number.isFinite(x) && Number.isFinite(y))).toBe(true);
        expect(holes).toHaveLength(boltCount);
      }),
      { numRuns: 300 },
    );
  });

  it('the sheet writes down the very capacities of the sweep', () => {
    let permitted = 0;
    fc.assert(
      fc.property(finPlateValues(false), basis, degrees, (values, id, angle) => {
        const detail = prepare(id, { ...values, ...waived });
        const out = new Float64Array(codes.length);
        const index = detail.at(toRadians(angle), 'tension', out);
        const sheet = detail.record(toRadians(angle), 'tension');
        if (index < 0) {
          expect(sheet.some((section) => section.id === 'rules' && section.lines.length > 0)).toBe(true);
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

  it('a push is not covered, nor an angle beyond 90 degrees', () => {
    const detail = prepare(EN, plain);
    const out = new Float64Array(codes.length);
    expect(detail.at(0, 'compression', out)).toBe(NOT_COVERED);
    expect(detail.at(toRadians(91), 'tension', out)).toBe(NOT_COVERED);
    expect(detail.at(NaN, 'tension', out)).toBe(NOT_COVERED);
    expect(detail.outcome(0, 'compression')).toMatchObject({ status: 'not-covered' });
    expect(detail.record(0, 'compression')[0]?.lines[0]?.meaning).toBe('not covered');
  });
});

/** Every capacity of `less` is at most that of `more`, at several angles and in every basis. */
function neverRises(less: ParameterValues, more: ParameterValues, only: readonly string[] = codes): void {
  for (const id of everyBasis) {
    for (const angle of [-90, -50, -15, 0, 30, 60, 90]) {
      const low = capacities(prepare(id, less), angle);
      const high = capacities(prepare(id, more), angle);
      for (const code of only) {
        expect(low[code], `${id} ${angle} ${code}`).toBeLessThanOrEqual(high[code]! * (1 + 1e-9));
      }
    }
  }
}

describe('what can only lower or raise a capacity', () => {
  const loose = { ...plain, ...waived };

  it.each([
    ['a thicker plate', { plate_thickness: 9 }, { plate_thickness: 14 }],
    ['a larger weld', { weld_leg: 7 }, { weld_leg: 11 }],
    ['stronger bolts', { bolt_grade: { fyb: 480, fub: 600 } }, { bolt_grade: { fyb: 640, fub: 800 } }],
    ['stronger plate', { plate_steel: { fy: 240, fu: 360 } }, { plate_steel: { fy: 280, fu: 420 } }],
    ['stronger beam', { beam_steel: { fy: 240, fu: 360 } }, { beam_steel: { fy: 345, fu: 460 } }],
    ['less eccentricity', { eccentricity: 150 }, { eccentricity: 60 }],
    ['one line of shear instead of both: the face', {}, { shear_line: 'support' }],
    ['one line of shear instead of both: the bolts', {}, { shear_line: 'bolts' }],
    ['the direction by the angle', {}, { shear_direction: 'by_angle' }],
    ['own distances of each bolt', {}, { bolt_bearing: 'each' }],
    ['no handbook factor', {}, { gross_shear: 'full' }],
    ['an even pull on the block', {}, { block_pull: 'even' }],
    ['no limit on single laps', {}, { single_lap: 'waived' }],
    ['no reduction of long joints', {}, { long_joint: 'even' }],
    ['no cope', {}, { cope_top_length: 0, cope_top_depth: 0 }],
    ['drilled holes', { hole_making: 'punched' }, { hole_making: 'drilled' }],
  ] as const)('%s', (_name, less: ParameterValues, more: ParameterValues) => {
    neverRises({ ...loose, ...less }, { ...loose, ...more });
  });

  it('a plastic section carries more where the plate bends and the rest stays', () => {
    neverRises(loose, { ...loose, plate_section: 'plastic' }, ['PW', 'WM', 'PV', 'BS', 'MX']);
  });
});

describe('symmetry', () => {
  it('R(θ) = R(−θ) where the shear is taken either way', () => {
    fc.assert(
      fc.property(finPlateValues(false), basis, degrees, (values, id, angle) => {
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

  it('either way is the worse of up and down', () => {
    for (const id of everyBasis) {
      for (const angle of [15, 45, 90]) {
        const either = capacities(prepare(id, plain), angle);
        const up = capacities(prepare(id, { ...plain, shear_direction: 'by_angle' }), angle);
        const down = capacities(prepare(id, { ...plain, shear_direction: 'by_angle' }), -angle);
        for (const code of codes) expect(either[code]).toBe(Math.min(up[code]!, down[code]!));
      }
    }
  });

  it('a cope turned from the top to the bottom turns the load', () => {
    const { cope_top_length: length, cope_top_depth: depth, beam_top_to_row: row, ...rest } = plain;
    const turned = {
      ...rest,
      cope_bottom_length: length,
      cope_bottom_depth: depth,
      beam_top_to_row: 390 - 150 - row,
      shear_direction: 'by_angle',
    };
    for (const angle of [-90, -40, 20, 70]) {
      const first = capacities(prepare(EN, { ...plain, shear_direction: 'by_angle' }), angle);
      const second = capacities(prepare(EN, turned), -angle);
      for (const code of codes) {
        if (first[code] === Infinity) expect(second[code]).toBe(Infinity);
        else expect(second[code]).toBeCloseTo(first[code]!, 3);
      }
    }
  });
});
