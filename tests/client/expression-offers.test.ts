import { describe, expect, it } from 'vitest';
import type { NameInfo } from '@shared/expressions/index.ts';
import { stretchesOf } from '../../src/components/expressions/marks.ts';
import { completionAt, written } from '../../src/components/expressions/offers.ts';

const names: NameInfo[] = [
  { name: 'pitch', type: 'number', label: 'Pitch', unit: 'mm' },
  { name: 'bolt_size', type: 'word', label: 'Bolt size', unit: '', words: ['M20', 'M24'] },
  { name: 'bolt_d', type: 'number', label: 'Bolt size: nominal diameter', unit: 'mm' },
  { name: 'gauge', type: 'number', label: 'Gauge', unit: 'mm', unused: 'Gauge has no effect.' },
];
const titles = (text: string, asked = false, caret = text.length) =>
  completionAt(text, caret, names, asked)?.offers.map(({ title }) => title) ?? null;

describe('what is offered at the caret', () => {
  it.each([
    ['2 * bo', ['bolt_size', 'bolt_d']],
    ['2 * _d', ['bolt_d']],
    ['2 * diam', ['bolt_d']],
    ['ce', ['ceil(a) or ceil(a, step)']],
    ['bolt_size = "', ['"M20"', '"M24"']],
    ['rows > 2 and bolt_size <> "m2', ['"M20"', '"M24"']],
  ])('%s', (text, offered) => {
    expect(titles(text)).toEqual(offered);
  });

  it.each(['', '2 * ', '1e', 'pitch', 'an', 'not', 'zzz', 'gau', 'pitch = "M'])('nothing for %s', (text) => {
    const offered = titles(text);
    expect(offered === null || !offered.includes('gauge')).toBe(true);
    if (text !== 'an') expect(offered).toBeNull();
  });

  it('is everything that may be used when it is asked for', () => {
    const offered = titles('', true) ?? [];
    expect(offered.slice(0, 3)).toEqual(['pitch', 'bolt_size', 'bolt_d']);
    expect(offered).toContain('if(condition, then, otherwise)');
    expect(offered).not.toContain('gauge');
  });

  it('takes the place of the whole word that the caret is in', () => {
    const completion = completionAt('2 * bolt_x + 1', 8, names, false)!;
    expect(written('2 * bolt_x + 1', completion, completion.offers[1]!)).toEqual({
      text: '2 * bolt_d + 1',
      caret: 10,
    });
    const word = completionAt('bolt_size = "M"', 14, names, false)!;
    expect(written('bolt_size = "M"', word, word.offers[0]!).text).toBe('bolt_size = "M20"');
  });
});

describe('marks under an expression', () => {
  const cut = (text: string, ...places: [number, number][]) =>
    stretchesOf(
      text,
      places.map(([start, end]) => ({ place: { start, end } })),
    ).map(({ text: part, faulty }) => (faulty ? `[${part}]` : part));

  it('stand at the characters at fault, and at the end where something is missing', () => {
    expect(cut('2 * pich', [4, 8])).toEqual(['2 * ', '[pich]']);
    expect(cut('2 *', [3, 3])).toEqual(['2 *', '[ ]']);
    expect(cut('a + b', [4, 5], [0, 1])).toEqual(['[a]', ' + ', '[b]']);
    expect(cut('abc', [0, 3], [1, 2])).toEqual(['[abc]']);
    expect(cut('abc')).toEqual(['abc']);
    expect(cut('ab', [1, 900])).toEqual(['a', '[b]']);
    expect(cut('ab', [5, 9])).toEqual(['ab']);
    expect(cut('')).toEqual([]);
  });
});
