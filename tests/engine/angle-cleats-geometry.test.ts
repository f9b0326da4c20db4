import { describe, expect, it } from 'vitest';
import { toRadians } from '@shared/engine/index.ts';
import { plain, prepare, single, welded } from './support/angle-cleats.ts';

const EN = 'en-1993-1-8-2005';

describe('the drawing of angle cleats', () => {
  const detail = prepare(EN, plain);
  const drawn = detail.geometry(toRadians(-90));
  const [plan, face] = drawn.views ?? [];

  it('the web leg from the side: 95 wide, 298 long, four holes 52 from the heel, the other leg on its edge', () => {
    expect(drawn.outline).toEqual([
      { x: 0, y: -149 },
      { x: 95, y: -149 },
      { x: 95, y: 149 },
      { x: 0, y: 149 },
    ]);
    expect(drawn.holes.map(({ centre }) => [centre.x, centre.y])).toEqual([
      [52, -108],
      [52, -36],
      [52, 36],
      [52, 108],
    ]);
    expect(drawn.member[0]?.outline[1]?.x).toBe(11);
    expect(drawn.welds).toEqual([]);
  });

  it('the bolts at the support in three rows through the leg and the 13 of the support', () => {
    expect(drawn.bolts).toEqual(
      [-80, 0, 80].map((y) => ({ from: { x: 11, y }, to: { x: -13, y }, diameter: 22 })),
    );
  });

  it('the beam from 12 off the face, its top 110 above the highest row, the cope cut out', () => {
    const web = drawn.member[1]?.outline;
    expect(web?.[0]).toEqual({ x: 12, y: 108 + 110 - 420 });
    expect(web?.at(-1)).toEqual({ x: 12, y: 108 + 110 - 61 });
  });

  it('a plan: an angle on each side of the 8.6 of the web, its bolts, those at the support 54 from the heel', () => {
    expect(plan?.parts).toHaveLength(4);
    expect(plan?.parts[0]?.outline).toEqual([
      { x: 0, y: 4.3 },
      { x: 95, y: 4.3 },
      { x: 95, y: 15.3 },
      { x: 11, y: 15.3 },
      { x: 11, y: 104.3 },
      { x: 0, y: 104.3 },
    ]);
    expect(plan?.bolts[0]).toEqual({ from: { x: 52, y: 15.3 }, to: { x: 52, y: -15.3 }, diameter: 20 });
    expect(plan?.bolts.slice(1).map(({ from }) => from.y)).toEqual([58.3, -58.3]);
    expect(plan?.fillets).toEqual([]);
  });

  it('the outstanding legs on their faces with cross centres of 2 · 54 + 8.6', () => {
    expect(face?.holes).toHaveLength(6);
    expect(face?.dimensions.map(({ text }) => text)).toEqual(['116.6', '69', '2 × 80']);
    expect(drawn.dimensions.map(({ text }) => text)).toEqual(['298', '52', '43', '41', '3 × 72']);
  });

  it('a single welded cleat: one side, its fillet outside the toe', () => {
    const one = prepare(EN, { ...welded, cleats: 1 }).geometry(toRadians(90));
    expect(one.welds).toEqual([{ from: { x: 0, y: -149 }, to: { x: 0, y: 149 }, leg: 6, bothSides: false }]);
    expect(one.bolts).toEqual([]);
    const [view, legs] = one.views ?? [];
    expect(view?.parts).toHaveLength(3);
    expect(view?.fillets).toEqual([
      [
        { x: 0, y: 104.3 },
        { x: 6, y: 104.3 },
        { x: 0, y: 110.3 },
      ],
    ]);
    expect(legs?.holes).toEqual([]);
  });

  it('quantities: the angles by their area, all bolts, fillets with returns of twice their leg', () => {
    // Area by numbers: (100 + 95 − 11) · 11 + (1 − π/4) · 12²/2 = 2039.5 mm².
    const area = 184 * 11 + (1 - Math.PI / 4) * 72;
    expect(detail.quantities.mass).toBeCloseTo(2 * area * 298 * 7850e-9, 9);
    expect(detail.quantities.boltCount).toBe(4 + 6);
    expect(detail.quantities.weldVolume).toBe(0);
    expect(prepare(EN, single).quantities.boltCount).toBe(4 + 3);
    expect(prepare(EN, welded).quantities.weldVolume).toBeCloseTo(2 * (298 + 12) * 18, 9);
  });
});
