import type { ParameterSpec } from '../../types.ts';

/** Fillet welds: parameters that several kinds share. */
export const weldLeg: ParameterSpec = {
  name: 'weld_leg',
  label: 'Weld leg',
  symbol: 'z',
  group: 'weld',
  type: 'length',
  unit: 'mm',
  minimum: 2,
  maximum: 40,
  default: 8,
  help: 'Leg of each fillet; the throat is z/√2.',
};

export const electrode: ParameterSpec = {
  name: 'electrode',
  label: 'Electrode',
  symbol: 'X_u',
  group: 'weld',
  type: 'electrode',
  unit: '',
  default: 'E70XX',
  bases: ['sans-10162-1-2011', 'csa-s16-2019', 'aisc-360-2022-lrfd', 'aisc-360-2022-asd'],
  help: 'By catalogue name, or { xu } in MPa.',
};

export const electrodeMatch: ParameterSpec = {
  name: 'electrode_match',
  label: 'Base metal at the weld',
  symbol: '',
  group: 'weld',
  type: 'choice',
  unit: '',
  choices: [
    { value: 'over_matched', label: 'Checked', help: 'As for an electrode stronger than the parts.' },
    { value: 'matching', label: 'Matching electrode', help: 'The weld metal alone is checked.' },
  ],
  default: 'over_matched',
  bases: ['csa-s16-2019'],
  help: 'CSA S16 asks for the base metal with over-matched electrodes only.',
};

export const weldEnds: ParameterSpec = {
  name: 'weld_ends',
  label: 'Ends of the weld',
  symbol: '',
  group: 'weld',
  type: 'choice',
  unit: '',
  choices: [
    { value: 'full', label: 'Full size to the ends', help: 'The whole length counts.' },
    {
      value: 'deducted',
      label: 'Run-out deducted',
      help: 'EN: one throat at each end; the others: one leg at each end.',
    },
  ],
  default: 'full',
  help: 'Whether the fillets keep their size up to the ends.',
};

export const weldMethod: ParameterSpec = {
  name: 'weld_method',
  label: 'Weld method',
  symbol: '',
  group: 'method',
  type: 'choice',
  unit: '',
  choices: [
    { value: 'directional', label: 'Directional', help: 'EN 1993-1-8 4.5.3.2.' },
    { value: 'simplified', label: 'Simplified', help: 'EN 1993-1-8 4.5.3.3, lower.' },
  ],
  default: 'directional',
  bases: ['en-1993-1-8-2005'],
  help: 'Which of the two methods of EN 1993-1-8 sets the strength of the fillets.',
};
