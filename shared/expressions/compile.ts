import { isBelow, isEqual, roundings } from './arithmetic.ts';
import type { BinaryOperator, Node, Place } from './types.ts';

/** Why an expression has no value for one variant, and which characters say so. */
export interface Failure extends Place {
  readonly reason: string;
  /** The name that has no value, where that is the reason. */
  readonly name?: string;
}

/** The values of the names, and where an evaluation failed. Used again and again: evaluating allocates nothing. */
export interface Frame {
  /** NaN where a name has no value. */
  readonly numbers: Float64Array;
  readonly words: string[];
  /** The first operation without a finite result; whoever evaluates sets it to null before. */
  failure: Failure | null;
}

/** Truths are 1 and 0. */
export type Evaluate = (frame: Frame) => number;

/** The place of each name in a frame. */
export type Slots = ReadonlyMap<string, number>;

/** Turns a checked tree into a function over a frame; no source text is made or run. */
export function compile(node: Node, slots: Slots): Evaluate {
  switch (node.kind) {
    case 'number': {
      const { value } = node;
      return () => value;
    }
    case 'name': {
      const slot = slotOf(node.name, slots);
      const without = { ...failureAt(node, `${node.name} has no value`), name: node.name };
      return (frame) => {
        const value = frame.numbers[slot]!;
        return Number.isNaN(value) ? fail(frame, without) : value;
      };
    }
    case 'minus': {
      const operand = compile(node.operand, slots);
      return (frame) => -operand(frame);
    }
    case 'not': {
      const operand = compile(node.operand, slots);
      return (frame) => 1 - operand(frame);
    }
    case 'binary':
      return compileBinary(node, slots);
    case 'call':
      return compileCall(node, slots);
    case 'word':
      throw new Error('A word alone has no number; the check refuses it');
  }
}

function slotOf(name: string, slots: Slots): number {
  const slot = slots.get(name);
  if (slot === undefined) throw new Error(`No place for ${name}; the check refuses it`);
  return slot;
}

type Binary = Extract<Node, { kind: 'binary' }>;
type Call = Extract<Node, { kind: 'call' }>;

function compileBinary(node: Binary, slots: Slots): Evaluate {
  const { operator, left, right } = node;
  if ((operator === '=' || operator === '<>') && isWord(left, slots)) {
    const [a, b] = [wordOf(left, slots), wordOf(right, slots)];
    return operator === '=' ? (frame) => +(a(frame) === b(frame)) : (frame) => +(a(frame) !== b(frame));
  }
  const [a, b] = [compile(left, slots), compile(right, slots)];
  return isArithmetic(operator) ? arithmetic(operator, a, b, node) : truth(operator, a, b);
}

/** Names of words have places from the end: -1 is the first. */
const isWord = (node: Node, slots: Slots): boolean =>
  node.kind === 'word' || (node.kind === 'name' && slotOf(node.name, slots) < 0);

function wordOf(node: Node, slots: Slots): (frame: Frame) => string {
  if (node.kind === 'word') return () => node.value;
  if (node.kind !== 'name')
    throw new Error('Only words and names are compared as words; the check refuses others');
  const place = -1 - slotOf(node.name, slots);
  return (frame) => frame.words[place]!;
}

type Arithmetic = '+' | '-' | '*' | '/' | '^';

const isArithmetic = (operator: BinaryOperator): operator is Arithmetic => '+-*/^'.includes(operator);

function arithmetic(operator: Arithmetic, a: Evaluate, b: Evaluate, place: Place): Evaluate {
  const overflow = failureAt(place, 'the result is too large');
  switch (operator) {
    case '+':
      return (frame) => finite(a(frame) + b(frame), frame, overflow);
    case '-':
      return (frame) => finite(a(frame) - b(frame), frame, overflow);
    case '*':
      return (frame) => finite(a(frame) * b(frame), frame, overflow);
    case '/':
      return quotient(a, b, failureAt(place, 'division by 0'), overflow);
    case '^':
      return power(a, b, place, overflow);
  }
}

function quotient(a: Evaluate, b: Evaluate, byZero: Failure, overflow: Failure): Evaluate {
  return (frame) => {
    const value = a(frame);
    const divisor = b(frame);
    return divisor === 0 ? fail(frame, byZero) : finite(value / divisor, frame, overflow);
  };
}

function power(a: Evaluate, b: Evaluate, place: Place, overflow: Failure): Evaluate {
  const byZero = failureAt(place, '0 has no negative power');
  const root = failureAt(place, 'a number below 0 has only whole powers');
  return (frame) => {
    const base = a(frame);
    const exponent = b(frame);
    if (base === 0 && exponent < 0) return fail(frame, byZero);
    if (base < 0 && !Number.isInteger(exponent)) return fail(frame, root);
    return finite(base ** exponent, frame, overflow);
  };
}

/** Comparisons and what joins them; `and` and `or` work out the second only where it decides. */
function truth(operator: Exclude<BinaryOperator, Arithmetic>, a: Evaluate, b: Evaluate): Evaluate {
  switch (operator) {
    case 'and':
      return (frame) => (a(frame) === 0 ? 0 : b(frame));
    case 'or':
      return (frame) => (a(frame) === 0 ? b(frame) : 1);
    case '=':
      return (frame) => +isEqual(a(frame), b(frame));
    case '<>':
      return (frame) => +!isEqual(a(frame), b(frame));
    case '<':
      return (frame) => +isBelow(a(frame), b(frame));
    case '>':
      return (frame) => +isBelow(b(frame), a(frame));
    case '<=':
      return (frame) => +!isBelow(b(frame), a(frame));
    case '>=':
      return (frame) => +!isBelow(a(frame), b(frame));
  }
}

function compileCall(node: Call, slots: Slots): Evaluate {
  const args = node.args.map((arg) => compile(arg, slots));
  const [a, b, c] = args as [Evaluate, Evaluate, Evaluate];
  switch (node.name) {
    case 'if':
      return (frame) => (a(frame) === 0 ? c(frame) : b(frame));
    case 'abs':
      return (frame) => Math.abs(a(frame));
    case 'sqrt':
      return squareRoot(a, failureAt(node, 'the square root of a number below 0'));
    case 'min':
      return args.reduce((least, one) => (frame) => Math.min(least(frame), one(frame)));
    case 'max':
      return args.reduce((most, one) => (frame) => Math.max(most(frame), one(frame)));
    case 'round':
    case 'ceil':
    case 'floor':
      return rounding(roundings[node.name], a, args[1], node);
    default:
      throw new Error(`No function ${node.name}; the check refuses it`);
  }
}

function squareRoot(a: Evaluate, below: Failure): Evaluate {
  return (frame) => {
    const value = a(frame);
    return value < 0 ? fail(frame, below) : Math.sqrt(value);
  };
}

function rounding(
  round: (value: number, step: number) => number,
  a: Evaluate,
  step: Evaluate | undefined,
  place: Place,
): Evaluate {
  const overflow = failureAt(place, 'the result is too large');
  if (step === undefined) return (frame) => finite(round(a(frame), 1), frame, overflow);
  const noStep = failureAt(place, 'the step to round to must be above 0');
  return (frame) => {
    const value = a(frame);
    const by = step(frame);
    return by > 0 ? finite(round(value, by), frame, overflow) : fail(frame, noStep);
  };
}

const failureAt = ({ start, end }: Place, reason: string): Failure => ({ start, end, reason });

/** Notes the first failure; a later min, max or comparison must not hide it. */
function fail(frame: Frame, failure: Failure): number {
  frame.failure ??= failure;
  return NaN;
}

/** `value - value` is 0 for every finite number, and NaN for the others. */
function finite(value: number, frame: Frame, overflow: Failure): number {
  return value - value === 0 ? value : fail(frame, overflow);
}
