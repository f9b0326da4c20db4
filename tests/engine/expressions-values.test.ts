import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { functions, readExpression } from '@shared/expressions/index.ts';
import { frameOf, holds, scope, slots, valueOf } from './support/expressions.ts';

describe('Values of expressions, worked out by hand', () => {
  it.each([
    ['1 + 2 * 3', 7],
    ['(1 + 2) * 3', 9],
    ['10 - 4 - 3', 3],
    ['24 / 4 / 3', 2],
    ['2 ^ 3 ^ 2', 512],
    ['-2 ^ 2', -4],
    ['(-2) ^ 2', 4],
    ['2 ^ -1', 0.5],
    ['-3 * -2', 6],
    ['- - 3', 3],
    ['.5 + 1.5e1 + 2E-1', 15.7],
    ['min(3, 1, 2) + max(3, 1, 2)', 4],
    ['abs(-7.5)', 7.5],
    ['sqrt(6 ^ 2 + 8 ^ 2)', 10],
    ['if(1 < 2, 10, 20)', 10],
    ['if(1 > 2, 10, 20)', 20],
  ])('%s is %d', (text, value) => {
    expect(valueOf(text)).toBe(value);
  });

  it.each([
    ['round(2.5)', 3],
    ['round(-2.5)', -3],
    ['round(2.4)', 2],
    ['round(1.005 * 1000)', 1005],
    ['round(0.5 * 2.5 * 2)', 3],
    ['ceil(2.1)', 3],
    ['ceil(-2.1)', -2],
    // In binary 70 × 1.1 is 77.00000000000001, and 0.1 × 3 is 0.30000000000000004.
    ['ceil(70 * 1.1)', 77],
    ['ceil(0.1 * 3, 0.1)', 0.3],
    ['floor(0.3 / 0.1)', 3],
    ['floor(-2.1)', -3],
    ['ceil(2.5 * 22, 5)', 55],
    ['ceil(52, 5)', 55],
    ['floor(52, 5)', 50],
    ['round(52.5, 5)', 55],
    ['ceil(-0.4)', 0],
  ])('%s rounds to %d', (text, value) => {
    expect(valueOf(text)).toBe(value);
  });

  it('reads parameters by their names', () => {
    // 2 × 40 + (4 − 1) × 70 = 80 + 210
    expect(valueOf('2*edge + (rows-1)*pitch', { edge: 40, rows: 4, pitch: 70 })).toBe(290);
  });

  it.each([
    ['2 < 3 and 3 <= 3', 1],
    ['2 > 3 or 3 >= 4', 0],
    ['not 2 > 3', 1],
    ['not (2 < 3) or 1 = 1', 1],
    ['not 2 < 3 or 1 = 1', 1],
    ['1 = 1 or 1 = 1 and 1 = 2', 1],
    ['1 <> 2', 1],
    // Equal but for noise: neither above nor below.
    ['0.1 + 0.2 = 0.3', 1],
    ['0.1 + 0.2 > 0.3', 0],
    ['0.1 + 0.2 <= 0.3', 1],
  ])('%s: %d', (text, value) => {
    expect(holds(text)).toBe(value);
  });

  it('compares choices with words in quotes', () => {
    expect(holds('outline = "tapered"', { outline: 'tapered' })).toBe(1);
    expect(holds("outline <> 'tapered'", { outline: 'tapered' })).toBe(0);
    expect(valueOf('if(bolt_size = "M24", 10, 8)', { bolt_size: 'M24' })).toBe(10);
    expect(valueOf('if("M24" = bolt_size, 10, 8)', { bolt_size: 'M20' })).toBe(8);
  });

  it('gives the same as the arithmetic of the language for any tree of sums and products', () => {
    const leaf = fc
      .integer({ min: -50, max: 50 })
      .map((n) => ({ text: n < 0 ? `(${n})` : String(n), value: n }));
    const { tree } = fc.letrec<{ tree: { text: string; value: number } }>((tie) => ({
      tree: fc.oneof(
        { depthSize: 'small' },
        leaf,
        fc.tuple(fc.constantFrom('+', '-', '*'), tie('tree'), tie('tree')).map(([sign, a, b]) => ({
          text: `(${a.text} ${sign} ${b.text})`,
          value: sign === '+' ? a.value + b.value : sign === '-' ? a.value - b.value : a.value * b.value,
        })),
      ),
    }));
    fc.assert(
      fc.property(tree, ({ text, value }) => {
        fc.pre(text.length <= 500);
        expect(valueOf(text)).toBeCloseTo(value, 6);
      }),
    );
  });

  it('shows an example of each function that can be read', () => {
    const names = functions.flatMap(({ example }) => example.match(/[a-z_]+/g) ?? []);
    const own = new Set(functions.map(({ name }) => name));
    const wide = new Map(scope);
    for (const name of names)
      if (!own.has(name)) wide.set(name, { name, type: 'number', label: name, unit: '' });
    for (const { example } of functions)
      expect(readExpression(example, wide, 'number')).toMatchObject({ ok: true });
  });
});

describe('An expression without a value says so and never throws', () => {
  it.each([
    ['edge / rows', 'division by 0: edge / rows'],
    ['1 / (rows * 2)', 'division by 0: 1 / (rows * 2)'],
    // A later operation must not hide it.
    ['min(5, 1 / rows)', 'division by 0: 1 / rows'],
    ['1 / (1 / rows)', 'division by 0: (1 / rows)'],
    ['if(1 / rows > 5, 1, 2)', 'division by 0: 1 / rows'],
    ['sqrt(rows - 1)', 'the square root of a number below 0: sqrt(rows - 1)'],
    ['rows ^ -1', '0 has no negative power: rows ^ -1'],
    ['(rows - 8) ^ 0.5', 'a number below 0 has only whole powers: (rows - 8) ^ 0.5'],
    ['1e200 * 1e200', 'the result is too large: 1e200 * 1e200'],
    ['10 ^ 400', 'the result is too large: 10 ^ 400'],
    ['ceil(edge, rows)', 'the step to round to must be above 0: ceil(edge, rows)'],
    ['ceil(1e300, 1e-300)', 'the result is too large: ceil(1e300, 1e-300)'],
  ])('%s', (text, words) => {
    expect(valueOf(text, { rows: 0, edge: 40 })).toBe(words);
  });

  it('works out only the branch that is chosen', () => {
    expect(valueOf('if(rows = 0, 7, edge / rows)', { rows: 0, edge: 40 })).toBe(7);
    expect(holds('rows <> 0 and edge / rows > 5', { rows: 0, edge: 40 })).toBe(0);
    expect(holds('rows = 0 or edge / rows > 5', { rows: 0, edge: 40 })).toBe(1);
  });

  it('is worked out again after a failure', () => {
    const read = readExpression('edge / rows', scope, 'number', slots);
    if (!read.ok) throw new Error('faulty');
    const frame = frameOf({ edge: 40, rows: 0 });
    expect(read.expression.evaluate(frame)).toBeNaN();
    frame.failure = null;
    frame.numbers[slots.get('rows')!] = 4;
    expect(read.expression.evaluate(frame)).toBe(10);
    expect(frame.failure).toBeNull();
  });
});
