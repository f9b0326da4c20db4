import type { BasisInfo } from '../../types.ts';

export const info: BasisInfo = {
  id: 'sans-10162-1-2011',
  title: 'SANS 10162-1:2011, limit-states design of hot-rolled steelwork',
  short: 'SANS 10162-1',
  resultLabel: 'factored resistance',
  hasPartialFactors: false,
  defaultFactors: { gammaM0: 1, gammaM1: 1, gammaM2: 1 },
  notes: [
    {
      id: 'block-shear',
      text: 'Block shear is the lesser of the two expressions: gross shear yield or net shear rupture with net tension rupture. Both take φ = 0.90.',
      clause: 'SANS 10162-1 13.11',
    },
    {
      id: 'net-section',
      text: 'Net sections take 0.85 φ; angles bolted by one leg count 0.80 of their net area with four or more rows and 0.60 with fewer.',
      clause: 'SANS 10162-1 12.3.3.2, 13.2',
    },
    {
      id: 'long-joint',
      text: 'Bolt shear in joints longer than 15 d is multiplied by 1.075 − 0.005 L/d, not below 0.75.',
      clause: 'SANS 10162-1 13.12.1.1',
    },
    {
      id: 'bearing-factor',
      text: 'Bearing takes φ_br = 0.67; the bolts share the force equally and the weakest bolt sets the group, which errs low.',
      clause: 'SANS 10162-1 13.10',
    },
    {
      id: 'bolt-strength',
      text: 'The tensile strength of a bolt is the least that ISO 898-1 allows for its class and size.',
      clause: 'SANS 10162-1 13.12',
    },
    {
      id: 'holes',
      text: 'Holes are deducted 2 mm over their diameter when punched.',
      clause: 'SANS 10162-1 12.3.2',
    },
    {
      id: 'base-metal',
      text: 'The base metal at a fillet is always checked, with the tensile strength of the weaker part.',
      clause: 'SANS 10162-1 13.13.2.2(a)',
    },
    {
      id: 'shear-tension',
      text: 'Shear with tension on a bolt takes the lower of the straight line to 1.4 and the circle, since both are found in practice.',
      clause: 'SANS 10162-1 13.12.1.3',
    },
    {
      id: 'buckling-curve',
      text: 'Plates in compression use n = 1.34.',
      clause: 'SANS 10162-1 13.3.1',
    },
    {
      id: 'shear-section',
      text: 'Plates and webs in shear take 0.60 f_y on the gross and 0.60 f_u on the net section, both with φ = 0.90, as the shear plane of a block does; 0.66 f_y of a rolled web is not used.',
      clause: 'SANS 10162-1 13.4, 13.11',
    },
    {
      id: 'centre',
      text: 'The coefficient of the instantaneous centre is a multiple of the ultimate strength of a bolt, as the AISC Manual has it: 1.9 % lower than by the force at the greatest deformation.',
      clause: 'Crawford and Kulak, 1971',
    },
    {
      id: 'prying',
      text: 'Prying by the published method of b, a, ρ and δ. Recent practice bends the plate with its tensile strength, older practice with its yield strength: the family says which, and yield, the lower, is the default. Beside shear a bolt keeps the lower of the straight line 1.4 − V/V_r and the circle.',
      clause: 'SANS 10162-1 13.12.1.2, 13.12.1.3, published method',
    },
  ],
};
