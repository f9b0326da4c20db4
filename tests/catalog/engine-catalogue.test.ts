import { expect, it } from 'vitest';
import { catalogue, toEngineCatalogue } from '@catalog/index.ts';

const engine = toEngineCatalogue(catalogue);

it('hands the engine every size, class and section with the values of its own basis', () => {
  expect(engine.boltSizes).toHaveLength(catalogue.bolts.length);
  expect(engine.sections).toHaveLength(catalogue.angles.length + catalogue.flats.length);
  // EN 1090-2 d + 2 at M24, d + 3 at M27; ISO 898-1 stress areas.
  expect(engine.boltSizes.find(({ name }) => name === 'M24')).toEqual({
    name: 'M24',
    d: 24,
    stressArea: 353,
    hole: { en: 26, sans: 26 },
  });
  // EN 10056-1, from memory: L150x75x10 has r1 12 and 21.7 cm2.
  expect(engine.sections.find(({ name }) => name === 'L150x75x10')).toMatchObject({
    shape: 'angle',
    longLeg: 150,
    shortLeg: 75,
    thickness: 10,
    rootRadius: 12,
    area: 2170,
  });
  expect(engine.sections.find(({ name }) => name === 'FL120x12')).toMatchObject({
    shape: 'flat',
    width: 120,
    thickness: 12,
    area: 1440,
  });
});

it('keeps the nominal and the minimum bolt strength apart', () => {
  // EN 1993-1-8 Table 3.1: 640 and 800; ISO 898-1: 800 to 16 mm, 830 above.
  const grade = engine.boltGrades.find(({ name }) => name === '8.8');
  expect(grade).toMatchObject({ fyb: 640, nominal: 800 });
  expect(grade?.minimum.map(({ fub }) => fub)).toEqual([800, 830]);
});

it('leaves out the grades that EN gives no nominal strength', () => {
  const names = engine.boltGrades.map(({ name }) => name);
  expect(names).toEqual(['4.6', '4.8', '5.6', '5.8', '6.8', '8.8', '10.9']);
});

it('names a source for every record and is frozen', () => {
  for (const list of [engine.boltGrades, engine.steels, engine.electrodes, engine.sections]) {
    for (const { name, source } of list) expect(source.length, name).toBeGreaterThan(5);
  }
  expect(Object.isFrozen(engine.steels[0]?.bands[0])).toBe(true);
});
