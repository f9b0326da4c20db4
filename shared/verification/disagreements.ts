import { aiscDisagreements } from './aisc/index.ts';
import type { Disagreement } from './check.ts';
import { csaDisagreements } from './csa/index.ts';
import { groupDisagreements } from './groups/disagreements.ts';

/** Published values that a reader may hold against the engine, and why it does not follow them. */
export const disagreements: readonly Disagreement[] = [
  {
    id: 'TRS-16',
    published: '291.72 MPa on the gusset of a truss node (Single-Storey Part 5, p. 5-93)',
    reason:
      'An extreme fibre of 325/2 is used with the second moment of a width of 286.5 mm; 286.5/2 gives 274.0 MPa.',
  },
  {
    id: 'TRS-17',
    published: 'throat 2.03 mm with βw 0.8 for S355 (Single-Storey Part 5, p. 5-86)',
    reason: 'Table 4.1 has βw 0.9 for S355: 2.29 mm with fu 510, 2.38 mm with fu 490. The engine takes 0.9.',
  },
  {
    id: 'S355-fu',
    published: 'fu of S355 as 510, 490 or 470 MPa; of S275 as 430 or 410 MPa',
    reason:
      'EN 1993-1-1 Table 3.1, its corrigendum and EN 10025-2 differ; bearing and welds move by up to 8.5 %. The catalogue takes the lowest and names its source; a steel by numbers takes any.',
  },
  {
    id: 'WLD-S355',
    published: 'full-strength fillets a ≥ 0.55 t for S355',
    reason: 'Holds with fu 510 alone; 0.576 t with fu 490 and 0.601 t with fu 470.',
  },
  {
    id: 'handbook-factors',
    published:
      '1.27 on gross shear, 0.8 on support-side bolts, 0.5 on eccentric block tearing in fin plate and end plate examples',
    reason:
      'The first two are handbook practice and not in EN 1993-1-8; the 0.5 is 3.10.2(3). Each is a choice of the family, on unless it is turned off.',
  },
  {
    id: 'CLT-11-mode-1',
    published: '696 kN, tying of cleats in mode 1 (Multi-Storey Part 5, p. 5-79)',
    reason:
      'Method 2 of Table 6.2, which counts the width of the bolt head. The engine takes method 1, 4 × 4.2/0.031 = 542 kN, the lower of the two.',
  },
  {
    id: 'CLT-08',
    published: '1076 kN, two cleats in gross shear over 1.27 (Multi-Storey Part 5, p. 5-74)',
    reason:
      '8600 × 275/(1.27 √3) = 1075.14 kN: the print is one higher in its last place, and nothing it prints on the way explains it.',
  },
  {
    id: 'M12-holes',
    published: 'M12 in tables with 14 mm holes and 0.85 on shear',
    reason:
      'EN 1090-2 has 13 mm as the normal hole, which takes no 0.85. Both hold in their own setting; the hole is a parameter.',
  },
  {
    id: 'PUN',
    published: 'punching thicknesses of the Orange Book',
    reason:
      'They fit the width across flats; EN 1993-1-8 defines the mean of points and flats, about 5 % higher. The table errs low.',
  },
  {
    id: 'alpha-0.61',
    published: 'bearing of end bolts at 40/66 in FIN-04, PDE-01, CLT-05',
    reason: 'α_b is rounded up to 0.61 before it is used, so the print is 0.7 to 1.0 % high.',
  },
  ...csaDisagreements,
  ...aiscDisagreements,
  ...groupDisagreements,
];

/** Published checks that wait for parts of the engine: nothing here is claimed. */
export const notYetAnswered: readonly Disagreement[] = [
  { id: 'SLP-*', published: 'slip resistance', reason: 'Slip-resistant bolts are not covered.' },
  {
    id: 'TRS-08, 11…15',
    published: 'slip and sections of a truss node',
    reason: 'Not limit states of a kind.',
  },
];
