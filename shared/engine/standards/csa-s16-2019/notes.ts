import type { BasisInfo } from '../../types.ts';

export const info: BasisInfo = {
  id: 'csa-s16-2019',
  title: 'CSA S16:19, design of steel structures',
  short: 'CSA S16',
  resultLabel: 'factored resistance',
  hasPartialFactors: false,
  defaultFactors: { gammaM0: 1, gammaM1: 1, gammaM2: 1 },
  notes: [
    {
      id: 'edition',
      text: 'Written from the rules of S16-14 and S16:19, between which these clauses are the same as far as is known; the printed standard was not at hand.',
      clause: 'CSA S16:19',
    },
    {
      id: 'block-shear',
      text: 'Tension-and-shear blocks take φ_u = 0.75 and the mean of yield and tensile strength on the gross shear planes; U_t is 1.0 for an even pull and 0.6 for an angle by one leg and for a block at one side.',
      clause: 'CSA S16 13.11',
    },
    {
      id: 'tear-out',
      text: 'Tear-out is the block without tension: two gross planes along every line of bolts, the shortest line taken for all. It is checked with block shear; bearing knows no end distance.',
      clause: 'CSA S16 13.11',
    },
    {
      id: 'net-section',
      text: 'Net sections take φ_u = 0.75; angles bolted by one leg count 0.80 of their net area with four or more rows and 0.60 with fewer.',
      clause: 'CSA S16 12.3.3.2, 13.2',
    },
    {
      id: 'long-joint',
      text: 'Bolts in joints of 760 mm or more take 0.50 in place of 0.60. Earlier editions began at 15 d.',
      clause: 'CSA S16 13.12.1.2(c)',
    },
    {
      id: 'bolt-strength',
      text: 'The tensile strength of a bolt is the least of its product standard: F3125M for A325M and A490M, ISO 898-1 for property classes.',
      clause: 'CSA S16 13.12',
    },
    {
      id: 'holes',
      text: 'Holes are deducted 2 mm over their diameter when punched, which is assumed unless drilled is chosen.',
      clause: 'CSA S16 12.3.2',
    },
    {
      id: 'base-metal',
      text: 'The base metal at a fillet is checked unless the electrode is said to match; the standard asks for it with over-matched electrodes only.',
      clause: 'CSA S16 13.13.2.2',
    },
    {
      id: 'one-line',
      text: 'M_w is 1: the whole weld lies in one direction. The directional increase follows the resultant on each millimetre.',
      clause: 'CSA S16 13.13.2.2',
    },
    {
      id: 'shear-tension',
      text: 'Shear with tension on a bolt takes the circle.',
      clause: 'CSA S16 13.12.1.4',
    },
    {
      id: 'buckling-curve',
      text: 'Plates in compression use n = 1.34.',
      clause: 'CSA S16 13.3.1',
    },
    {
      id: 'shear-section',
      text: 'Plates and webs in shear take 0.60 φ F_y on the gross section, not the 0.66 of a rolled web, and besides 0.60 φ_u F_u on the net section with φ_u = 0.75.',
      clause: 'CSA S16 13.4, 13.11',
    },
    {
      id: 'centre',
      text: 'The coefficient of the instantaneous centre is a multiple of the force of a bolt at its greatest deformation, as the CISC Handbook has it.',
      clause: 'CISC Handbook, Part 3',
    },
    {
      id: 'prying',
      text: 'Prying by the published method of b, a, ρ and δ. Recent practice bends the plate with its tensile strength, older practice with its yield strength: the family says which, and yield, the lower, is the default. Beside shear a bolt keeps the circle √(1 − (V_f/V_r)²) of its tension.',
      clause: 'CSA S16 13.12.1.3, 13.12.1.4, CISC Handbook Part 3',
    },
  ],
};
