import type { ParameterSpec } from '../../types.ts';

/** Bolts and their holes: parameters that several kinds share. */
export const boltSize: ParameterSpec = {
  name: 'bolt_size',
  label: 'Bolt size',
  symbol: 'd',
  group: 'bolts',
  type: 'boltSize',
  unit: '',
  default: 'M20',
  help: 'By catalogue name, or { d, stressArea } in mm and mm².',
};

export const boltGrade: ParameterSpec = {
  name: 'bolt_grade',
  label: 'Bolt grade',
  symbol: '',
  group: 'bolts',
  type: 'boltGrade',
  unit: '',
  default: '8.8',
  help: 'By catalogue name, or { fyb, fub } in MPa.',
};

export const threads: ParameterSpec = {
  name: 'threads',
  label: 'Threads',
  symbol: '',
  group: 'bolts',
  type: 'choice',
  unit: '',
  choices: [
    { value: 'in_plane', label: 'In a shear plane', help: 'A shear plane may cut the threads.' },
    {
      value: 'out_of_plane',
      label: 'Kept out of the shear planes',
      help: 'Every shear plane cuts the shank.',
    },
  ],
  default: 'in_plane',
  help: 'Where the threads lie.',
};

export const holeDiameter: ParameterSpec = {
  name: 'hole_diameter',
  label: 'Hole diameter',
  symbol: 'd_0',
  group: 'bolts',
  type: 'length',
  unit: 'mm',
  minimum: 0,
  maximum: 120,
  default: 0,
  help: 'Diameter of the round holes. 0: the normal round hole of the basis.',
  zero: 'normal hole',
};

export const holeDeformation: ParameterSpec = {
  name: 'hole_deformation',
  label: 'Deformation at the holes',
  symbol: '',
  group: 'method',
  type: 'choice',
  unit: '',
  choices: [
    { value: 'limited', label: 'Limited', help: '2.4 d t F_u and 1.2 l_c t F_u.' },
    { value: 'accepted', label: 'Accepted', help: '3.0 d t F_u and 1.5 l_c t F_u.' },
  ],
  default: 'limited',
  bases: ['aisc-360-2022-lrfd', 'aisc-360-2022-asd'],
  help: 'Whether holes that lengthen under service load are a design consideration.',
};
