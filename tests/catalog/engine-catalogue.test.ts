import { expect, it } from 'vitest';
import { catalogue, toEngineCatalogue } from '@catalog/index.ts';

const engine = toEngineCatalogue(catalogue);

it('hands the engine every size, class and section with the values of its own basis', () => {
  expect(engine.boltSizes).toHaveLength(catalogue.bolts.length);
  expect(engine.sections).toHaveLength(
    catalogue.angles.length + catalogue.flats.length + catalogue.iSections.length,
  );
  // EN 1090-2 d + 2 at M24, CSA S16 22.3.5 d + 2, ANSI/AISC 360 Table J3.3M 27; ISO 898-1 stress areas.
  expect(engine.boltSizes.find(({ name }) => name === 'M24')).toEqual({
    name: 'M24',
    d: 24,
    stressArea: 353,
    hole: { en: 26, sans: 26, csa: 26, aisc: 27 },
  });
  // 3/4 in: ANSI/AISC 360 Table J3.3 13/16 in, CSA S16 22.3.5 d + 2 mm; ASME B1.1 0.334 in2. EN has no inch sizes.
  expect(engine.boltSizes.find(({ name }) => name === '3/4 in')).toEqual({
    name: '3/4 in',
    d: 19.05,
    stressArea: 215.5,
    hole: { en: null, sans: null, csa: 21.05, aisc: 20.64 },
  });
  // EN 10056-1, from memory: L150x75x10 has r1 12 and 21.7 cm2.
  expect(engine.sections.find(({ name }) => name === 'L150x75x10')).toMatchObject({
    shape: 'angle',
    longLeg: 150,
    shortLeg: 75,
    thickness: 10,
    rootRadius: 12,
    area: 2170,
    // The same table: e_x 5.31 cm along the long leg, e_y 1.61 cm along the short leg.
    centroidLong: 16.1,
    centroidShort: 53.1,
  });
  expect(engine.sections.find(({ name }) => name === 'FL120x12')).toMatchObject({
    shape: 'flat',
    width: 120,
    thickness: 12,
    area: 1440,
  });
  // EN 10365, from memory: IPE300 is 300 deep, 150 wide, web 7.1, flange 10.7, radius 15, 53.8 cm2.
  expect(engine.sections.find(({ name }) => name === 'IPE300')).toMatchObject({
    shape: 'i',
    depth: 300,
    width: 150,
    webThickness: 7.1,
    flangeThickness: 10.7,
    rootRadius: 15,
    area: 5380,
  });
});

it('keeps the nominal and the minimum bolt strength apart', () => {
  // EN 1993-1-8 Table 3.1: 640 and 800; ISO 898-1: 800 to 16 mm, 830 above.
  const grade = engine.boltGrades.find(({ name }) => name === '8.8');
  expect(grade).toMatchObject({ fyb: 640, nominal: 800 });
  expect(grade?.minimum.map(({ fub }) => fub)).toEqual([800, 830]);
});

it('has no nominal strength for the grades that EN does not have', () => {
  const names = engine.boltGrades.filter(({ nominal }) => nominal !== null).map(({ name }) => name);
  expect(names).toEqual(['4.6', '4.8', '5.6', '5.8', '6.8', '8.8', '10.9']);
  expect(engine.boltGrades.slice(7).map(({ name }) => name)).toEqual([
    'A325M',
    'A490M',
    'A325',
    'A490',
    'A307',
  ]);
});

it('gives a class the lower of Table J3.2 of AISC 360 for its group and for a threaded part', () => {
  // Group 120: 90, 54, 68 ksi. Threaded part of 830 MPa: 622.5, 373.5, 467.3; of 800 MPa: 600, 360, 450.4.
  const grade = engine.boltGrades.find(({ name }) => name === '8.8');
  expect(grade?.aisc).toEqual([
    { dMax: 16, fnt: 600, fnvN: 360, fnvX: 450 },
    { dMax: 39, fnt: 620, fnvN: 372, fnvX: 467 },
  ]);
});

it('names a source for every record and is frozen', () => {
  for (const list of [engine.boltGrades, engine.steels, engine.electrodes, engine.sections]) {
    for (const { name, source } of list) expect(source.length, name).toBeGreaterThan(5);
  }
  expect(Object.isFrozen(engine.steels[0]?.bands[0])).toBe(true);
});
