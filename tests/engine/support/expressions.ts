import {
  type ExpressionFault,
  frameFor,
  type NameInfo,
  readExpression,
  slotsOf,
  valueIn,
} from '@shared/expressions/index.ts';

const number = (name: string): [string, NameInfo] => [
  name,
  { name, type: 'number', label: name, unit: 'mm' },
];
const word = (name: string, words?: readonly string[]): [string, NameInfo] => [
  name,
  { name, type: 'word', label: name, unit: '', ...(words === undefined ? {} : { words }) },
];

/** Names as a gusset plate has them. */
export const scope = new Map<string, NameInfo>([
  ...['rows', 'pitch', 'edge', 'plate_thickness', 'bolt_d', 'hole_d'].map(number),
  word('outline', ['tapered', 'rectangular']),
  word('bolt_size'),
]);
export const slots = slotsOf(scope);

type Given = Readonly<Record<string, number | string>>;

export function frameOf(given: Given) {
  const frame = frameFor(slots);
  for (const [name, value] of Object.entries(given)) {
    const slot = slots.get(name)!;
    if (typeof value === 'number') frame.numbers[slot] = value;
    else frame.words[-1 - slot] = value;
  }
  return frame;
}

/** The value of an expression (a truth as 1 or 0), or the words of why it has none. */
export function valueOf(text: string, given: Given = {}, wanted: 'number' | 'truth' = 'number') {
  const read = readExpression(text, scope, wanted, slots);
  if (!read.ok) return `fault: ${read.faults.map(({ message }) => message).join(' | ')}`;
  const outcome = valueIn(read.expression.evaluate, frameOf(given));
  if (outcome.ok) return outcome.value;
  const { start, end, reason } = outcome.failure;
  return `${reason}: ${text.slice(start, end)}`;
}

export const holds = (text: string, given: Given = {}) => valueOf(text, given, 'truth');

export function faultsOf(text: string, wanted: 'number' | 'truth' = 'number'): readonly ExpressionFault[] {
  const read = readExpression(text, scope, wanted, slots);
  return read.ok ? [] : read.faults;
}

/** Each fault as the characters it stands under and its message. */
export const marked = (text: string, wanted: 'number' | 'truth' = 'number') =>
  faultsOf(text, wanted).map(({ start, end, message }) => [text.slice(start, end), message]);
