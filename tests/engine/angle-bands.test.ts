import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  bases,
  NOT_COVERED,
  NOT_PERMITTED,
  type PreparedDetail,
  toDegrees,
  toRadians,
} from '@shared/engine/index.ts';
import { bandCapacity, roundDown } from '@shared/engine/sweep/index.ts';
import { gussetValues } from './support/arbitrary.ts';
import { plain, prepare } from './support/gusset.ts';

/** A detail whose limit states are given as functions of the load angle in degrees. */
function made(
  states: readonly ((angle: number) => number)[],
  permitted = (_: number) => true,
): PreparedDetail {
  return {
    limitStates: states.map((_, at) => ({ id: `${at}`, code: 'XX', title: '', part: 'plate', clause: '' })),
    rejections: [],
    quantities: { mass: 1, boltCount: 1, weldVolume: 1 },
    at(theta, _sense, out) {
      const angle = toDegrees(theta);
      if (!permitted(angle)) return NOT_PERMITTED;
      states.forEach((state, at) => (out[at] = state(angle)));
      return out.indexOf(Math.min(...out));
    },
    outcome: (theta) =>
      permitted(toDegrees(theta))
        ? { status: 'capacity', capacity: 1, governing: 0 }
        : { status: 'not-permitted', rejections: [] },
    record: () => [],
    geometry: () => {
      throw new Error('not drawn');
    },
  };
}
const band = (detail: PreparedDetail, from: number, to: number) =>
  bandCapacity(detail, 'tension', toRadians(from), toRadians(to));

describe('the capacity of a band', () => {
  it('is found at a kink inside the band, not at its ends', () => {
    const found = band(made([(angle) => 1000 + 50 * Math.abs(angle - 7.1234)]), 0, 15);
    expect(found).toMatchObject({ status: 'capacity', governing: 0 });
    expect(found.status === 'capacity' && found.capacity).toBeCloseTo(1000, 6);
    expect(found.status === 'capacity' && found.angle).toBeCloseTo(7.1234, 6);
  });

  it('is found where two limit states cross, and of a jump on its lower side', () => {
    const crossing = band(made([(a) => 1000 + 10 * a, (a) => 1300 - 20 * a]), 9, 11);
    // 1000 + 10 a and 1300 − 20 a meet at 10°; the lower envelope is lowest at an end, 1300 − 220.
    expect(crossing).toMatchObject({ status: 'capacity', capacity: 1080, governing: 1 });
    const jump = band(made([(a) => (a > 3.21 && a < 3.215 ? 1000 : a < 3.21 ? 900 - 20 * a : 1000)]), 0, 10);
    // From the left the curve falls to 900 − 64.2 just before the jump.
    expect(jump.status === 'capacity' && jump.capacity).toBeCloseTo(835.8, 4);
  });

  it('of one angle is the capacity there', () => {
    expect(band(made([(a) => 500 + a]), 12, 12)).toMatchObject({ status: 'capacity', capacity: 512 });
  });

  it('does not hold where an angle of it is not permitted or not covered', () => {
    const found = band(
      made([() => 1000], (a) => a < 8),
      0,
      15,
    );
    expect(found).toMatchObject({ status: 'not-permitted' });
    expect(found.status === 'not-permitted' && found.angle).toBeGreaterThanOrEqual(8);
    const beyond = prepare('en-1993-1-8-2005', plain);
    expect(beyond.at(toRadians(89), 'tension', new Float64Array(12))).toBe(NOT_COVERED);
    expect(band(beyond, 81, 89).status).toBe('not-covered');
  });
});

it('no angle of a band has a lower capacity than the one published for the band', { timeout: 60_000 }, () => {
  let held = 0;
  fc.assert(
    fc.property(
      gussetValues(false),
      fc.constantFrom(...bases.map(({ id }) => id)),
      fc.constantFrom('tension' as const, 'compression' as const),
      fc.double({ min: -75, max: 60, noNaN: true }),
      fc.double({ min: 0, max: 20, noNaN: true }),
      fc.array(fc.double({ min: 0, max: 1, noNaN: true }), { minLength: 60, maxLength: 60 }),
      (values, basis, sense, from, width, shares) => {
        const detail = prepare(basis, { ...values, fit_checks: 'waived' });
        const found = bandCapacity(detail, sense, toRadians(from), toRadians(from + width));
        fc.pre(found.status === 'capacity');
        held++;
        const out = new Float64Array(detail.limitStates.length);
        for (const share of shares) {
          const governing = detail.at(toRadians(from + share * width), sense, out);
          if (governing < 0) continue;
          expect(out[governing]).toBeGreaterThanOrEqual(found.capacity * (1 - 1e-9));
          expect(roundDown(out[governing]!, 1)).toBeGreaterThanOrEqual(roundDown(found.capacity, 1));
        }
      },
    ),
    { numRuns: 150 },
  );
  expect(held).toBeGreaterThanOrEqual(100);
});
