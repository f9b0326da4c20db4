import { keywords } from './functions.ts';
import { tokenize, type Token } from './tokens.ts';
import { EXPRESSION_LIMITS, type BinaryOperator, type ExpressionFault, type Node } from './types.ts';

export type Parsed =
  { readonly ok: true; readonly tree: Node } | { readonly ok: false; readonly fault: ExpressionFault };

/** How strongly each operator binds; `not` and the sign stand between. */
const BINDS: Readonly<Record<BinaryOperator, number>> = {
  or: 1,
  and: 2,
  '<': 4,
  '<=': 4,
  '>': 4,
  '>=': 4,
  '=': 4,
  '<>': 4,
  '+': 5,
  '-': 5,
  '*': 6,
  '/': 6,
  '^': 8,
};
const NOT = 3;
const COMPARISON = 4;
const MINUS = 7;

/** Reads an expression into its tree. Whatever it is given, it answers; a fault says where and what would be accepted. */
export function parse(text: string): Parsed {
  const { length } = EXPRESSION_LIMITS;
  if (text.length > length) {
    const message = `It has ${text.length} characters; at most ${length} are read.`;
    return { ok: false, fault: { start: length, end: text.length, message } };
  }
  const parted = tokenize(text);
  if (!parted.ok) return parted;
  try {
    return { ok: true, tree: new Parser(parted.tokens).whole() };
  } catch (stop) {
    if (stop instanceof Stop) return { ok: false, fault: stop.fault };
    throw stop;
  }
}

/** Ends the reading at the first fault; never leaves this file. */
class Stop extends Error {
  constructor(readonly fault: ExpressionFault) {
    super(fault.message);
  }
}

class Parser {
  private at = 0;
  private depth = 0;
  private parts = 0;

  constructor(private readonly tokens: readonly Token[]) {}

  whole(): Node {
    const first = this.next();
    if (first.kind === 'end')
      this.stop(first, 'An expression is needed, e.g. 2 * gusset_end_distance + (rows - 1) * pitch.');
    const tree = this.expression(0);
    const rest = this.next();
    if (rest.kind === 'end') return tree;
    if (isSign(rest, ')')) this.stop(rest, 'There is no open parenthesis that this one closes.');
    if (isSign(rest, ','))
      this.stop(rest, 'A comma parts the arguments of a function; decimals have a point.');
    return this.stop(rest, `An operator is needed before ${words(rest)}, e.g. + - * / and.`);
  }

  private expression(least: number): Node {
    let left = this.prefix();
    for (;;) {
      const operator = this.operatorHere();
      if (operator === undefined || BINDS[operator] < least) return left;
      if (BINDS[operator] === COMPARISON && isComparison(left))
        this.stop(this.next(), 'Two values are compared at a time: a <= b and b <= c.');
      const token = this.take();
      const right =
        operator === '^'
          ? this.within(token, () => this.expression(MINUS))
          : this.expression(BINDS[operator] + 1);
      left = this.node({ kind: 'binary', operator, left, right, start: left.start, end: right.end });
    }
  }

  private prefix(): Node {
    const token = this.take();
    const { start, end, text } = token;
    if (token.kind === 'number') return this.number(token);
    if (token.kind === 'word') return this.node({ kind: 'word', value: text, start, end });
    if (isSign(token, '(')) return this.group(token);
    if (isSign(token, '-')) return this.prefixed(token, 'minus', MINUS);
    if (text === 'not') return this.prefixed(token, 'not', NOT);
    if (token.kind === 'name' && !isKeyword(text)) return this.nameOrCall(token);
    if (token.kind === 'end')
      return this.stop(token, 'It ends where a number, a name or a parenthesis is needed.');
    return this.stop(token, `A number, a name or a parenthesis is needed in place of ${words(token)}.`);
  }

  private number({ start, end, text }: Token): Node {
    const value = Number(text);
    if (!Number.isFinite(value)) this.stop({ start, end }, 'The number is too large; at most 1.7e308.');
    return this.node({ kind: 'number', value, start, end });
  }

  private prefixed(token: Token, kind: 'minus' | 'not', binds: number): Node {
    const operand = this.within(token, () => this.expression(binds));
    return this.node({ kind, operand, start: token.start, end: operand.end });
  }

  private group(open: Token): Node {
    const inner = this.within(open, () => this.expression(0));
    const close = this.take();
    if (!isSign(close, ')')) this.unclosed(open, close);
    return { ...inner, start: open.start, end: close.end };
  }

  private nameOrCall(token: Token): Node {
    const { start, end, text: name } = token;
    if (!isSign(this.next(), '(')) return this.node({ kind: 'name', name, start, end });
    const open = this.take();
    const args: Node[] = [];
    for (;;) {
      args.push(this.within(token, () => this.expression(0)));
      const after = this.take();
      if (isSign(after, ')')) return this.node({ kind: 'call', name, args, start, end: after.end });
      if (!isSign(after, ',')) this.unclosed(open, after);
    }
  }

  private unclosed(open: Token, found: Token): never {
    if (found.kind === 'end') this.stop(open, 'The parenthesis is not closed.');
    return this.stop(found, `An operator, a comma or ) is needed before ${words(found)}.`);
  }

  private within(token: Token, read: () => Node): Node {
    const { depth } = EXPRESSION_LIMITS;
    if (++this.depth > depth) this.stop(token, `It goes more than ${depth} deep; use fewer parentheses.`);
    const node = read();
    this.depth--;
    return node;
  }

  private node(node: Node): Node {
    const { parts } = EXPRESSION_LIMITS;
    if (++this.parts > parts) this.stop(node, `It has more than ${parts} numbers, names and operators.`);
    return node;
  }

  private operatorHere(): BinaryOperator | undefined {
    const { kind, text } = this.next();
    if (kind !== 'sign' && kind !== 'name') return undefined;
    return Object.hasOwn(BINDS, text) ? (text as BinaryOperator) : undefined;
  }

  private next(): Token {
    return this.tokens[Math.min(this.at, this.tokens.length - 1)]!;
  }

  private take(): Token {
    const token = this.next();
    this.at++;
    return token;
  }

  private stop({ start, end }: { start: number; end: number }, message: string): never {
    throw new Stop({ start, end, message });
  }
}

const isSign = ({ kind, text }: Token, sign: string): boolean => kind === 'sign' && text === sign;

const isKeyword = (text: string): boolean => (keywords as readonly string[]).includes(text);

/** A comparison that no parentheses stand around. */
function isComparison(node: Node): boolean {
  return node.kind === 'binary' && BINDS[node.operator] === COMPARISON && node.start === node.left.start;
}

function words({ kind, text }: Token): string {
  if (kind === 'end') return 'the end';
  return kind === 'word' ? `the word "${text.slice(0, 40)}"` : text.slice(0, 40);
}
