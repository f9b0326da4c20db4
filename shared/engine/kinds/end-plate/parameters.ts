import type { BasisId, ParameterSpec } from '../../types.ts';
import { beamParameters } from '../beam-end/parameters.ts';
import { boltGrade, boltSize, holeDeformation, holeDiameter, threads } from '../schema/bolts.ts';
import { method } from '../schema/method.ts';
import {
  edgeFinish,
  exposure,
  holeMaking,
  plateSteel,
  supportSteel,
  supportThickness,
} from '../schema/plate.ts';
import { electrode, electrodeMatch, weldEnds, weldLeg, weldMethod } from '../schema/weld.ts';

const EN: readonly BasisId[] = ['en-1993-1-8-2005'];

const length = (
  name: string,
  label: string,
  symbol: string,
  group: ParameterSpec['group'],
  limits: readonly [minimum: number, maximum: number, fallback: number],
  help: string,
): ParameterSpec => ({
  name,
  label,
  symbol,
  group,
  type: 'length',
  unit: 'mm',
  minimum: limits[0],
  maximum: limits[1],
  default: limits[2],
  help,
});

const plateParameters: readonly ParameterSpec[] = [
  {
    ...method('depth', 'Depth of the plate', 'How the plate stands to the beam.', [
      ['partial', 'Partial depth', 'Within the web of the beam, welded to the web alone.'],
      ['flush', 'Flush', 'Over the depth of the beam; the welds to the flanges are not counted.'],
    ]),
    group: 'plate',
  },
  length('plate_thickness', 'Plate thickness', 't_p', 'plate', [3, 60, 10], 'Thickness of the end plate.'),
  { ...plateSteel, default: 'S275' },
  length('plate_width', 'Plate width', 'b_p', 'plate', [50, 1000, 160], 'Across the beam.'),
  length(
    'plate_end_distance',
    'End distance on the plate',
    'e_1',
    'plate',
    [5, 1000, 40],
    'Outer row of bolts to the top and to the bottom of the plate. The rows and twice this are its height.',
  ),
  edgeFinish,
  holeMaking,
];

const boltParameters: readonly ParameterSpec[] = [
  boltSize,
  boltGrade,
  threads,
  holeDiameter,
  {
    name: 'rows',
    label: 'Rows of bolts',
    symbol: 'n_1',
    group: 'bolts',
    type: 'count',
    unit: '',
    minimum: 1,
    maximum: 20,
    default: 4,
    help: 'Rows of two bolts, one on each side of the web.',
  },
  length('pitch', 'Pitch', 'p_1', 'bolts', [10, 500, 70], 'Between rows, along the face of the support.'),
  length('gauge', 'Cross centres', 'p_3', 'bolts', [20, 900, 90], 'Between the two bolts of a row.'),
];

const beam = beamParameters
  .filter(({ name }) => ['beam_section', 'beam_steel', 'beam_top_to_row'].includes(name))
  .map((spec) =>
    spec.name === 'beam_top_to_row'
      ? { ...spec, help: 'From the top of the beam to the highest row of bolts.' }
      : spec,
  );

/** How forces are found and which practices count, in the order of a form. */
export const methodParameters: readonly ParameterSpec[] = [
  method(
    'plate_bending',
    'Bending of the plate under a pull',
    'Strength that the plate bends with in its T-stub.',
    [
      ['yield', 'Yield strength', 'f_y; errs low.'],
      [
        'tensile',
        'Tensile strength',
        'EN: f_u/1.10 for tying alone; the others: F_u as recent practice has it.',
      ],
    ],
  ),
  method(
    'support_bolts',
    'Shear of the bolts',
    'A handbook allowance that is not in EN 1993: some bolts carry tension as well.',
    [
      ['reduced', '0.8 of the sum', 'As handbooks of simple connections do; errs low.'],
      ['full', 'The whole sum', 'As EN 1993-1-8 alone has it.'],
    ],
    EN,
  ),
  method(
    'gross_shear',
    'Gross shear of the plate',
    'A handbook factor that is not in EN 1993: moment and shear act together on the plate.',
    [
      ['reduced', 'Divided by 1.27', 'As handbooks of simple connections do; errs low.'],
      ['full', 'Not reduced', 'As EN 1993-1-1 6.2.6 alone has it.'],
    ],
    EN,
  ),
  method(
    'web_shear',
    'Web of the beam in shear',
    'Area of the web beside the plate that counts.',
    [
      ['reduced', '0.9 of the height', '0.9 h_p t_w, as handbooks of simple connections do; errs low.'],
      ['full', 'The whole height', 'h_p t_w.'],
    ],
    EN,
  ),
  method('long_joint', 'Long joint', 'Shear of the bolts in a tall column.', [
    ['reduced', 'Reduced', 'The height of the column counts as the length of the joint; errs low.'],
    ['even', 'Not reduced', 'The web hands its shear over evenly along the column.'],
  ]),
  method('block_pull', 'Block shear of the plate', 'How the tension plane of the block is pulled.', [
    [
      'eccentric',
      'Unevenly',
      'EN takes 0.5 on the tension plane, the others the factor of an uneven pull; errs low.',
    ],
    ['even', 'Evenly', 'The whole tension plane counts.'],
  ]),
];

const fitParameters: readonly ParameterSpec[] = [
  method(
    'practice_rules',
    'Rules of practice',
    'Thickness, cross centres and height of a simple end plate.',
    [
      ['enforced', 'Enforced', 'A plate that yields before its bolts, on cross centres that let it bend.'],
      ['waived', 'Waived', 'For a detail whose rotation is shown otherwise; said on the sheet.'],
    ],
  ),
  method('fit_checks', 'Checks of fit', 'Whether spanner room and clearances reject a detail.', [
    ['enforced', 'Enforced', 'Spanner room and clearances must be there.'],
    ['waived', 'Waived', 'For a detail proved on a drawing; said on the sheet.'],
  ]),
];

/** The schema of the end plate, in the order of a form. */
export const parameters: readonly ParameterSpec[] = [
  {
    ...supportSteel,
    help: 'Flange or web that the plate is bolted to; its bearing is checked where its thickness is given.',
  },
  {
    ...supportThickness,
    help: 'Flange or web that the plate is bolted to. 0: its bearing is not checked.',
    zero: 'not checked',
  },
  ...plateParameters,
  weldLeg,
  electrode,
  electrodeMatch,
  weldEnds,
  ...boltParameters,
  ...beam,
  ...methodParameters,
  holeDeformation,
  weldMethod,
  exposure,
  ...fitParameters,
];
