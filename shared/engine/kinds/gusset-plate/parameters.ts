import type { ParameterSpec } from '../../types.ts';
import { edgeFinish, holeMaking, plateSteel, supportSteel, supportThickness } from '../schema/plate.ts';
import { electrode, electrodeMatch, weldEnds, weldLeg, weldMethod } from '../schema/weld.ts';
import { boltParameters, memberParameters } from './parameters-brace.ts';

const supportParameters: readonly ParameterSpec[] = [supportSteel, supportThickness];

const plateParameters: readonly ParameterSpec[] = [
  {
    name: 'plate_thickness',
    label: 'Plate thickness',
    symbol: 't',
    group: 'plate',
    type: 'length',
    unit: 'mm',
    minimum: 3,
    maximum: 100,
    default: 12,
    help: 'Thickness of the gusset plate.',
  },
  plateSteel,
  {
    name: 'outline',
    label: 'Outline',
    symbol: '',
    group: 'plate',
    type: 'choice',
    unit: '',
    choices: [
      {
        value: 'tapered',
        label: 'Tapered',
        help: 'Cut square to the brace; the sides run to the ends of the weld.',
      },
      {
        value: 'rectangular',
        label: 'Rectangular',
        help: 'As high as the weld, with a fixed projection from the face.',
      },
    ],
    default: 'tapered',
    help: 'Shape of the plate.',
  },
  {
    name: 'projection',
    label: 'Projection from the face',
    symbol: 'P',
    group: 'plate',
    type: 'length',
    unit: 'mm',
    minimum: 20,
    maximum: 3000,
    default: 380,
    when: { parameter: 'outline', is: ['rectangular'] },
    help: 'Width of a rectangular plate, from the face of the support.',
  },
  {
    name: 'gusset_end_distance',
    label: 'End distance on the gusset',
    symbol: 'e_g',
    group: 'plate',
    type: 'length',
    unit: 'mm',
    minimum: 5,
    maximum: 500,
    default: 45,
    when: { parameter: 'outline', is: ['tapered'] },
    help: 'Last row of bolts to the cut end, along the brace.',
  },
  {
    name: 'gusset_edge_distance',
    label: 'Edge distance on the gusset',
    symbol: 'e_s',
    group: 'plate',
    type: 'length',
    unit: 'mm',
    minimum: 5,
    maximum: 500,
    default: 50,
    when: { parameter: 'outline', is: ['tapered'] },
    help: 'Outer line of bolts to the corner of the cut end, each side, across the brace.',
  },
  edgeFinish,
  holeMaking,
];

const weldParameters: readonly ParameterSpec[] = [
  {
    name: 'weld_length',
    label: 'Weld length',
    symbol: 'L',
    group: 'weld',
    type: 'length',
    unit: 'mm',
    minimum: 20,
    maximum: 3000,
    default: 320,
    help: 'Height of the plate along the face; welded on both sides over the whole of it.',
  },
  weldLeg,
  electrode,
  electrodeMatch,
  {
    name: 'work_line_offset',
    label: 'Offset of the work line',
    symbol: 'e',
    group: 'weld',
    type: 'length',
    unit: 'mm',
    minimum: -2000,
    maximum: 2000,
    default: 0,
    help: 'From the middle of the weld to where the line of the brace meets the face, upwards positive.',
  },
  weldEnds,
  weldMethod,
];

/** The schema of the gusset plate, in the order of a form. */
export const parameters: readonly ParameterSpec[] = [
  ...supportParameters,
  ...plateParameters,
  ...weldParameters,
  ...boltParameters,
  ...memberParameters,
];
