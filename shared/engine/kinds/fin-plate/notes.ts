import { beamNotesWithCope } from '../beam-end/notes.ts';
import type { FinPlateModel } from './model.ts';

/** What the kind assumes; printed on every sheet and export. */
export const notes: readonly string[] = [
  'One resultant in the plane of the plate at mid-height of the bolts: N pulls off the face, V runs along it; a push towards the support is not covered.',
  'The shear acts at the face of the support, in the middle of the bolts, or each part is taken for the line that is worse for it; what lies away from the line takes the moment V e.',
  'Unless the family goes by the load angle, the shear is taken up and down and the worse kept.',
  'The plate is welded on both sides over its full height; forces in the weld are elastic and its worst millimetre governs.',
  'Bolts share the moment elastically, in proportion to their distance from the middle of the group, and the most loaded one governs; where the family takes the instantaneous centre their shear is found by it, their bearing elastically all the same (errs low).',
  'Bearing is resolved along the edges of plate and web and combined as the root of the sum of squares; blocks torn along and across the face are combined the same way: the method of this catalogue.',
  'The welded edge of the plate is no free edge. The lap is on one side of the web: its small twist is not covered.',
  'The plate at the first column is checked on its gross section against yield and on its net section against rupture.',
  'A plate is long where the first column is farther from the face than t/0.15 (Steel Buildings in Europe, Part 5). It then carries what the buckling curve of the basis for struts leaves of its elastic moment, for an even moment between weld and bolts (errs low); the extended single plates of American practice are checked the same way.',
  'The plate is not thicker than half a bolt and at least 0.6 of the depth of the beam high, unless the family waives the rules of practice (Steel Buildings in Europe, Part 5).',
  'A full-strength weld is as strong across the plate as the plate yields. The support is covered only as the base metal at the weld.',
  ...beamNotesWithCope,
];

const waivedFit =
  'Spanner room, root radii and clearances were waived for this detail and must be proved on the drawing.';
const waivedPractice =
  'The rules of practice for ductility and torsion were waived for this detail: its rotation must be shown otherwise.';

/** The notes of one detail: what its family waived comes first. */
export function notesOf(m: FinPlateModel): readonly string[] {
  return [...(m.fitWaived ? [waivedFit] : []), ...(m.practiceWaived ? [waivedPractice] : []), ...notes];
}
