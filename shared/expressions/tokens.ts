import type { ExpressionFault, Place } from './types.ts';

export type Token = Place & {
  /** `sign` is an operator, a parenthesis or a comma; `end` stands after the last. */
  readonly kind: 'number' | 'word' | 'name' | 'sign' | 'end';
  readonly text: string;
};
export type Tokens =
  | { readonly ok: true; readonly tokens: readonly Token[] }
  | { readonly ok: false; readonly fault: ExpressionFault };

const BLANK = /[ \t\r\n]+/y;
const NUMBER = /(?:[0-9]+(?:\.[0-9]*)?|\.[0-9]+)(?:[eE][+-]?[0-9]+)?/y;
const NAME = /[A-Za-z_][A-Za-z0-9_]*/y;
const WORD = /"[^"]*"|'[^']*'/y;
const SIGN = /<=|>=|<>|[-+*/^<>=(),]/y;

/** What is often typed for something that is accepted. */
const MEANT: Readonly<Record<string, string>> = {
  '**': 'A power is written ^.',
  '==': 'Equality is written =.',
  '!=': 'Inequality is written <>.',
  '&&': 'Write and.',
  '||': 'Write or.',
  '!': 'Write not.',
  '×': 'A product is written *.',
  '·': 'A product is written *.',
  '÷': 'A quotient is written /.',
  '−': 'A minus is written - (the hyphen).',
  '–': 'A minus is written - (the hyphen).',
  '≤': 'Write <=.',
  '≥': 'Write >=.',
  '≠': 'Write <>.',
  '²': 'A square is written ^2.',
  '.': 'Nothing can be read out of a value with a point; the list of names has what there is, e.g. bolt_d.',
  '[': 'Only round parentheses are accepted.',
  '{': 'Only round parentheses are accepted.',
  '`': 'Words stand between straight quotes, e.g. "tapered".',
  '“': 'Words stand between straight quotes, e.g. "tapered".',
  '”': 'Words stand between straight quotes, e.g. "tapered".',
  '"': 'The quote is not closed.',
  "'": 'The quote is not closed.',
  ';': 'One expression has no semicolon; arguments are parted by commas.',
};

/** Parts an expression. Its length was limited before. */
export function tokenize(text: string): Tokens {
  const tokens: Token[] = [];
  let at = 0;
  while (at < text.length) {
    const blank = match(BLANK, text, at);
    if (blank !== undefined) {
      at += blank.length;
      continue;
    }
    const token = tokenAt(text, at);
    if (token === undefined) return { ok: false, fault: unknownAt(text, at) };
    tokens.push(token);
    at = token.end;
  }
  tokens.push({ kind: 'end', text: '', start: text.length, end: text.length });
  return { ok: true, tokens };
}

function tokenAt(text: string, start: number): Token | undefined {
  if (MEANT[text.slice(start, start + 2)] !== undefined) return undefined;
  const kinds = [
    ['number', NUMBER],
    ['name', NAME],
    ['word', WORD],
    ['sign', SIGN],
  ] as const;
  for (const [kind, pattern] of kinds) {
    const found = match(pattern, text, start);
    if (found === undefined) continue;
    const own = kind === 'word' ? found.slice(1, -1) : found;
    return { kind, text: own, start, end: start + found.length };
  }
  return undefined;
}

function match(pattern: RegExp, text: string, at: number): string | undefined {
  pattern.lastIndex = at;
  return pattern.exec(text)?.[0];
}

function unknownAt(text: string, start: number): ExpressionFault {
  const pair = text.slice(start, start + 2);
  const character = String.fromCodePoint(text.codePointAt(start) ?? 0);
  const meant = MEANT[pair] === undefined ? character : pair;
  const end = start + meant.length;
  const hint = Object.hasOwn(MEANT, meant) ? MEANT[meant] : undefined;
  if (hint !== undefined) return { start, end, message: hint };
  const code = (character.codePointAt(0) ?? 0).toString(16).toUpperCase().padStart(4, '0');
  const shown = /^[\p{L}\p{N}\p{P}\p{S}]$/u.test(character) ? `"${character}" (U+${code})` : `U+${code}`;
  const message = `${shown} is not accepted here. Names have the letters a to z, digits and _; operators are + - * / ^ < <= > >= = <>.`;
  return { start, end, message };
}
