import type { BasisInfo } from '../../types.ts';

export const info: BasisInfo = {
  id: 'en-1993-1-8-2005',
  title: 'EN 1993-1-8:2005 with EN 1993-1-1:2005',
  short: 'EN 1993-1-8',
  resultLabel: 'design resistance',
  hasPartialFactors: true,
  defaultFactors: { gammaM0: 1, gammaM1: 1, gammaM2: 1.25 },
  notes: [
    {
      id: 'partial-factors',
      text: 'Partial factors are the recommended values unless the firm sets those of its National Annex.',
      clause: 'EN 1993-1-1 6.1, EN 1993-1-8 2.2',
    },
    {
      id: 'tensile-strength',
      text: 'Tensile strengths of S275 and S355 differ by printing and product standard; the steel record names its source and the lowest is the default.',
      clause: 'EN 1993-1-1 Table 3.1, EN 10025-2',
    },
    {
      id: 'small-bolts',
      text: 'M12 and M14 bolts in holes with 2 mm clearance take 0.85 on shear, for classes 4.8, 5.8, 6.8, 8.8 and 10.9.',
      clause: 'EN 1993-1-8 3.6.1(5)',
    },
    {
      id: 'group',
      text: 'The bearing of a group is the sum over its bolts only where the shear resistance of a bolt is not below the bearing of any; otherwise the number times the least.',
      clause: 'EN 1993-1-8 3.7',
    },
    {
      id: 'long-joint',
      text: 'Bolt shear in joints longer than 15 d is multiplied by β_Lf.',
      clause: 'EN 1993-1-8 3.8',
    },
    {
      id: 'block-eccentric',
      text: 'Blocks held by one shear plane, and angles bolted by one leg, take 0.5 on the net tension term.',
      clause: 'EN 1993-1-8 3.10.2(3)',
    },
    {
      id: 'angle-lines',
      text: 'An angle with two lines of bolts in one leg takes the same reduction as one line, counted by rows along the force: the clause covers one line only.',
      clause: 'EN 1993-1-8 3.10.3',
    },
    {
      id: 'fillet',
      text: 'Fillet welds by the directional method unless the family chooses the simplified one. The base metal beside a fillet has no check of its own here.',
      clause: 'EN 1993-1-8 4.5.3',
    },
    {
      id: 'shear-section',
      text: 'Net sections in shear take f_u/(√3 γ_M2), as handbooks of simple connections do. Their 1.27 on gross shear is not in the standard: the family says whether it is taken.',
      clause: 'EN 1993-1-1 6.2.6',
    },
    {
      id: 'prying',
      text: 'T-stubs take the least of modes 1, 2 and 3 by method 1 without backing plates; prying is taken to develop, and the sheet prints the bolt length L_b* up to which it does: with longer bolts a thick plate lifts off first and carries not more than 2 M_pl,1,Rd/m, half of mode 1. Beside shear a bolt keeps min(1, 1.4 (1 − F_v/F_v,Rd)) of its tension for the stub, taken of B_p,Rd where punching is the lesser. A family may ask for the tying resistance instead, with f_u/1.10 in bending as handbooks of simple connections take it.',
      clause: 'EN 1993-1-8 6.2.4, Table 3.4',
    },
    {
      id: 'curve',
      text: 'Plates in compression are solid sections on buckling curve c.',
      clause: 'EN 1993-1-1 Table 6.2',
    },
  ],
};
