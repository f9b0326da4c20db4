import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { NOT_PERMITTED, type ParameterValues, type Sense, toRadians } from '@shared/engine/index.ts';
import { gussetValues } from './support/arbitrary.ts';
import { bothBases, capacities, codes, EN, plain, prepare, SANS } from './support/gusset.ts';

const basis = fc.constantFrom(...bothBases);
const sense = fc.constantFrom<Sense>('tension', 'compression');
const degrees = fc.double({ min: -80, max: 80, noNaN: true });
const sheltered = { ...plain, exposure: 'sheltered' };

describe('for any parameters', () => {
  it.each([false, true])(
    'no capacity is NaN, negative or, where it governs, infinite (wide ranges: %s)',
    (wide) => {
      let permitted = 0;
      fc.assert(
        fc.property(
          gussetValues(wide),
          basis,
          sense,
          fc.array(degrees, { minLength: 3, maxLength: 3 }),
          (values, id, way, angles) => {
            const detail = prepare(id, values);
            const out = new Float64Array(codes.length);
            for (const angle of angles) {
              const index = detail.at(toRadians(angle), way, out);
              if (index === NOT_PERMITTED) {
                const outcome = detail.outcome(toRadians(angle), way);
                expect(outcome.status === 'not-permitted' && outcome.rejections.length).toBeGreaterThan(0);
                continue;
              }
              permitted++;
              expect(out.every((capacity) => capacity > 0)).toBe(true);
              expect(Number.isFinite(out[index])).toBe(true);
              expect(out[index]).toBeLessThanOrEqual(Math.min(...out) * (1 + 1e-8));
            }
          },
        ),
        { numRuns: wide ? 1500 : 3000 },
      );
      if (!wide) expect(permitted).toBeGreaterThan(100);
    },
  );

  it('quantities are positive and every point of the drawing is finite', () => {
    fc.assert(
      fc.property(gussetValues(false), basis, degrees, (values, id, angle) => {
        const detail = prepare(id, values);
        const { mass, boltCount, weldVolume } = detail.quantities;
        expect(mass > 0 && boltCount > 0 && weldVolume > 0).toBe(true);
        const { outline, holes, member } = detail.geometry(toRadians(angle));
        const points = [
          ...outline,
          ...holes.map(({ centre }) => centre),
          ...member.flatMap((part) => part.outline),
        ];
        expect(points.every(({ x, y }) => Number.isFinite(x) && Number.isFinite(y))).toBe(true);
      }),
      { numRuns: 300 },
    );
  });

  it('the sheet writes down the very capacities of the sweep', () => {
    fc.assert(
      fc.property(gussetValues(false), basis, sense, degrees, (values, id, way, angle) => {
        const detail = prepare(id, values);
        const out = new Float64Array(codes.length);
        const index = detail.at(toRadians(angle), way, out);
        const sheet = detail.record(toRadians(angle), way);
        if (index < 0) {
          expect(sheet.some((section) => section.id === 'rules' && section.lines.length > 0)).toBe(true);
          return;
        }
        detail.limitStates.forEach((state, position) => {
          const lines = sheet.find((section) => section.id === state.id)?.lines ?? [];
          const recorded = lines.at(-1)?.value;
          const capacity = out[position] ?? NaN;
          expect(recorded).toBe(capacity === Infinity ? 'does not apply' : capacity / 1000);
        });
        const again = new Float64Array(codes.length);
        expect(detail.at(toRadians(angle), way, again)).toBe(index);
        expect(again).toEqual(out);
      }),
      { numRuns: 400 },
    );
  });

  it('R(θ) = R(−θ) when the work line runs through the middle of the weld', () => {
    fc.assert(
      fc.property(gussetValues(false), basis, sense, degrees, (values, id, way, angle) => {
        const detail = prepare(id, { ...values, work_line_offset: 0 });
        const up = new Float64Array(codes.length);
        const down = new Float64Array(codes.length);
        const first = detail.at(toRadians(angle), way, up);
        expect(detail.at(toRadians(-angle), way, down) >= 0).toBe(first >= 0);
        if (first >= 0) up.forEach((capacity, index) => expect(down[index]).toBeCloseTo(capacity, 3));
      }),
      { numRuns: 1000 },
    );
  });

  it('turning the detail upside down changes nothing: offset and angle change sign together', () => {
    fc.assert(
      fc.property(gussetValues(false), basis, sense, degrees, (values, id, way, angle) => {
        const offset = Number(values['work_line_offset']);
        const up = new Float64Array(codes.length);
        const down = new Float64Array(codes.length);
        const first = prepare(id, values).at(toRadians(angle), way, up);
        const turned = prepare(id, { ...values, work_line_offset: -offset });
        expect(turned.at(toRadians(-angle), way, down) >= 0).toBe(first >= 0);
        if (first >= 0) up.forEach((capacity, index) => expect(down[index]).toBeCloseTo(capacity, 3));
      }),
      { numRuns: 500 },
    );
  });
});

/** Every capacity of `less` is at most that of `more`, named exceptions apart. */
function neverRises(
  id: (typeof bothBases)[number],
  less: ParameterValues,
  more: ParameterValues,
  angle: number,
  exceptions: readonly string[] = [],
) {
  const low = capacities(id, less, angle);
  const high = capacities(id, more, angle);
  for (const code of codes) {
    if (!exceptions.includes(code)) expect(low[code], code).toBeLessThanOrEqual(high[code] * (1 + 1e-12));
  }
}

describe('capacity never rises when a part is weakened', () => {
  const angle = fc.double({ min: -30, max: 30, noNaN: true });
  const share = fc.double({ min: 0.75, max: 1, noNaN: true });

  it.each(bothBases)('plate strength, %s', (id) => {
    // EN: the correlation factor of Table 4.1 falls in steps with the grade, so a weaker steel may weld better; and
    // by 3.7 a group may change from the least times the number to the sum.
    fc.assert(
      fc.property(angle, share, (theta, part) => {
        const less = { ...sheltered, plate_steel: { fy: 340 * part, fu: 470 * part } };
        neverRises(id, less, sheltered, theta, id === EN ? ['WM', 'GB'] : []);
      }),
    );
  });

  it.each(bothBases)('weld leg, %s', (id) => {
    fc.assert(
      fc.property(angle, share, (theta, part) => {
        neverRises(id, { ...sheltered, weld_leg: 9 * part }, sheltered, theta);
      }),
    );
  });

  it.each(bothBases)('plate thickness, %s', (id) => {
    fc.assert(
      fc.property(angle, share, (theta, part) => {
        neverRises(
          id,
          { ...sheltered, plate_thickness: 14 * part },
          sheltered,
          theta,
          id === EN ? ['GB'] : [],
        );
      }),
    );
  });

  it.each(bothBases)('bolt strength, %s', (id) => {
    fc.assert(
      fc.property(angle, share, (theta, part) => {
        const less = { ...sheltered, bolt_grade: { fyb: 640 * part, fub: 800 * part } };
        neverRises(id, less, sheltered, theta, id === EN ? ['GB', 'MB'] : []);
      }),
    );
  });

  it('gusset end distance, SANS', () => {
    fc.assert(
      fc.property(angle, share, (theta, part) => {
        const less = { ...sheltered, gusset_end_distance: 58 * part };
        // A shorter plate of the same end width has sides that open less or more towards the weld.
        neverRises(SANS, less, sheltered, theta, ['GX', 'WH']);
      }),
    );
  });

  it('effective length factor in compression', () => {
    const { GC: short } = capacities(SANS, { ...sheltered, buckling_k: 0.65 }, 10, 'compression');
    const { GC: long } = capacities(SANS, { ...sheltered, buckling_k: 1.5 }, 10, 'compression');
    expect(long).toBeLessThan(short);
  });
});

describe('scaling', () => {
  const lengths = [
    'plate_thickness',
    'gusset_end_distance',
    'gusset_edge_distance',
    'weld_length',
    'weld_leg',
    'hole_diameter',
    'pitch',
    'gauge',
    'first_row',
    'member_backmark',
    'member_end_distance',
  ] as const;

  it.each(bothBases)('all lengths × 0.9 gives forces × 0.81, %s', (id) => {
    const k = 0.9;
    const offset = { ...sheltered, work_line_offset: 30 };
    const scaled: Record<string, ParameterValues[string]> = {
      ...offset,
      work_line_offset: 30 * k,
      bolt_size: { d: 20 * k, stressArea: 245 * k * k },
      section: {
        shape: 'angle',
        longLeg: 160 * k,
        shortLeg: 100 * k,
        thickness: 12 * k,
        rootRadius: 13 * k,
        area: 3010 * k * k,
      },
    };
    for (const name of lengths) scaled[name] = plain[name] * k;
    for (const way of ['tension', 'compression'] as const) {
      const full = capacities(id, offset, 25, way);
      const small = capacities(id, scaled, 25, way);
      for (const code of codes) {
        if (full[code] !== Infinity) expect(small[code] / full[code], code).toBeCloseTo(k * k, 9);
      }
    }
  });
});
