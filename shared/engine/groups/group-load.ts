/**
 * A load on a group of fasteners in the plane of the plate: a force and a moment about the ORIGIN of the
 * coordinates in which the group is given (x away from the support, y along it; anticlockwise positive).
 * With a force of 1 N the strength multiplier of a group is its coefficient C; with a moment of 1 and no force
 * it is the moment coefficient C', a length.
 */
export interface GroupLoad {
  readonly fx: number;
  readonly fy: number;
  /** Moment about the origin: N mm for forces in N, or mm for a unit force. */
  readonly moment: number;
}

/** A unit resultant at an angle (radians, from x towards y) whose line passes through (x, y), mm. */
export function unitLoadThrough(angle: number, x: number, y: number): GroupLoad {
  const fx = Math.cos(angle);
  const fy = Math.sin(angle);
  return { fx, fy, moment: x * fy - y * fx };
}

/** The moment of a load about another point, for example the group's centroid. */
export function momentAbout(load: GroupLoad, x: number, y: number): number {
  return load.moment - (x * load.fy - y * load.fx);
}

/**
 * Writes force and moment, the latter over a length, into `out` as a vector of length 1.
 * @returns the length that it had; 0 for a load that is zero or not finite
 */
export function unitVector({ fx, fy }: GroupLoad, momentOverLength: number, out: Float64Array): number {
  const size = Math.hypot(fx, fy, momentOverLength);
  if (!(size > 0) || !Number.isFinite(size)) return 0;
  out[0] = fx / size;
  out[1] = fy / size;
  out[2] = momentOverLength / size;
  return size;
}
