/**
 * Bolts in level rows and in columns along the face of the support: x away from the face, y up. mm.
 * Row 0 is the lowest, column 0 the nearest to the support.
 */
export interface UprightGroup {
  readonly rows: number;
  readonly columns: number;
  /** Between rows. */
  readonly pitch: number;
  /** Between columns. */
  readonly gauge: number;
}

/** From the outer bolts to the edges of a ply, mm; Infinity where an edge is held, as by a weld. */
export interface PlyEdges {
  /** From column 0 towards the support. */
  readonly near: number;
  /** From the last column away from the support. */
  readonly far: number;
  readonly below: number;
  readonly above: number;
}

/** Height of the group between its outer rows, mm. */
export function groupHeight(group: UprightGroup): number {
  return (group.rows - 1) * group.pitch;
}

/** Width of the group between its outer columns, mm. */
export function groupWidth(group: UprightGroup): number {
  return (group.columns - 1) * group.gauge;
}
