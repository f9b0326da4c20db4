/** What an expression is worth: a number, a truth (of a comparison), or a word to compare with. */
export type ValueType = 'number' | 'truth' | 'word';

/** Where something stands in an expression: places of its first character and after its last. */
export interface Place {
  readonly start: number;
  readonly end: number;
}

/** What is wrong with an expression, where, and what would be accepted. */
export interface ExpressionFault extends Place {
  readonly message: string;
}

export type BinaryOperator =
  'or' | 'and' | '<' | '<=' | '>' | '>=' | '=' | '<>' | '+' | '-' | '*' | '/' | '^';

/** The tree of an expression: nothing else can be said in one. */
export type Node = Place &
  (
    | { readonly kind: 'number'; readonly value: number }
    | { readonly kind: 'word'; readonly value: string }
    | { readonly kind: 'name'; readonly name: string }
    | { readonly kind: 'minus' | 'not'; readonly operand: Node }
    | {
        readonly kind: 'binary';
        readonly operator: BinaryOperator;
        readonly left: Node;
        readonly right: Node;
      }
    | { readonly kind: 'call'; readonly name: string; readonly args: readonly Node[] }
  );

/** A name that an expression may use. */
export interface NameInfo {
  readonly name: string;
  readonly type: 'number' | 'word';
  readonly label: string;
  readonly unit: string;
  /** A word: those it can be; absent where any is possible. */
  readonly words?: readonly string[];
  /** Why it must not be used, where the family's other choices leave it without effect. */
  readonly unused?: string;
}

/** The most that an expression may be. */
export const EXPRESSION_LIMITS = {
  /** Characters. */
  length: 500,
  /** Parentheses, functions, signs, exponents and `not` within one another. */
  depth: 30,
  /** Numbers, names, words, operators and functions. */
  parts: 200,
} as const;
