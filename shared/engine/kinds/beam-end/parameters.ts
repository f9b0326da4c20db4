import type { ParameterSpec } from '../../types.ts';

const length = (
  name: string,
  label: string,
  symbol: string,
  maximum: number,
  fallback: number,
  help: string,
): ParameterSpec => ({
  name,
  label,
  symbol,
  group: 'beam',
  type: 'length',
  unit: 'mm',
  minimum: 0,
  maximum,
  default: fallback,
  help,
});

/** The supported beam at its bolted end, in the order of a form: shared by every kind that bolts a beam's web. */
export const beamParameters: readonly ParameterSpec[] = [
  {
    name: 'beam_section',
    label: 'Section of the beam',
    symbol: '',
    group: 'beam',
    type: 'section',
    unit: '',
    shapes: ['i'],
    default: 'IPE400',
    help: 'I section by catalogue name, or by numbers: { shape: "i", depth, width, webThickness, flangeThickness, rootRadius }.',
  },
  {
    name: 'beam_steel',
    label: 'Steel of the beam',
    symbol: '',
    group: 'beam',
    type: 'steel',
    unit: '',
    default: 'S355',
    help: 'Grade by catalogue name, read at the thickness of the web, or { fy, fu } in MPa.',
  },
  length('beam_gap', 'End gap', 'g_h', 200, 10, 'From the face of the support to the end of the beam.'),
  {
    ...length(
      'beam_top_to_row',
      'Top of the beam to the first row',
      'e_1b',
      2000,
      0,
      'From the top of the beam, before any cope, to the highest row of bolts.',
    ),
    zero: 'bolts at mid-depth of the beam',
  },
  length('cope_top_length', 'Top cope, length', 'l_ct', 1500, 0, 'From the end of the beam. 0: no cope.'),
  length('cope_top_depth', 'Top cope, depth', 'd_ct', 1000, 0, 'From the top of the beam. 0: no cope.'),
  length(
    'cope_bottom_length',
    'Bottom cope, length',
    'l_cb',
    1500,
    0,
    'From the end of the beam. 0: no cope.',
  ),
  length(
    'cope_bottom_depth',
    'Bottom cope, depth',
    'd_cb',
    1000,
    0,
    'From the bottom of the beam. 0: no cope.',
  ),
];

/** Beam parameters whose 0 stands for the usual value or for none: left out of a sheet's list. */
export const beamUsual: readonly string[] = [
  'beam_top_to_row',
  'cope_top_length',
  'cope_top_depth',
  'cope_bottom_length',
  'cope_bottom_depth',
];
