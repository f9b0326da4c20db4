/** What a beam's bolted end assumes where bending of a coped end has a limit state of its own. */
export const beamNotesWithCope: readonly string[] = [
  'The web of the beam tears along the face towards a cope, or towards the back of the flange as if the web alone were there (errs low).',
  'A coped end is checked where its copes begin, elastically, with web buckling at one cope or sideways buckling between two as the AISC Manual, Part 9 has it; two copes take the longer length for both, and a cope of any length is taken to reach past the bolts.',
  'Under a pull the web counts over the height of the part that is bolted to it.',
  'Shear of the web: the depth left at the end times the web; the flanges of a section without root radii are left out.',
];

/** What a beam's bolted end assumes; for the notes of every kind that bolts a beam's web. */
export const beamNotes: readonly string[] = beamNotesWithCope.with(
  1,
  'Bending and stability of a coped end of the beam are not covered; a cope of any length is taken to reach past the bolts.',
);
