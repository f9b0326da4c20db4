import { describe, expect, it } from 'vitest';
import { readAddress, writeAddress } from '../../src/components/results/address.ts';
import { ANGLE, dimensionsOf, placesOf } from '../../src/components/results/dimensions.ts';
import { fittingLayout, tableOf, usualLayout } from '../../src/components/results/layout.ts';
import { moved, tsvOf, wholeTable } from '../../src/components/results/selection.ts';
import {
  itemAt,
  lengthOf,
  offsetOf,
  scrollTo,
  windowOf,
} from '../../src/components/results/virtual-window.ts';

const axis = (name: string, label: string, unit: string, values: unknown[]) => ({
  name,
  label,
  symbol: '',
  unit,
  values,
});
const axes = {
  axes: [
    axis('plate_thickness', 'Plate thickness', 'mm', [10, 12]),
    axis('weld_leg', 'Weld leg', 'mm', [6, 8, 10]),
  ],
  angles: [-30, 0, 30, 60],
};
const dimensions = dimensionsOf(axes, 'gusset-plate');
const usual = usualLayout(dimensions, 'tension');

describe('the dimensions of a table', () => {
  it('have strides of an ordinal whose last axis varies fastest', () => {
    expect(dimensions.map(({ name, stride }) => [name, stride])).toEqual([
      ['plate_thickness', 3],
      ['weld_leg', 1],
      [ANGLE, 0],
    ]);
    expect(placesOf(dimensions, 4)).toEqual({ plate_thickness: 1, weld_leg: 1 });
  });
});

describe('the layout of a table', () => {
  it('usually has every size down and the angles across', () => {
    const table = tableOf(usual, dimensions);
    expect([table.rows, table.columns]).toEqual([6, 4]);
    expect(table.rowTitles(4)).toEqual(['12', '8']);
    expect(table.placeOf(4, 2)).toEqual({ ordinal: 4, angle: 2 });
  });

  it('finds its cell again wherever the dimensions stand', () => {
    const layouts = [
      usual,
      fittingLayout(
        { ...usual, down: ['weld_leg'], across: 'plate_thickness', picked: { [ANGLE]: 3 } },
        dimensions,
      ),
      fittingLayout(
        { ...usual, down: ['weld_leg', ANGLE], across: '', picked: { plate_thickness: 1 } },
        dimensions,
      ),
    ];
    for (const layout of layouts) {
      const table = tableOf(layout, dimensions);
      for (let row = 0; row < table.rows; row++)
        for (let column = 0; column < table.columns; column++)
          expect(table.find(table.placeOf(row, column))).toEqual({ row, column });
    }
  });

  it('does not show a cell of another chosen value', () => {
    const layout = fittingLayout(
      { ...usual, down: ['weld_leg'], picked: { plate_thickness: 1 } },
      dimensions,
    );
    expect(tableOf(layout, dimensions).find({ ordinal: 1, angle: 0 })).toBeNull();
  });

  it('leaves out what the revision has not, and holds a chosen value within its list', () => {
    const layout = fittingLayout(
      { down: ['pitch', 'weld_leg'], across: 'gauge', picked: { plate_thickness: 9 }, sense: 'tension' },
      dimensions,
    );
    expect(layout).toMatchObject({
      down: ['weld_leg'],
      across: '',
      picked: { plate_thickness: 1, [ANGLE]: 0 },
    });
  });
});

describe('the address of the page', () => {
  it('gives back what was written into it', () => {
    const layout = fittingLayout(
      { ...usual, down: ['weld_leg'], picked: { plate_thickness: 1 } },
      dimensions,
    );
    const query = writeAddress(layout, { ordinal: 4, angle: 2 }, true);
    const read = readAddress(query as Record<string, string>);
    expect(fittingLayout({ ...usual, ...read.layout }, dimensions)).toEqual(layout);
    expect([read.cell, read.heat]).toEqual([{ ordinal: 4, angle: 2 }, true]);
  });

  it('is read as far as it can be', () => {
    const read = readAddress({ sense: 'torsion', cell: '4;2', pick: 'a:b,weld_leg:2', heat: 'off' });
    expect(read).toEqual({ layout: { picked: { weld_leg: 2 } }, cell: null, heat: false });
  });
});

describe('a window on a long table', () => {
  it('holds what is seen and a few more', () => {
    expect(windowOf(3200, 640, 32, 10_000, 4)).toEqual({ first: 96, end: 124 });
    expect(windowOf(0, 640, 32, 5, 4)).toEqual({ first: 0, end: 5 });
  });

  it('reaches both ends of a list that is too tall for a browser', () => {
    const count = 1_000_000;
    const bottom = lengthOf(count, 32) - 640;
    expect(itemAt(0, 640, 32, count)).toBe(0);
    expect(windowOf(bottom, 640, 32, count).end).toBe(count);
    expect(offsetOf(count - 1, bottom, 640, 32, count) + 32).toBeCloseTo(bottom + 640, 3);
    const middle = scrollTo(500_000, 0, 640, 32, count);
    const at = itemAt(middle, 640, 32, count);
    expect(at).toBeLessThanOrEqual(500_000.001);
    expect(at + 20).toBeGreaterThanOrEqual(500_000.999);
  });

  it('scrolls no further than it must', () => {
    expect(scrollTo(5, 100, 640, 32, 100)).toBe(100);
    expect(scrollTo(0, 100, 640, 32, 100)).toBe(0);
    expect(scrollTo(30, 0, 640, 32, 100)).toBe(31 * 32 - 640);
  });
});

describe('moving and copying', () => {
  const table = tableOf(usual, dimensions);

  it.each([
    ['ArrowDown', false, { row: 3, column: 1 }],
    ['ArrowLeft', false, { row: 2, column: 0 }],
    ['Home', false, { row: 2, column: 0 }],
    ['End', true, { row: 5, column: 3 }],
    ['PageDown', false, { row: 5, column: 1 }],
    ['PageUp', false, { row: 0, column: 1 }],
  ])('%s (with control: %s) stays inside the table', (key, control, expected) => {
    expect(moved({ row: 2, column: 1 }, key, control, table, 10)).toEqual(expected);
  });

  it('leaves other keys alone', () => {
    expect(moved({ row: 0, column: 0 }, 'Tab', false, table, 10)).toBeNull();
  });

  it('writes headings with units, then rows, split by tabs', () => {
    const text = tsvOf(
      table,
      { ...wholeTable(table), bottom: 1 },
      'GP-01',
      (row, column) => `${row}${column}`,
    );
    expect(text.split('\n')).toEqual([
      'GP-01',
      '\t\tLoad angle (°)',
      'Plate thickness (mm)\tWeld leg (mm)\t−30\t0\t30\t60',
      '10\t6\t00\t01\t02\t03',
      '10\t8\t10\t11\t12\t13',
    ]);
  });
});
