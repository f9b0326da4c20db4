import type { BasisId, ParameterSpec } from '../../types.ts';
import { method } from '../schema/method.ts';
import { whenBolted, whenWelded } from './parameters-support.ts';

const EN: readonly BasisId[] = ['en-1993-1-8-2005'];
const one = { parameter: 'cleats', is: ['1'] } as const;

const groupParameters: readonly ParameterSpec[] = [
  method('shear_line', 'Line of shear', 'Where the shear acts: what lies away from it takes the moment.', [
    ['both', 'Both, the worse kept', 'Bolts and legs each as for the line that is worse for them.'],
    ['support', 'Face of the support', 'European practice: the bolts in the web take the moment V z.'],
    [
      'bolts',
      'Bolts in the web',
      'American practice for one column: they take no moment; the web legs bend at the heel.',
    ],
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
    help: 'Between the face of the support and the middle of the bolts in the web, as the moment has it.',
  },
  method('shear_direction', 'Direction of the shear', 'What the sign of the load angle stands for.', [
    ['either', 'Either way', 'Up and down, the worse kept: a coped web tears more easily one way.'],
    ['by_angle', 'By the load angle', 'Above 0° up; below 0° down, as a beam bears on its cleats.'],
  ]),
  {
    ...method(
      'leg_eccentricity',
      'Eccentric bolts at the support',
      'Whether the shear, which comes down the heel, turns the bolts of an outstanding leg in the plane of the support.',
      [
        ['single', 'Counted for a single cleat', 'The two legs of a pair hold one another against turning.'],
        ['always', 'Always counted', 'For each leg of a pair as well; errs low.'],
      ],
    ),
    when: whenBolted,
  },
  {
    ...method('toe_weld', 'Eccentric weld at the support', 'How the weld at the toe takes the moment.', [
      ['alone', 'The weld alone', 'Elastic, 6 V e/L² at its ends; errs low.'],
      [
        'bearing',
        'With the legs bearing on the web',
        'American practice for a pair: 3.6 V e/L², turning about L/6 below the top.',
      ],
    ]),
    when: whenWelded,
  },
  {
    ...method('heel', 'Heel of a single cleat under a pull', 'Whether the heel may turn.', [
      [
        'free',
        'Turns',
        'The outstanding leg bends about its bolts alone; errs low. Not covered where welded.',
      ],
      ['held', 'Held', 'Web leg and web hold it from turning, as two cleats do one another.'],
    ]),
    when: one,
  },
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
  method('bolt_bearing', 'Bearing of eccentric bolts', 'Which distances a bolt of the group bears with.', [
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
];

/** How the forces are found and which practices count, in the order of a form. */
export const methodParameters: readonly ParameterSpec[] = [
  ...groupParameters,
  method(
    'single_lap',
    'Single lap with one column or row',
    'EN 1993-1-8 3.6.1(10) holds bearing across a single column, or across a single row, to 1.5 f_u d t/γ_M2 where bolts have one shear plane.',
    [
      ['limited', 'Limited', 'The clause is applied; errs low.'],
      ['waived', 'Not limited', 'As handbooks do: the parts are held from turning.'],
    ],
    EN,
  ),
  {
    ...method(
      'support_bolts',
      'Shear of the bolts at the support',
      'A handbook allowance that is not in EN 1993: some bolts carry tension as well.',
      [
        ['reduced', '0.8 of the sum', 'As handbooks of simple connections do; errs low.'],
        ['full', 'The whole sum', 'As EN 1993-1-8 alone has it.'],
      ],
      EN,
    ),
    when: whenBolted,
  },
  method(
    'gross_shear',
    'Gross shear of the cleats',
    'A handbook factor that is not in EN 1993: moment and shear act together on the cleats.',
    [
      ['reduced', 'Divided by 1.27', 'As handbooks of simple connections do; errs low.'],
      ['full', 'Not reduced', 'As EN 1993-1-1 6.2.6 alone has it.'],
    ],
    EN,
  ),
  method('block_pull', 'Block shear along the face', 'How the tension plane of the block is pulled.', [
    ['eccentric', 'Unevenly', 'As in one leg of an angle or at a coped beam end, the lower; errs low.'],
    ['even', 'Evenly', 'The whole tension plane counts.'],
  ]),
  method('leg_bending', 'Bending of the outstanding legs', 'Strength that they bend with under a pull.', [
    ['yield', 'Yield strength', 'f_y; errs low.'],
    [
      'tensile',
      'Tensile strength',
      'EN: f_u/1.10 for tying alone; the others: F_u as recent practice has it.',
    ],
  ]),
  method('leg_section', 'Section of the web legs', 'How pull, shear and bending are combined on them.', [
    ['elastic', 'Elastic', '√((N/A + M/Z)² + 3(V/A)²) against yield, on the net section against rupture.'],
    ['plastic', 'Plastic', 'M/M_pl + (N/N_pl)² + (V/V_pl)⁴ ≤ 1.'],
  ]),
];

/** Rules that a family may waive. */
export const fitParameters: readonly ParameterSpec[] = [
  method('practice_rules', 'Rules of practice', 'Thickness for ductility and length for torsion.', [
    ['enforced', 'Enforced', 'Cleats not thicker than 16 mm and 0.6 of the depth of the beam long.'],
    ['waived', 'Waived', 'For a detail whose rotation is shown otherwise; said on the sheet.'],
  ]),
  method('fit_checks', 'Checks of fit', 'Whether spanner room and clearances reject a detail.', [
    ['enforced', 'Enforced', 'Spanner room and clearances must be there.'],
    ['waived', 'Waived', 'For a detail proved on a drawing; said on the sheet.'],
  ]),
];
