import type { ParameterSpec } from '../../types.ts';
import { boltGrade, boltSize, holeDiameter, threads } from '../schema/bolts.ts';
import { supportSteel, supportThickness } from '../schema/plate.ts';
import { electrode, electrodeMatch, weldEnds, weldLeg } from '../schema/weld.ts';

type When = NonNullable<ParameterSpec['when']>;

export const whenBolted: When = { parameter: 'support_connection', is: ['bolted', 'bolted_own'] };
const whenOwn: When = { parameter: 'support_connection', is: ['bolted_own'] };
export const whenWelded: When = { parameter: 'support_connection', is: ['welded'] };

/** A parameter of the bolts in the web, asked again for the bolts at the support. */
const own = (spec: ParameterSpec, label: string): ParameterSpec => ({
  ...spec,
  name: `support_${spec.name}`,
  label,
  group: 'support',
  when: whenOwn,
});

const length = (name: string, label: string, symbol: string, help: string, zero: string): ParameterSpec => ({
  name,
  label,
  symbol,
  group: 'support',
  type: 'length',
  unit: 'mm',
  minimum: 0,
  maximum: 500,
  default: 0,
  when: whenBolted,
  help,
  zero,
});

/** What the outstanding legs are fixed to, and how. */
export const supportParameters: readonly ParameterSpec[] = [
  {
    name: 'support_connection',
    label: 'Outstanding legs',
    symbol: '',
    group: 'support',
    type: 'choice',
    unit: '',
    choices: [
      { value: 'bolted', label: 'Bolted', help: 'With the bolts that are in the web.' },
      { value: 'bolted_own', label: 'Bolted with other bolts', help: 'With bolts of their own.' },
      { value: 'welded', label: 'Welded', help: 'Along the toe of each leg, returned at its top.' },
    ],
    default: 'bolted',
    help: 'How the legs that stand out are fixed to the support.',
  },
  {
    ...supportSteel,
    choices: [
      { value: 'same', label: 'Same as the cleats', help: 'The support has the strength of the cleats.' },
    ],
    help: 'Flange or web that the cleats are fixed to.',
  },
  {
    ...supportThickness,
    help: 'Flange or web that the cleats are fixed to. 0: bearing is not checked on it; a weld takes it as thick as the cleats.',
    zero: 'not checked',
  },
  {
    name: 'support_rows',
    label: 'Rows of bolts at the support',
    symbol: 'n_s',
    group: 'support',
    type: 'count',
    unit: '',
    minimum: 0,
    maximum: 20,
    default: 0,
    when: whenBolted,
    help: 'In each outstanding leg, about the middle of its length. 0: as many as in the web.',
    zero: 'as in the web',
  },
  length(
    'support_pitch',
    'Pitch at the support',
    'p_s',
    'Between rows at the support. 0: as in the web.',
    'as in the web',
  ),
  length(
    'support_backmark',
    'Back mark at the support',
    'g_s',
    'Heel of the angle to the bolts at the support; two of these and the web are the cross centres. 0: the usual one for the leg.',
    'usual for the leg',
  ),
  own(boltSize, 'Bolt size at the support'),
  own(boltGrade, 'Bolt grade at the support'),
  own(threads, 'Threads at the support'),
  own(holeDiameter, 'Hole diameter at the support'),
];

/** The weld along the toe of each outstanding leg. */
export const weldParameters: readonly ParameterSpec[] = [
  { ...weldLeg, default: 6, when: whenWelded },
  { ...electrode, when: whenWelded },
  { ...electrodeMatch, when: whenWelded },
  {
    ...weldEnds,
    when: whenWelded,
    help: 'Whether the fillets keep their size up to the ends of the cleats. Returns are not counted either way.',
  },
];
