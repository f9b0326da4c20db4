import type { BasisId, ParameterSpec } from '../../types.ts';
import { method } from '../schema/method.ts';

const EN: readonly BasisId[] = ['en-1993-1-8-2005'];
/** How the forces are found and which practices count, in the order of a form. */
export const methodParameters: readonly ParameterSpec[] = [
  method('shear_line', 'Line of shear', 'Where the shear acts: what lies away from it takes the moment.', [
    ['both', 'Both, the worse kept', 'Bolts, weld and plate each as for the line that is worse for them.'],
    ['support', 'Face of the support', 'The bolts take the moment, the weld none.'],
    ['bolts', 'Bolt group', 'The weld and the plate take the moment, the bolts none.'],
  ]),
  {
    name: 'eccentricity',
    label: 'Eccentricity',
    symbol: 'e',
    group: 'method',
    type: 'length',
    unit: 'mm',
    minimum: 0,
    maximum: 2000,
    default: 0,
    zero: 'face to the middle of the bolts',
    help: 'Between the face of the support and the middle of the bolts, as the moment has it.',
  },
  method('shear_direction', 'Direction of the shear', 'What the sign of the load angle stands for.', [
    ['either', 'Either way', 'Up and down, the worse kept: a coped web tears more easily one way.'],
    ['by_angle', 'By the load angle', 'Above 0° up; below 0° down, as a beam bears on the plate.'],
  ]),
  method(
    'bolt_group',
    'Eccentric bolts',
    'How the bolts share the moment; their bearing is elastic either way.',
    [
      ['elastic', 'Elastic', 'In proportion to the distance from the middle of the bolts; errs low.'],
      ['centre', 'Instantaneous centre', 'Bolts deform about one point until the farthest gives way.'],
    ],
    ['sans-10162-1-2011', 'csa-s16-2019', 'aisc-360-2022-lrfd', 'aisc-360-2022-asd'],
  ),
  method('bolt_bearing', 'Bearing of the bolts', 'Which distances a bolt of the group bears with.', [
    [
      'least',
      'The least throughout',
      'Every bolt as the least of the group in its direction; as handbooks do.',
    ],
    ['each', 'Each bolt its own', 'Every bolt with its own distances ahead and beside.'],
  ]),
  method('long_joint', 'Long joint', 'Shear of the bolts in a tall column.', [
    ['reduced', 'Reduced', 'The height of the column counts as the length of the joint; errs low.'],
    ['even', 'Not reduced', 'The web hands its shear over evenly along the column.'],
  ]),
  method(
    'single_lap',
    'Single lap with one column or row',
    'EN 1993-1-8 3.6.1(10) holds bearing across a single column, or across a single row, to 1.5 f_u d t/γ_M2.',
    [
      ['limited', 'Limited', 'The clause is applied; errs low.'],
      ['waived', 'Not limited', 'As handbooks do: the web and the plate are held from turning.'],
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
  method('block_pull', 'Block shear along the face', 'How the tension plane of the block is pulled.', [
    ['eccentric', 'Unevenly', 'As at a coped beam end: EN takes 0.5; errs low.'],
    ['even', 'Evenly', 'The whole tension plane counts.'],
  ]),
  method('plate_section', 'Plate section', 'How pull, shear and bending are combined on the plate.', [
    ['elastic', 'Elastic', '√((N/A + M/Z)² + 3(V/A)²) against yield, on the net section against rupture.'],
    ['plastic', 'Plastic', 'M/M_pl + (N/N_pl)² + (V/V_pl)⁴ ≤ 1.'],
  ]),
];

/** Rules that a family may waive. */
export const fitParameters: readonly ParameterSpec[] = [
  method('weld_size', 'Size of the weld', 'What the leg must be besides its strength.', [
    ['full_strength', 'Full strength', 'Both fillets are at least as strong across the plate as it yields.'],
    ['as_designed', 'As designed', 'The strength of the weld alone decides.'],
  ]),
  method('practice_rules', 'Rules of practice', 'Thickness for ductility and height for torsion.', [
    ['enforced', 'Enforced', 'Plate not thicker than half a bolt, and 0.6 of the depth of the beam high.'],
    ['waived', 'Waived', 'For a detail whose rotation is shown otherwise; said on the sheet.'],
  ]),
  method('fit_checks', 'Checks of fit', 'Whether spanner room and clearances reject a detail.', [
    ['enforced', 'Enforced', 'Spanner room and clearances must be there.'],
    ['waived', 'Waived', 'For a detail proved on a drawing; said on the sheet.'],
  ]),
];
