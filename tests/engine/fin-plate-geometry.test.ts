import { describe, expect, it } from 'vitest';
import { toRadians } from '@shared/engine/index.ts';
import { EN, plain, prepare } from './support/fin-plate.ts';

describe('the drawing of a fin plate', () => {
  const detail = prepare(EN, plain);
  const drawn = detail.geometry(toRadians(-90));

  it('the plate: 62 + 66 + 51 wide, 150 + 2 x 43 high, welded over its height', () => {
    expect(drawn.outline).toEqual([
      { x: 0, y: -118 },
      { x: 179, y: -118 },
      { x: 179, y: 118 },
      { x: 0, y: 118 },
    ]);
    expect(drawn.welds).toEqual([{ from: { x: 0, y: -118 }, to: { x: 0, y: 118 }, leg: 9, bothSides: true }]);
    expect(drawn.thickness).toBe(11);
  });

  it('the holes in level rows about the middle', () => {
    expect(drawn.holes.map(({ centre }) => [centre.x, centre.y])).toEqual([
      [62, -75],
      [128, -75],
      [62, 0],
      [128, 0],
      [62, 75],
      [128, 75],
    ]);
    expect(new Set(drawn.holes.map(({ diameter }) => diameter))).toEqual(new Set([24]));
  });

  it('the beam from 13 off the face, its top 116 above the highest row, the cope 90 x 61 cut out', () => {
    const [web, upper, lower] = drawn.member.map(({ outline }) => outline);
    // Top 75 + 116 = 191, bottom 191 - 390 = -199.
    expect(web?.slice(0, 2)).toEqual([
      { x: 13, y: -199 },
      { x: web?.[1]?.x, y: -199 },
    ]);
    expect(web?.slice(3)).toEqual([
      { x: 103, y: 191 },
      { x: 103, y: 130 },
      { x: 13, y: 130 },
    ]);
    expect(upper?.[0]).toEqual({ x: 103, y: 178 });
    expect(lower?.[0]).toEqual({ x: 13, y: -199 });
  });

  it('the load along its angle from where the shear acts', () => {
    expect(drawn.axis.from).toEqual({ x: 95, y: 0 });
    expect(drawn.axis.to.x).toBeCloseTo(95, 9);
    expect(drawn.axis.to.y).toBeLessThan(-118);
    const atFace = prepare(EN, { ...plain, shear_line: 'support' }).geometry(0);
    expect(atFace.axis.from.x).toBe(0);
    expect(atFace.axis.to.y).toBe(0);
  });

  it('the dimensions add up', () => {
    const texts = drawn.dimensions.map(({ text }) => text);
    expect(texts).toEqual(['236', '62', '51', '43', '66', '2 × 75']);
  });

  it('a section through the bolts: plate and web side by side', () => {
    const [view] = drawn.views ?? [];
    expect(view?.parts[0]?.outline[0]).toEqual({ x: 0, y: -5.5 });
    expect(view?.parts[1]?.outline[2]?.y).toBe(14);
    expect(view?.bolts).toHaveLength(2);
    expect(view?.fillets).toHaveLength(2);
  });

  it('quantities: the plate alone, its bolts and both fillets', () => {
    // 236 x 179 x 11 x 7850e-9 = 3.648 kg; 6; 236 x 81.
    expect(detail.quantities.mass).toBeCloseTo(3.648, 3);
    expect(detail.quantities.boltCount).toBe(6);
    expect(detail.quantities.weldVolume).toBe(19_116);
  });
});
