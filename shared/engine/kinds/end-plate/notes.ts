import type { EndPlateModel } from './model.ts';

/** What the kind assumes; printed on every sheet and export. */
export const notes: readonly string[] = [
  'One resultant in the plane of the web at mid-height of the bolts: N pulls off the face, V runs along it; a push towards the support is not covered.',
  'A simple connection: no moment of the beam is carried, and the bolts share shear and pull equally.',
  'The plate is welded to the web on both sides; forces in the weld are elastic. A flush plate’s welds to the flanges are not counted (errs low).',
  'Under a pull the plate bends as a T-stub about the web; rows beside a flange take no help of it (errs low).',
  'The shear and the pull on a bolt are combined by the rule of the basis, with the prying that is left to it: the capacity is the root of that equation.',
  'Bearing on the support is checked where its thickness is given, without a free edge; bending of the support under the pull is not covered.',
  'The web of the beam counts over the height of the plate between its flanges. Copes of the beam are not covered.',
  'Simple end plates: t ≤ d/1.9 √(f_ub/f_y), cross centres of 90 to 140 mm and a height of at least 0.6 of the depth of the beam, unless the family waives the rules of practice.',
];

const waivedFit = 'Spanner room was waived for this detail and must be proved on the drawing.';
const waivedPractice =
  'The rules of practice for ductility and torsion were waived for this detail: its rotation must be shown otherwise.';
const unchecked =
  'The thickness of the support is not given: bearing and the drawing through of heads are not checked on it.';

/** The notes of one detail: what its family waived or left out comes first. */
export function notesOf(m: EndPlateModel): readonly string[] {
  return [
    ...(m.fitWaived ? [waivedFit] : []),
    ...(m.practiceWaived ? [waivedPractice] : []),
    ...(m.supportBearing === null ? [unchecked] : []),
    ...notes,
  ];
}
