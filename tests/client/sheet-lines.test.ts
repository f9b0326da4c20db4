import { describe, expect, it } from 'vitest';
import { readCellQuery } from '../../src/components/sheet/cell-query.ts';
import {
  givenGroups,
  printedCapacity,
  summaryOf,
  workingSections,
  workingValue,
} from '../../src/components/sheet/sheet-lines.ts';
import { pageStripRule } from '../../src/components/sheet/use-page-strip.ts';

const line = (meaning: string, clause = '') => ({
  symbol: 'φ',
  meaning,
  formula: '',
  value: 0.8,
  unit: '',
  clause,
});
const sections = [
  {
    id: 'given',
    title: 'Given',
    code: null,
    capacity: null,
    lines: [line('Plate thickness'), line('Yield')],
  },
  {
    id: 'weld-metal',
    title: 'Weld metal',
    code: 'WM',
    capacity: 500,
    lines: [line('a', '13.13'), line('b')],
  },
  { id: 'bolt-shear', title: 'Bolt shear', code: 'BS', capacity: 250, lines: [] },
  { id: 'gusset-buckling', title: 'Buckling', code: 'GC', capacity: null, lines: [] },
];
const outcome = { status: 'capacity' as const, capacity: 250, rounded: 250, governing: 'bolt-shear' };
const parameter = (
  name: string,
  label: string,
  group: string,
  value: unknown,
  expression: string | null = null,
) => ({
  name,
  label,
  symbol: '',
  unit: 'mm',
  group,
  value,
  expression,
});
const parameters = [
  parameter('bolt_size', 'Bolt size', 'bolts', 'M20'),
  parameter('plate_thickness', 'Plate thickness', 'plate', 12),
  parameter('outline', 'Outline', 'plate', 'tapered'),
  parameter('pitch', 'Pitch', 'bolts', 50, '2.5 * bolt_d'),
];

describe('the lines of a calculation sheet', () => {
  it('mark the governing limit state and measure the others by it', () => {
    expect(
      summaryOf({ sections, outcome }).map(({ code, governing, ratio }) => [code, governing, ratio]),
    ).toEqual([
      ['WM', false, 2],
      ['BS', true, 1],
      ['GC', false, null],
    ]);
    expect(summaryOf({ sections, outcome })[0]?.clause).toBe('13.13');
  });

  it('group what is given as a detail is built, choices by their labels', () => {
    const groups = givenGroups(parameters, 'gusset-plate');
    expect(groups.map(({ title }) => title)).toEqual(['Plate', 'Bolts']);
    expect(groups[0]?.lines.map(({ value }) => value)).toEqual(['12', 'Tapered']);
    expect(groups[1]?.lines.map(({ value, expression }) => [value, expression])).toEqual([
      ['M20', null],
      ['50', '2.5 * bolt_d'],
    ]);
  });

  it('leave out of the working what only repeats a given value', () => {
    const working = workingSections({ sections, parameters });
    expect(working[0]?.lines.map(({ meaning }) => meaning)).toEqual(['Yield']);
    expect(working.map(({ code }) => code)).toEqual([null, 'WM', 'BS', 'GC']);
  });

  it.each([
    [0, '0'],
    [0.04321, '0.04321'],
    [12.3456, '12.346'],
    [-0.5, '−0.5'],
    [123456.78, '123\u202f456.8'],
    [0.0000123, '1.230 × 10^−5'],
    ['M20', 'M20'],
  ])('write %s as %s', (value, expected) => expect(workingValue(value)).toBe(expected));

  it('print a capacity cut off, but for the noise of the arithmetic', () => {
    expect(printedCapacity(340.09)).toBe('340.0');
    expect(printedCapacity(299.9999)).toBe('299.9');
    expect(printedCapacity(300 - 1e-12)).toBe('300.0');
  });
});

describe('the address of a sheet', () => {
  it('needs a sense and an angle', () => {
    expect(readCellQuery({ sense: 'tension', angle: '-12.5' })).toEqual({ sense: 'tension', angle: -12.5 });
    expect(readCellQuery({ sense: 'tension' })).toBeNull();
    expect(readCellQuery({ sense: 'shear', angle: '0' })).toBeNull();
    expect(readCellQuery({ sense: 'tension', angle: '200' })).toBeNull();
  });
});

describe('the foot of a printed page', () => {
  it('cannot be broken out of by a title', () => {
    expect(pageStripRule('GP "01" \\ }')).toContain('content: "GP \\22 01\\22  \\5c  }"');
  });
});
