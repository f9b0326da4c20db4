import type { AlternativeStrength, SteelRecord } from '../types.ts';
import { bands } from './bands.ts';

const G40 = {
  standard: 'CSA G40.21',
  products: ['plate', 'section'] as const,
  tMin: 3,
  practices: ['csa'] as const,
  source: 'CSA G40.20/G40.21 Table 6',
  edition: 'CSA G40.20-13/G40.21-13',
  evidence: 'from memory; 350W seen in published course notes',
  missing: [{ field: 'bands above 65 mm', reason: 'yield falls above 65 mm by an amount not known to us' }],
};
const ASTM = {
  tMin: 3,
  practices: ['aisc'] as const,
  evidence: 'from memory; A992 and A572 Gr 50 seen in published worked examples',
  missing: [{ field: 'bands above 100 mm', reason: 'not taken up: connection parts do not reach it' }],
};
const earlier300W: readonly AlternativeStrength[] = [
  { fu: 450, source: 'CSA G40.21, earlier editions and hollow sections' },
];

/** Steels of CSA G40.21 and ASTM. MPa by thickness in mm; ASTM in hard metric. */
export const northAmericanSteels: readonly SteelRecord[] = [
  {
    ...G40,
    name: '300W',
    bands: bands([65, 300, 440, earlier300W]),
    note: 'f_u is the lower printed value.',
  },
  { ...G40, name: '350W', bands: bands([65, 350, 450]), note: '' },
  {
    ...ASTM,
    name: 'A36',
    standard: 'ASTM A36/A36M',
    products: ['plate', 'section'],
    bands: bands([100, 250, 400]),
    note: '36 ksi and 58 ksi.',
    source: 'ASTM A36/A36M tensile requirements',
    edition: 'ASTM A36/A36M-19',
  },
  {
    ...ASTM,
    name: 'A572-50',
    standard: 'ASTM A572/A572M',
    products: ['plate', 'section'],
    bands: bands([100, 345, 450]),
    note: 'Grade 50 [345]: 50 ksi and 65 ksi.',
    source: 'ASTM A572/A572M tensile requirements, Grade 50',
    edition: 'ASTM A572/A572M-21',
  },
  {
    ...ASTM,
    name: 'A992',
    standard: 'ASTM A992/A992M',
    products: ['section'],
    bands: bands([100, 345, 450]),
    note: 'Rolled shapes: 50 ksi and 65 ksi.',
    source: 'ASTM A992/A992M tensile requirements',
    edition: 'ASTM A992/A992M-20',
  },
];
