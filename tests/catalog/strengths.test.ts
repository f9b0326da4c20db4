import { describe, expect, it } from 'vitest';
import { catalogue, findBolt, findBoltGrade, findElectrode, findSteel } from '@catalog/index.ts';

describe('bolts', () => {
  // ISO 898-1 tensile stress areas as printed in handbook tables; M14, M18, M33 from memory.
  it.each([
    ['M12', 84.3],
    ['M14', 115],
    ['M16', 157],
    ['M18', 192],
    ['M20', 245],
    ['M22', 303],
    ['M24', 353],
    ['M27', 459],
    ['M30', 561],
    ['M33', 694],
    ['M36', 817],
  ])('%s has the printed stress area', (name, area) => {
    expect(findBolt(name)?.As).toBe(area);
  });

  it.each(catalogue.bolts)('$name has the stress area of its thread', ({ name, d, pitch, As }) => {
    // ISO 898-1: A_s = pi/4 (d - 0.9382 P)^2; ASME B1.1: A_s = pi/4 (d - 0.9743 P)^2; printed to three figures.
    const depth = name.startsWith('M') ? 0.9382 : 0.9743;
    expect(Math.abs(As / ((Math.PI / 4) * (d - depth * pitch) ** 2) - 1)).toBeLessThanOrEqual(0.005);
  });

  // EN 1090-2 Table 11; ANSI/AISC 360-22 Table J3.3M standard and oversize.
  it.each([
    ['M12', 13, 14, 16],
    ['M16', 18, 18, 20],
    ['M20', 22, 22, 24],
    ['M22', 24, 24, 28],
    ['M24', 26, 27, 30],
    ['M27', 30, 30, 35],
    ['M30', 33, 33, 38],
  ])('%s has the hole of each standard', (name, en, aisc, aiscOversize) => {
    const holes = findBolt(name)?.holes;
    expect(holes?.normal.en).toBe(en);
    expect(holes?.normal.aisc).toBe(aisc);
    expect(holes?.oversize.aisc).toBe(aiscOversize);
  });

  it('fits its hole, an oversize hole being larger, and its head being wider than the hole', () => {
    for (const { name, d, holes, headAcrossFlats, headAcrossCorners } of catalogue.bolts) {
      expect(headAcrossCorners, name).toBeGreaterThan(headAcrossFlats);
      for (const practice of ['en', 'sans', 'csa', 'aisc'] as const) {
        const normal = holes.normal[practice];
        if (normal === null) continue;
        expect(normal, name).toBeGreaterThan(d);
        expect(headAcrossFlats, name).toBeGreaterThan(normal);
        expect(holes.oversize[practice] ?? Infinity, name).toBeGreaterThan(normal);
      }
    }
  });

  // EN 1993-1-8 Table 3.1, and ISO 898-1 minimum tensile strength at 16 mm and 20 mm.
  it.each([
    ['4.6', 240, 400, 400, 400],
    ['4.8', 320, 400, 420, 420],
    ['5.6', 300, 500, 500, 500],
    ['5.8', 400, 500, 520, 520],
    ['6.8', 480, 600, 600, 600],
    ['8.8', 640, 800, 800, 830],
    ['10.9', 900, 1000, 1040, 1040],
  ])('class %s has its nominal and minimum strengths', (name, fyb, fub, at16, at20) => {
    const grade = findBoltGrade(name);
    expect(grade?.nominal).toEqual({ fyb, fub });
    expect(grade?.minimum.find(({ dMax }) => dMax >= 16)?.fub).toBe(at16);
    expect(grade?.minimum.find(({ dMax }) => dMax >= 20)?.fub).toBe(at20);
  });

  // ASTM F3125: 830 MPa and 1040 MPa.
  it('knows the metric ASTM grades, which have no EN nominal value', () => {
    expect(findBoltGrade('A325M')).toMatchObject({ nominal: null, minimum: [{ dMax: 36, fub: 830 }] });
    expect(findBoltGrade('A490M')).toMatchObject({ nominal: null, minimum: [{ dMax: 36, fub: 1040 }] });
  });
});

describe('steels', () => {
  const bandAt = (name: string, t: number) => findSteel(name)?.bands.find(({ tMax }) => t <= tMax);

  // EN 10025-2 by thickness to 16, 40, 63, 80, 100 mm, and its lowest tensile strength (3 to 100 mm).
  it.each([
    ['S235', 360, [235, 225, 215, 215, 215]],
    ['S275', 410, [275, 265, 255, 245, 235]],
    ['S355', 470, [355, 345, 335, 325, 315]],
    ['S275JR', 410, [275, 265, 255, 245, 235]],
    ['S355JR', 470, [355, 345, 335, 325, 315]],
  ])('%s falls with thickness as printed', (name, fu, yields) => {
    const thicknesses = [16, 40, 63, 80, 100];
    expect(thicknesses.map((t) => bandAt(name, t)?.fy)).toEqual(yields);
    expect(thicknesses.map((t) => bandAt(name, t)?.fu)).toEqual(thicknesses.map(() => fu));
  });

  it('S460 yields as the published resistance-table notes print', () => {
    expect([16, 40, 63, 80, 100].map((t) => bandAt('S460', t)?.fy)).toEqual([460, 440, 430, 410, 400]);
  });

  // SANS 1431, CSA G40.21, ASTM: values at 10 mm.
  it.each([
    ['300WA', 300, 450],
    ['350WA', 350, 480],
    ['300W', 300, 440],
    ['350W', 350, 450],
    ['A36', 250, 400],
    ['A572-50', 345, 450],
    ['A992', 345, 450],
  ])('%s has its strengths at 10 mm', (name, fy, fu) => {
    expect(bandAt(name, 10)).toMatchObject({ fy, fu });
  });

  it('has no value past its last thickness', () => {
    expect(bandAt('S355', 100.1)).toBeUndefined();
    expect(bandAt('350WA', 64)).toBeUndefined();
  });

  it('names the other printed tensile strengths of S355 and S275', () => {
    expect(bandAt('S355', 10)?.alternatives.map(({ fu }) => fu)).toEqual([490, 510]);
    expect(bandAt('S275', 10)?.alternatives.map(({ fu }) => fu)).toEqual([430]);
  });

  it('takes the lowest printed tensile strength, and neither strength rises with thickness', () => {
    for (const { name, bands } of catalogue.steels) {
      bands.forEach((band, index) => {
        for (const { fu } of band.alternatives) expect(fu ?? band.fu, name).toBeGreaterThanOrEqual(band.fu);
        const thinner = bands[index - 1];
        if (!thinner) return;
        expect(band.tMax, name).toBeGreaterThan(thinner.tMax);
        expect(band.fy, name).toBeLessThanOrEqual(thinner.fy);
        expect(band.fu, name).toBeLessThanOrEqual(thinner.fu);
      });
    }
  });

  it('is stronger at rupture than at yield', () => {
    for (const { name, bands } of catalogue.steels) {
      for (const { fy, fu } of bands) expect(fu, name).toBeGreaterThan(fy);
    }
  });
});

// SANS practice X_u 480; CSA W48 490, 480, 550, 620.
describe('weld metals', () => {
  it.each([
    ['E70XX', 480],
    ['E48XX', 480],
    ['E49XX', 490],
    ['E55XX', 550],
    ['E62XX', 620],
  ])('%s has its tensile strength', (name, xu) => {
    expect(findElectrode(name)?.xu).toBe(xu);
  });
});
