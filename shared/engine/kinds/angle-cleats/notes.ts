import { beamNotesWithCope } from '../beam-end/notes.ts';
import type { CleatModel } from './model.ts';

/** What the kind assumes; printed on every sheet and export. */
export const notes: readonly string[] = [
  'One resultant in the plane of the web at mid-height of the bolts: N pulls off the face, V runs along it; a push towards the support is not covered.',
  'The shear acts at the face of the support, in the middle of the bolts in the web, or each part is taken for the line that is worse for it; what lies away from the line takes the moment V e.',
  'Unless the family goes by the load angle, the shear is taken up and down and the worse kept.',
  'A simple connection that lets the beam turn: the moment V e about the face puts no tension on the bolts or welds at the support.',
  'Bolts in the web share the moment elastically or about their instantaneous centre, and the most loaded one governs; bolts at the support share a pull equally.',
  'The shear of a single cleat turns its bolts at the support in the plane of the face, about the middle of the web; the legs of a pair hold one another unless the family counts it for them.',
  'Bearing is resolved along the edges of legs and web and combined as the root of the sum of squares; blocks torn along and across the face are combined the same way: the method of this catalogue.',
  'Block shear along the face takes the lower of what the basis has for one leg of an angle and for a coped beam end, unless the family takes it as even.',
  'Under a pull two cleats bend as a T-stub about the web, beside their shear as the root of the sum of squares. A single one bends about its bolts alone unless its heel is held; the twist and the sideways bending of its lap are not covered.',
  'Shear and pull on a bolt are combined by the rule of the basis, with the prying that is left to it: the capacity is the root of that equation.',
  'A weld runs along the toe of each outstanding leg; returns at its top, twice the leg long, are not counted. Its moment in the plane of the support is elastic; pull and moment are added at its ends (errs low). Under a pull the leg bends from the heel and puts no moment into the weld.',
  'Bearing on the support is checked where its thickness is given, without a free edge; bending of the support is not covered.',
  'Cleats are not thicker than 16 mm (American practice, from memory) and at least 0.6 of the depth of the beam long, unless the family waives the rules of practice.',
  ...beamNotesWithCope,
];

const waivedFit =
  'Spanner room, root radii and clearances were waived for this detail and must be proved on the drawing.';
const waivedPractice =
  'The rules of practice for ductility and torsion were waived for this detail: its rotation must be shown otherwise.';
const unchecked =
  'The thickness of the support is not given: bearing and the drawing through of heads are not checked on it.';

/** The notes of one detail: what its family waived or left out comes first. */
export function notesOf(m: CleatModel): readonly string[] {
  return [
    ...(m.fitWaived ? [waivedFit] : []),
    ...(m.practiceWaived ? [waivedPractice] : []),
    ...(m.bolts !== null && m.supportThickness === 0 ? [unchecked] : []),
    ...notes,
  ];
}
