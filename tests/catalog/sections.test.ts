import { describe, expect, it } from 'vitest';
import { catalogue, findAngle, findFlat, findISection } from '@catalog/index.ts';
import { angleProperties } from './angle-geometry.ts';
import { publishedAngles, publishedISections } from './published-sections.ts';

/** Relative difference of a from b. */
const off = (a: number, b: number) => Math.abs(a / b - 1);

describe('angles', () => {
  it.each(catalogue.angles)('$name has the area and centroid of its dimensions', (angle) => {
    const geometry = angleProperties(angle.a, angle.b, angle.t, angle.r1, angle.r2);
    expect(off(angle.A, geometry.area)).toBeLessThanOrEqual(0.007);
    expect(off(angle.cx, geometry.cx)).toBeLessThanOrEqual(0.007);
    expect(off(angle.cy, geometry.cy)).toBeLessThanOrEqual(0.007);
  });

  it.each(publishedAngles)('%s holds the printed area and centroids', (name, area, along, across) => {
    const angle = findAngle(name);
    expect(angle?.A).toBeCloseTo(area * 100, 6);
    expect(angle?.cy).toBeCloseTo(along * 10, 6);
    expect(angle?.cx).toBeCloseTo(across * 10, 6);
  });

  it('offers at least 30 equal sizes', () => {
    expect(catalogue.angles.filter(({ a, b }) => a === b).length).toBeGreaterThanOrEqual(30);
  });

  it('stands on its longer leg, thinner than its legs, named by its dimensions', () => {
    for (const { name, a, b, t, r1 } of catalogue.angles) {
      expect(name).toBe(`L${a}x${b}x${t}`);
      expect(a, name).toBeGreaterThanOrEqual(b);
      expect(t + r1, name).toBeLessThan(b);
    }
  });

  it('keeps every suggested bolt line on the flat of the leg and inside the toe', () => {
    for (const { name, a, b, t, backmarks } of catalogue.angles) {
      for (const [leg, marks] of [
        [a, backmarks.a],
        [b, backmarks.b],
      ] as const) {
        const lines = [
          marks.oneLine,
          marks.twoLines?.[0],
          marks.twoLines && marks.twoLines[0] + marks.twoLines[1],
        ];
        for (const line of lines.filter((value) => typeof value === 'number')) {
          expect(line, name).toBeGreaterThan(t);
          expect(line, name).toBeLessThan(leg);
        }
      }
    }
  });

  // EN 10056-1 prints 15.0 kg/m for L100x100x10 and 3.77 kg/m for L50x50x5 (from memory): three figures.
  it.each([
    ['L100x100x10', 15.0],
    ['L50x50x5', 3.77],
  ])('%s weighs as printed', (name, mass) => {
    expect(off(findAngle(name)?.mass ?? 0, mass)).toBeLessThanOrEqual(0.007);
  });
});

describe('flats', () => {
  it('has the area and mass of a rectangle', () => {
    // EN 10058 prints 7.85 kg/m for 100 x 10 (from memory).
    expect(findFlat('FL100x10')).toMatchObject({ b: 100, t: 10, A: 1000, mass: 7.85 });
    for (const { name, b, t, A } of catalogue.flats) {
      expect(name).toBe(`FL${b}x${t}`);
      expect(A).toBe(b * t);
    }
  });
});

describe('I sections', () => {
  it.each(catalogue.iSections)('$name has the area of its dimensions', ({ h, b, tw, tf, r, A }) => {
    const geometry = 2 * b * tf + (h - 2 * tf) * tw + (4 - Math.PI) * r * r;
    expect(off(A, geometry)).toBeLessThanOrEqual(0.006);
  });

  it.each(publishedISections)('%s holds the printed area', (name, area) => {
    expect(findISection(name)?.A).toBeCloseTo(area * 100, 6);
  });

  it('weighs what a British section carries in its name, to the kilogram', () => {
    const british = catalogue.iSections.filter(({ series }) => series === 'UB' || series === 'UC');
    expect(british.length).toBeGreaterThan(0);
    for (const { name, mass } of british) {
      expect(Math.abs(mass - Number(name.split('x').at(-1))), name).toBeLessThanOrEqual(0.6);
    }
  });

  it('weighs what a W shape carries in its names, to a kilogram or 1 %', () => {
    const american = catalogue.iSections.filter(({ series }) => series === 'W');
    expect(american.length).toBeGreaterThan(40);
    for (const { name, mass, h } of american) {
      const [depth, weight] = name.slice(1).split('x').map(Number) as [number, number];
      // ASTM A6: pounds a foot in the US name, kilograms a metre in the metric one.
      const inInches = depth < 50;
      const named = inInches ? weight * 1.48816 : weight;
      expect(Math.abs(mass - named), name).toBeLessThanOrEqual(Math.max(1, 0.01 * named));
      expect(off(h, inInches ? depth * 25.4 : depth), name).toBeLessThanOrEqual(0.06);
    }
  });
});
