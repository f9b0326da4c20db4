import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { EXPRESSION_LIMITS, orderOf } from '@shared/expressions/index.ts';
import { faultsOf, marked, valueOf } from './support/expressions.ts';

describe('A fault stands under its characters and says what is accepted', () => {
  it.each([
    ['2 * (edge + 3', '(', /not closed/],
    ['2 * edge)', ')', /no open parenthesis/],
    ['2 * * edge', '*', /number, a name or a parenthesis/],
    ['2 edge', 'edge', /operator is needed before edge/],
    ['edge +', '', /ends where a number/],
    ['', '', /expression is needed/],
    ['   ', '', /expression is needed/],
    ['2,5 * edge', ',', /decimals have a point/],
    ['edge ** 2', '**', /written \^/],
    ['rows == 2', '==', /written =/],
    ['rows != 2', '!=', /written <>/],
    ['edge × 2', '×', /written \*/],
    ['edge − 2', '−', /hyphen/],
    ['edge & 2', '&', /U\+0026/],
    ['bolt_size.d', '.', /bolt_d/],
    ['edges * 2', 'edges', /did you mean edge\?/],
    ['colour * 2', 'colour', /names are those of the parameters/],
    ['roof(edge)', 'roof', /There is no function roof/],
    ['sqr(edge)', 'sqr', /did you mean sqrt\?/],
    ['edge(2)', 'edge', /no function; write \*/],
    ['min * 2', 'min', /min\(a, b, …\)/],
    ['max(edge)', 'max(edge)', /given 1 arguments; write max\(a, b, …\)/],
    ['abs(1, 2)', 'abs(1, 2)', /write abs\(a\)/],
    ['abs()', ')', /number, a name/],
    ['bolt_size * 2', 'bolt_size', /A number is needed here; this is a word/],
    ['edge + (rows > 2)', '(rows > 2)', /A number is needed here; this is a comparison/],
    ['if(edge, 1, 2)', 'edge', /A comparison is needed here/],
    ['rows > 2', 'rows > 2', /whole must be a number/],
    ['"tapered', '"', /quote is not closed/],
    ['edge; rows', ';', /semicolon/],
    ['1e999', '1e999', /too large/],
    ['2 and', '', /ends where/],
  ])('%s', (text, characters, message) => {
    const [first] = marked(text);
    expect(first?.[0]).toBe(characters);
    expect(first?.[1]).toMatch(message);
  });

  it.each([
    ['edge', 'edge', /whole must be a comparison/],
    ['2 < edge < 5', '<', /two values are compared at a time|Two values/],
    ['outline = "taperd"', '"taperd"', /accepted are "tapered", "rectangular"/],
    ['outline = 2', 'outline = 2', /a word is compared with a number/],
    ['outline < "tapered"', 'outline', /A number is needed/],
    ['(rows > 2) = (edge > 2)', '(rows > 2)', /Only numbers and words/],
    ['rows > 2 and edge', 'edge', /A comparison is needed/],
  ])('%s as a rule', (text, characters, message) => {
    const [first] = marked(text, 'truth');
    expect(first?.[0]).toBe(characters);
    expect(first?.[1]).toMatch(message);
  });

  it('reports every unknown name at once', () => {
    expect(marked('edges + pich').map(([characters]) => characters)).toEqual(['edges', 'pich']);
  });
});

describe('Hostile expressions are faults', () => {
  const long = EXPRESSION_LIMITS.length;
  const nested = (depth: number) => `${'('.repeat(depth)}1${')'.repeat(depth)}`;

  it.each([
    ['a million characters', '1+'.repeat(500_000)],
    ['a million parentheses', '('.repeat(1_000_000)],
    ['parentheses up to the length', '('.repeat(long)],
    ['signs up to the length', '-'.repeat(long)],
    ['powers up to the length', `${'2^'.repeat(240)}2`],
    ['calls within calls', `${'abs('.repeat(100)}1${')'.repeat(100)}`],
    ['names of prototypes', 'constructor'],
    ['its call', 'constructor("return process")()'],
    ['another', '__proto__ + toString'],
    ['a property', 'edge.constructor.constructor("x")'],
    ['an index', 'edge["constructor"]'],
    ['a template', '`${process.exit()}`'],
    ['a function', '(() => 1)()'],
    ['an assignment', 'edge = rows = 2'],
    ['a Cyrillic е', 'еdge * 2'],
    ['a full-width digit', '２ * edge'],
    ['a zero-width space', 'edge\u200b * 2'],
    ['a right-to-left mark', 'edge \u202e* 2'],
    ['a lone surrogate', 'edge \ud800'],
    ['an emoji', '🙂'],
    ['a NUL', 'edge\0'],
    ['hasOwnProperty as function', 'hasOwnProperty(1)'],
    ['a quote that never ends', `"${'x'.repeat(400)}`],
    ['a long name', 'x'.repeat(499)],
  ])('%s', (_what, text) => {
    const from = performance.now();
    const [first] = faultsOf(text);
    // Generous: it takes well under a millisecond; only something that grows with the input would miss it.
    expect(performance.now() - from).toBeLessThan(100);
    expect(first?.message.length).toBeGreaterThan(10);
    expect(first?.message.length).toBeLessThan(300);
    expect(first!.start).toBeLessThanOrEqual(first!.end);
    expect(first!.end).toBeLessThanOrEqual(text.length);
  });

  it('goes as deep as the limit and no deeper', () => {
    expect(valueOf(nested(30))).toBe(1);
    expect(marked(nested(31))[0]?.[1]).toMatch(/more than 30 deep/);
  });

  it('has as many parts as the limit and no more', () => {
    // 100 numbers and 99 signs; one more number and sign make 201.
    expect(valueOf(Array(100).fill('1').join('+'))).toBe(100);
    expect(marked(Array(101).fill('1').join('+'))[0]?.[1]).toMatch(/more than 200/);
  });

  it('answers any text with a value or with faults inside the text', () => {
    const pieces = [
      'edge',
      'rows',
      'outline',
      '"tapered"',
      'if(',
      'min(',
      '(',
      ')',
      ',',
      '+',
      '-',
      '^',
      '/',
      '<',
      '=',
      'and',
      'not',
      '1',
      '0',
      '.5',
      ' ',
      'é',
      '.',
    ];
    const text = fc.oneof(
      fc.string({ unit: 'binary', maxLength: 60 }),
      fc.array(fc.constantFrom(...pieces), { maxLength: 30 }).map((some) => some.join(' ')),
    );
    fc.assert(
      fc.property(text, fc.constantFrom('number' as const, 'truth' as const), (given, wanted) => {
        for (const { start, end, message } of faultsOf(given, wanted)) {
          expect(start >= 0 && start <= end && end <= given.length).toBe(true);
          expect(message).not.toBe('');
        }
        const value = valueOf(given, { edge: 40, rows: 0, outline: 'tapered' }, wanted);
        expect(typeof value === 'string' || Number.isFinite(value)).toBe(true);
      }),
      { numRuns: 2000 },
    );
  });
});

describe('Order of derived parameters', () => {
  const order = (needs: Record<string, string[]>) => orderOf(new Map(Object.entries(needs)));

  it('puts each after what it needs', () => {
    expect(order({ a: ['b', 'x'], b: ['c'], c: [] })).toEqual({ ok: true, order: ['c', 'b', 'a'] });
  });

  it('names a circle in order', () => {
    expect(order({ z: ['a'], a: ['b'], b: ['c'], c: ['a'] })).toEqual({
      ok: false,
      circle: ['a', 'b', 'c', 'a'],
    });
    expect(order({ a: ['a'] })).toEqual({ ok: false, circle: ['a', 'a'] });
  });
});
