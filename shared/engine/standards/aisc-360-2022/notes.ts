import type { BasisInfo } from '../../types.ts';
import type { Format } from './format.ts';

const notes: BasisInfo['notes'] = [
  {
    id: 'fillet-direction',
    text: 'A fillet takes its directional increase only where the resultant passes through the middle of the weld (offset 0); an eccentric weld by the elastic method takes 1.0, as the 2022 edition has it.',
    clause: 'AISC 360 J2.4(a)',
  },
  {
    id: 'base-metal',
    text: 'Base metal at a fillet: the plate breaks under pull and shear together as the root of the sum of squares, each fillet with half of the thickness; the support carries each fillet in shear through its thickness, taken as that of the plate where none is given.',
    clause: 'AISC 360 J2.4, J4',
  },
  {
    id: 'bolt-group',
    text: 'Each bolt counts for the least of its shear, bearing and tear-out on gusset and brace; the group is their sum.',
    clause: 'AISC 360 J3.7, J3.11',
  },
  {
    id: 'bolt-stresses',
    text: 'A325M and A490M take Groups 120 and 150 of Table J3.2. Property classes take 0.75, 0.450 and 0.563 of their least ISO 898-1 strength as threaded parts, 8.8 not above Group 120 and 10.9 not above Group 150: the lower of the two.',
    clause: 'AISC 360 Table J3.2',
  },
  {
    id: 'long-joint',
    text: 'Table J3.2 covers joints up to 965 mm between end bolts; longer ones take 0.833.',
    clause: 'AISC 360 Table J3.2, note [b]',
  },
  {
    id: 'holes',
    text: 'Holes are deducted 2 mm over their diameter however they are made.',
    clause: 'AISC 360 B4.3b',
  },
  {
    id: 'block-shear',
    text: 'Blocks of gussets and braces take U_bs = 1.0 whether the bolts stand in one line or two, as the Commentary shows them; coped beam ends with two lines take 0.5.',
    clause: 'AISC 360 J4.3',
  },
  {
    id: 'shear-lag',
    text: 'Angles by one leg take U = 1 − x/l, not below the share of the connected leg; with one row that share alone. The larger values of case 8 are not used.',
    clause: 'AISC 360 D3, Table D3.1',
  },
  {
    id: 'compression',
    text: 'A plate with K L/r up to 25 yields; beyond that Chapter E governs.',
    clause: 'AISC 360 J4.4, E3',
  },
  {
    id: 'plate-section',
    text: 'Pull, shear and bending on the plate are combined at yield with the factor of tension yield, which is below that of shear yield.',
    clause: 'AISC 360 J4.1, J4.2',
  },
];

/** What the basis of a format is called, and its notes: the choices made in ANSI/AISC 360-22. */
export function infoOf(format: Format): BasisInfo {
  const isLrfd = format.id === 'lrfd';
  const name = isLrfd ? 'LRFD' : 'ASD';
  return {
    id: isLrfd ? 'aisc-360-2022-lrfd' : 'aisc-360-2022-asd',
    title: `ANSI/AISC 360-22, specification for structural steel buildings, ${name}`,
    short: `AISC 360-22 ${name}`,
    resultLabel: isLrfd ? 'design strength' : 'allowable strength',
    hasPartialFactors: false,
    defaultFactors: { gammaM0: 1, gammaM1: 1, gammaM2: 1 },
    notes: [
      {
        id: 'format',
        text: isLrfd
          ? 'Values are design strengths φR_n: compare them with the effects of LRFD load combinations.'
          : 'Values are allowable strengths R_n/Ω: compare them with the effects of ASD load combinations.',
        clause: isLrfd ? 'AISC 360 B3.1' : 'AISC 360 B3.2',
      },
      ...notes,
      {
        id: 'centre',
        text: 'The coefficient of the instantaneous centre is a multiple of the ultimate strength of a bolt.',
        clause: 'AISC Manual, Part 7',
      },
      {
        id: 'prying',
        text: 'Prying by the published method of b, a, ρ and δ. Recent practice bends the plate with its tensile strength, older practice with its yield strength: the family says which, and yield, the lower, is the default. Beside shear a bolt keeps min(1, 1.3 − f_rv/F_cv) of its tension, applied whatever the share of either stress.',
        clause: 'AISC Manual Part 9, AISC 360 J3.8',
      },
    ],
  };
}
