import { check, type Scope } from './check.ts';
import { compile, type Evaluate, type Failure, type Frame, type Slots } from './compile.ts';
import { parse } from './parse.ts';
import type { ExpressionFault, Node } from './types.ts';

/** An expression that passed every check, ready to be worked out again and again. */
export interface Expression {
  readonly text: string;
  /** The names it uses, each once. */
  readonly names: readonly string[];
  /** Writes the first failure into the frame; a frame with one has no value. */
  readonly evaluate: Evaluate;
  /** Both sides where the whole is one comparison of numbers, e.g. of `edge >= 1.2 * hole_d`. */
  readonly sides: readonly [Evaluate, Evaluate] | null;
}
export type ExpressionResult =
  | { readonly ok: true; readonly expression: Expression }
  | { readonly ok: false; readonly faults: readonly ExpressionFault[] };

const WHOLE = {
  number:
    'The whole must be a number; this is a comparison, true or false. To choose, write if(condition, a, b).',
  truth: 'The whole must be a comparison that holds or not, e.g. pitch >= 2.5 * bolt_d.',
} as const;

/** Gives every name of a scope its place in a frame: numbers from 0 up, words from -1 down. */
export function slotsOf(scope: Scope): Slots {
  let number = 0;
  let word = 0;
  return new Map([...scope.values()].map(({ name, type }) => [name, type === 'number' ? number++ : --word]));
}

/** A frame for every name of a scope. */
export function frameFor(slots: Slots): Frame {
  return {
    numbers: new Float64Array(slots.size).fill(NaN),
    words: Array<string>(slots.size).fill(''),
    failure: null,
  };
}

/**
 * Reads an expression once, checks it against the names there are, and compiles it.
 * @param wanted a number for a derived parameter, a truth for a rule
 */
export function readExpression(
  text: string,
  scope: Scope,
  wanted: 'number' | 'truth',
  slots: Slots = slotsOf(scope),
): ExpressionResult {
  const parsed = parse(text);
  if (!parsed.ok) return { ok: false, faults: [parsed.fault] };
  const { tree } = parsed;
  const { type, names, faults } = check(tree, scope);
  if (faults.length > 0) return { ok: false, faults };
  if (type !== wanted)
    return { ok: false, faults: [{ start: tree.start, end: tree.end, message: WHOLE[wanted] }] };
  const sides = comparedNumbers(tree, slots);
  return { ok: true, expression: { text, names, evaluate: compile(tree, slots), sides } };
}

function comparedNumbers(tree: Node, slots: Slots): readonly [Evaluate, Evaluate] | null {
  if (tree.kind !== 'binary' || !/^[<>=]/.test(tree.operator)) return null;
  const isWord = ({ left }: typeof tree) =>
    left.kind === 'word' || (left.kind === 'name' && (slots.get(left.name) ?? 0) < 0);
  return isWord(tree) ? null : [compile(tree.left, slots), compile(tree.right, slots)];
}

/** The value of an expression, or why it has none. A truth is 1 or 0. */
export function valueIn(
  evaluate: Evaluate,
  frame: Frame,
): { readonly ok: true; readonly value: number } | { readonly ok: false; readonly failure: Failure } {
  frame.failure = null;
  const value = evaluate(frame);
  return frame.failure === null ? { ok: true, value } : { ok: false, failure: frame.failure };
}
