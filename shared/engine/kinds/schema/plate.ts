import type { ParameterSpec } from '../../types.ts';

/** Steel, edges and holes of welded plates and their supports: parameters that several kinds share. */
export const supportSteel: ParameterSpec = {
  name: 'support_steel',
  label: 'Steel of the support',
  symbol: '',
  group: 'support',
  type: 'steel',
  unit: '',
  choices: [
    { value: 'same', label: 'Same as the plate', help: 'The support has the strength of the plate.' },
  ],
  default: 'same',
  help: 'The weld takes the weaker of plate and support.',
};

export const supportThickness: ParameterSpec = {
  name: 'support_thickness',
  label: 'Thickness of the support',
  symbol: 't_s',
  group: 'support',
  type: 'length',
  unit: 'mm',
  minimum: 0,
  maximum: 200,
  default: 0,
  help: 'Flange or wall that the plate is welded to; sets the least weld size. 0: not thicker than the plate.',
  zero: 'not thicker than the plate',
};

export const plateSteel: ParameterSpec = {
  name: 'plate_steel',
  label: 'Plate steel',
  symbol: '',
  group: 'plate',
  type: 'steel',
  unit: '',
  default: 'S355',
  help: 'Grade by catalogue name, read at the plate thickness, or { fy, fu } in MPa.',
};

export const edgeFinish: ParameterSpec = {
  name: 'edge_finish',
  label: 'Plate edges',
  symbol: '',
  group: 'plate',
  type: 'choice',
  unit: '',
  choices: [
    { value: 'sheared', label: 'Sheared', help: 'The larger edge distances.' },
    { value: 'rolled', label: 'Rolled, sawn or gas cut', help: 'The smaller edge distances.' },
  ],
  default: 'sheared',
  bases: ['sans-10162-1-2011', 'csa-s16-2019'],
  help: 'How the edges of the plate and the end of the bolted member are made.',
};

export const holeMaking: ParameterSpec = {
  name: 'hole_making',
  label: 'Holes',
  symbol: '',
  group: 'plate',
  type: 'choice',
  unit: '',
  choices: [
    { value: 'punched', label: 'Punched', help: '2 mm more is deducted from net areas.' },
    { value: 'drilled', label: 'Drilled', help: 'The hole itself is deducted.' },
  ],
  default: 'punched',
  bases: ['sans-10162-1-2011', 'csa-s16-2019'],
  help: 'How holes are made in the plate and in the bolted member.',
};

export const exposure: ParameterSpec = {
  name: 'exposure',
  label: 'Exposure',
  symbol: '',
  group: 'method',
  type: 'choice',
  unit: '',
  choices: [
    { value: 'exposed', label: 'Weather or corrosion', help: 'Edge distances have an upper limit.' },
    { value: 'sheltered', label: 'Sheltered', help: 'Edge distances have no upper limit.' },
  ],
  default: 'exposed',
  bases: ['en-1993-1-8-2005'],
  help: 'Whether the steel is exposed to weather or other corrosive influences.',
};
