import { describe, expect, it } from 'vitest';
import { drawElevation, drawView, type Primitive } from '@shared/drawing/index.ts';
import { hatchRing } from '@shared/drawing/hatch.ts';
import { drawWeldSymbol } from '@shared/drawing/weld-symbol.ts';
import { drawDimension } from '@shared/drawing/dimension.ts';
import { findKind } from '@shared/engine/index.ts';
import { engineCatalogue } from '@server/catalogue.ts';

const textsOf = (primitives: readonly Primitive[]) =>
  primitives.flatMap((one) => (one.shape === 'text' ? [one.text] : []));
const weld = { from: { x: 0, y: -150 }, to: { x: 0, y: 150 }, leg: 6, bothSides: true };
const triangles = (primitives: readonly Primitive[]) =>
  primitives.filter((one) => one.shape === 'ring' && !one.filled);
const below = (one: Primitive, y: number) =>
  one.shape === 'ring' && one.points.every((point) => point.y <= y);

describe('a weld symbol', () => {
  const at = { x: 0, y: 100 };
  const draw = (bothSides: boolean, symbols: 'iso-2553' | 'aws-a2.4') =>
    drawWeldSymbol({ ...weld, bothSides }, at, -1, symbols, 1);

  it('has a triangle on each side that is welded, the leg before and the length behind', () => {
    for (const symbols of ['iso-2553', 'aws-a2.4'] as const) {
      expect(triangles(draw(true, symbols))).toHaveLength(2);
      expect(textsOf(draw(true, symbols))).toEqual([symbols === 'iso-2553' ? 'z6' : '6', '300']);
    }
  });

  it('has the arrow side above the line and a dashed line to ISO 2553, below the line to AWS A2.4', () => {
    const line = 130;
    const [iso] = triangles(draw(false, 'iso-2553'));
    const [aws] = triangles(draw(false, 'aws-a2.4'));
    expect(below(iso!, line)).toBe(false);
    expect(below(aws!, line)).toBe(true);
    const plainLines = (symbols: 'iso-2553' | 'aws-a2.4') =>
      draw(false, symbols).filter(({ shape }) => shape === 'line').length;
    expect(plainLines('iso-2553')).toBeGreaterThan(plainLines('aws-a2.4') + 4);
  });
});

describe('a dimension', () => {
  const text = (from: { x: number; y: number }, to: { x: number; y: number }) =>
    drawDimension({ from, to, text: '70', offset: 10 }, 1).find((one) => one.shape === 'text');

  it('stands beside what it measures', () => {
    const [, , line] = drawDimension(
      { from: { x: 0, y: 0 }, to: { x: 70, y: 0 }, text: '70', offset: 10 },
      1,
    );
    expect(line).toMatchObject({ from: { x: 0, y: 10 }, to: { x: 70, y: 10 } });
  });

  it('is read from below or from the right, whichever end comes first', () => {
    expect(text({ x: 70, y: 0 }, { x: 0, y: 0 })).toMatchObject({ turn: 0 });
    expect(text({ x: 0, y: 70 }, { x: 0, y: 0 })).toMatchObject({ turn: 90 });
    expect(text({ x: 0, y: 0 }, { x: 0, y: 70 })).toMatchObject({ turn: 90 });
  });
});

it('a hatch stays inside the outline', () => {
  const outline = [
    { x: 0, y: 0 },
    { x: 40, y: 0 },
    { x: 40, y: 10 },
    { x: 0, y: 10 },
  ];
  const lines = hatchRing(outline, 5);
  // x − y runs from −10 to 40: the lines −5, 0, 5 … 35 cross the rectangle.
  expect(lines).toHaveLength(9);
  for (const one of lines) {
    if (one.shape !== 'line') continue;
    for (const { x, y } of [one.from, one.to]) {
      expect(x).toBeGreaterThanOrEqual(-1e-9);
      expect(x).toBeLessThanOrEqual(40 + 1e-9);
      expect(y).toBeGreaterThanOrEqual(-1e-9);
      expect(y).toBeLessThanOrEqual(10 + 1e-9);
    }
  }
});

describe('a gusset plate', () => {
  const prepared = findKind('gusset-plate')!.prepare(
    { plate_thickness: 12, weld_length: 300, weld_leg: 8, rows: 3, pitch: 70, first_row: 160 },
    'en-1993-1-8-2005',
    engineCatalogue(),
  );
  if (!prepared.ok) throw new Error(JSON.stringify(prepared.faults));
  const geometry = prepared.detail.geometry(Math.PI / 6);
  const elevation = drawElevation(geometry, { angle: 30, sense: 'tension', weldSymbols: 'iso-2553' });

  it('is drawn to scale with its sizes written, all of it inside the sheet', () => {
    expect(textsOf(elevation.primitives)).toEqual(expect.arrayContaining(['160', '2 × 70', 'z8', '300']));
    const circles = elevation.primitives.filter(({ shape }) => shape === 'circle');
    expect(circles).toHaveLength(3);
    const { left, bottom, width, height } = elevation.extent;
    for (const { x, y } of geometry.outline) {
      expect(x).toBeGreaterThan(left);
      expect(x).toBeLessThan(left + width);
      expect(y).toBeGreaterThan(bottom);
      expect(y).toBeLessThan(bottom + height);
    }
  });

  it('turns its load arrow round in compression', () => {
    const headOf = (sense: 'tension' | 'compression') => {
      const { primitives } = drawElevation(geometry, { angle: 0, sense, weldSymbols: 'iso-2553' });
      const head = primitives.find((one) => one.pen === 'load' && one.shape === 'ring');
      return head?.shape === 'ring' ? head.points[1]!.x - geometry.axis.to.x : NaN;
    };
    expect(headOf('tension')).toBeGreaterThan(0);
    expect(headOf('compression')).toBeLessThan(0);
  });

  it('has a section with its plate, its bolts and both fillets', () => {
    const [view] = geometry.views!;
    expect(view!.bolts).toHaveLength(3);
    expect(view!.fillets).toHaveLength(2);
    expect(textsOf(drawView(view!).primitives)).toEqual(['t 12']);
  });
});
