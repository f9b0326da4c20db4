/** What the kind assumes; printed on every sheet and export. */
export const notes: readonly string[] = [
  'One resultant in the plane of the plate, along the line of the brace, which runs through the centre of the bolts: the bolts share it equally.',
  'The plate is welded on both sides over its full height, full size to the ends unless run-out is deducted; forces in the weld are elastic and its worst millimetre governs.',
  'Bearing on a rectangular plate is resolved along its edges and combined as the root of the sum of squares: the method of this catalogue.',
  'Where a bolt has no end ahead of it, the distance to the next bolt is used; in compression no end is ahead.',
  'Blocks of the gusset are torn outwards and blocks of the brace towards its own end, in tension only.',
  'The force spreads at 30° from the row farthest from the support to the nearest row, cut off by the outline and by the face.',
  'Buckling of the gusset takes the mean of three lengths to the face; K = 1.2 unless chosen, for a plate held along one edge only (common practice, errs low).',
  'In compression the brace itself is checked for its gross section only; its buckling is not covered.',
  'The support is covered only as the base metal at the weld.',
  'The mass is that of the gusset plate alone, a tapered plate taken at 0°; bolts and brace are not in it.',
  'Edge distances of a rectangular plate have no upper limit here: the plate runs on beyond the lap.',
  'The clearance of an angle to the support is taken for either way of turning it.',
];

/** Added when the checks of fit are waived. */
export const waivedNote =
  'Spanner room, root radius and clearance to the support were waived for this detail and must be proved on the drawing.';
