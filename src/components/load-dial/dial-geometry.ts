import type { CapacityCurve } from './types.ts';

/** Measures of the dial in its own units. The support's face is the vertical line at x = cx. */
export const DIAL = { cx: 34, cy: 158, radius: 132, plot: 112, width: 196, height: 316 } as const;

export interface At {
  readonly x: number;
  readonly y: number;
}

/** The point at a load angle in degrees, from the normal of the face, upwards positive. */
export function pointAt(angle: number, radius: number): At {
  const theta = (angle * Math.PI) / 180;
  return { x: DIAL.cx + radius * Math.cos(theta), y: DIAL.cy - radius * Math.sin(theta) };
}

/** The load angle of a point of the dial, within its limits, to a whole step. */
export function angleOf({ x, y }: At, minimum: number, maximum: number, step: number): number {
  const angle = (Math.atan2(DIAL.cy - y, Math.max(0, x - DIAL.cx)) * 180) / Math.PI;
  return clampAngle(angle, minimum, maximum, step);
}

export function clampAngle(angle: number, minimum: number, maximum: number, step: number): number {
  const whole = Number((Math.round(angle / step) * step).toFixed(6));
  return Math.min(maximum, Math.max(minimum, whole)) + 0;
}

const written = ({ x, y }: At) => `${x.toFixed(2)} ${y.toFixed(2)}`;

export const arc = (from: number, to: number, radius: number): string =>
  `M${written(pointAt(from, radius))}A${radius} ${radius} 0 0 0 ${written(pointAt(to, radius))}`;

export const spoke = (angle: number, inner: number, outer: number): string =>
  `M${written(pointAt(angle, inner))}L${written(pointAt(angle, outer))}`;

/** A stretch of the curve over which one limit state governs. */
export interface Stretch {
  readonly governing: number;
  readonly from: number;
  readonly to: number;
  readonly path: string;
}

/** The largest capacity of a curve; 0 when there is none. */
export const peakOf = (curve: CapacityCurve): number =>
  curve.capacity.reduce<number>((most, value) => Math.max(most, value ?? 0), 0);

/** Stretches of like outcome. A capacity is drawn from the centre outwards, the peak reaching the plot's rim. */
export function stretchesOf(curve: CapacityCurve): Stretch[] {
  const scale = DIAL.plot / (peakOf(curve) || 1);
  const stretches: Stretch[] = [];
  let start = 0;
  for (let at = 1; at <= curve.angles.length; at++) {
    if (at < curve.angles.length && curve.governing[at] === curve.governing[start]) continue;
    const governing = curve.governing[start] ?? -1;
    // A drawn stretch runs on to the first point of the next, so that the line has no gaps.
    const end = at < curve.angles.length && curve.capacity[at] !== null && governing >= 0 ? at : at - 1;
    const points: string[] = [];
    for (let point = start; point <= end; point++) {
      const capacity = curve.capacity[point];
      if (capacity !== null && capacity !== undefined)
        points.push(written(pointAt(curve.angles[point] ?? 0, capacity * scale)));
    }
    stretches.push({
      governing,
      from: curve.angles[start] ?? 0,
      to: curve.angles[at - 1] ?? 0,
      path: points.length ? `M${points.join('L')}` : '',
    });
    start = at;
  }
  return stretches;
}

/** Rings of the plot at round capacities, at most three. */
export function ringsOf(peak: number): number[] {
  if (peak <= 0) return [];
  const raw = peak / 3;
  const power = 10 ** Math.floor(Math.log10(raw));
  const step = ([1, 2, 5, 10].find((factor) => factor * power >= raw) ?? 10) * power;
  return [1, 2, 3].map((times) => Number((times * step).toPrecision(6))).filter((value) => value <= peak);
}

/** Capacity at an angle between the points of the curve: the lower of the two neighbours. */
export function capacityNear(curve: CapacityCurve, angle: number): number | null {
  const after = curve.angles.findIndex((value) => value >= angle - 1e-9);
  if (after < 0) return null;
  const exact = Math.abs((curve.angles[after] ?? NaN) - angle) < 1e-9;
  const here = curve.capacity[after] ?? null;
  if (exact || after === 0) return here;
  const before = curve.capacity[after - 1] ?? null;
  return here === null || before === null ? null : Math.min(here, before);
}
