import { readdirSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import { describe, expect, it } from 'vitest';
import {
  catalogue,
  findAngle,
  findBolt,
  findBoltGrade,
  findElectrode,
  findFlat,
  findISection,
  findSteel,
} from '@catalog/index.ts';
import type { CatalogueRecord, TableName } from '@catalog/types.ts';

/** Every file under catalog/. A new data file must be named here and reach `catalogue`. */
const KNOWN_FILES = [
  'angles/equal.ts',
  'angles/record.ts',
  'angles/unequal.ts',
  'backmarks.ts',
  'bolt-grades.ts',
  'bolts/inch.ts',
  'bolts/metric.ts',
  'electrodes.ts',
  'engine-catalogue.ts',
  'flats.ts',
  'freeze.ts',
  'i-sections/american.ts',
  'i-sections/british.ts',
  'i-sections/european.ts',
  'i-sections/record.ts',
  'index.ts',
  'mass.ts',
  'steels/bands.ts',
  'steels/en-10025.ts',
  'steels/north-american.ts',
  'steels/sans-1431.ts',
  'tables.ts',
  'types.ts',
];

/** Least and greatest plausible value by unit: a slipped decimal or a wrong unit falls outside. */
const PLAUSIBLE: Readonly<Record<string, readonly [number, number]>> = {
  mm: [1, 1200],
  mm2: [50, 50_000],
  MPa: [180, 1100],
  'kg/m': [0.5, 400],
};

const records = (table: TableName): readonly CatalogueRecord[] => catalogue[table];
const tableNames = Object.keys(catalogue.tables) as TableName[];

/** Every number or null in a record, with its dotted path; list items share the path of the list. */
function leaves(value: unknown, path = ''): { path: string; value: number | null }[] {
  if (value === null || typeof value === 'number') return [{ path, value }];
  if (Array.isArray(value)) return value.flatMap((item) => leaves(item, path));
  if (typeof value !== 'object') return [];
  return Object.entries(value).flatMap(([key, item]) => leaves(item, path ? `${path}.${key}` : key));
}

describe('the reference data', () => {
  it('consists of the known files', () => {
    const folder = fileURLToPath(new URL('../../catalog', import.meta.url));
    const found = readdirSync(folder, { recursive: true, withFileTypes: true })
      .filter((entry) => entry.isFile())
      .map((entry) => `${entry.parentPath}/${entry.name}`.slice(folder.length + 1));
    expect(found.sort()).toEqual(KNOWN_FILES);
  });

  it('describes every table it holds, and prints how much is in each', () => {
    expect(
      Object.keys(catalogue)
        .filter((key) => key !== 'tables')
        .sort(),
    ).toEqual([...tableNames].sort());
    const counts = tableNames.map((name) => `${name} ${records(name).length}`);
    console.info(`catalogue: ${counts.join(', ')}`);
    for (const name of tableNames) expect(records(name).length, name).toBeGreaterThan(0);
  });

  it('survives JSON unchanged and cannot be altered', () => {
    expect(JSON.parse(JSON.stringify(catalogue))).toEqual(catalogue);
    expect(() => Object.assign(catalogue.bolts[0]!.holes.normal, { en: 99 })).toThrow(TypeError);
    expect(() => (catalogue.steels as unknown[]).push({})).toThrow(TypeError);
  });

  it('is looked up by exact name', () => {
    const finders = [findBolt, findBoltGrade, findSteel, findElectrode, findAngle, findFlat, findISection];
    const names = ['M20', '8.8', 'S355', 'E70XX', 'L150x75x10', 'FL100x10', 'HEA200'];
    expect(finders.map((find, index) => find(names[index]!)?.name)).toEqual(names);
    for (const find of finders) {
      for (const unknown of ['', 'M21', 'm20', 'constructor', '__proto__'])
        expect(find(unknown)).toBeUndefined();
    }
  });
});

describe.each(tableNames)('%s', (table) => {
  it('names each record once, in plain ASCII', () => {
    const names = records(table).map(({ name }) => name);
    expect(new Set(names).size).toBe(names.length);
    for (const name of names) expect(name).toMatch(/^[A-Za-z0-9][A-Za-z0-9 ./-]*$/);
  });

  it('gives source, edition and evidence for each record', () => {
    for (const { name, source, edition, evidence } of records(table)) {
      for (const text of [source, edition, evidence]) expect(text.length, name).toBeGreaterThan(5);
    }
  });

  it('gives each number a unit, and a value plausible in it', () => {
    const { units } = catalogue.tables[table];
    for (const record of records(table)) {
      for (const { path, value } of leaves(record)) {
        if (value === null) continue;
        const [least, greatest] = PLAUSIBLE[units[path] ?? ''] ?? [NaN, NaN];
        expect(least, `${record.name} ${path} has no unit`).not.toBeNaN();
        expect(value, `${record.name} ${path}`).toBeGreaterThanOrEqual(least);
        expect(value, `${record.name} ${path}`).toBeLessThanOrEqual(greatest);
      }
    }
  });

  it('uses every unit it declares', () => {
    const used = new Set(records(table).flatMap((record) => leaves(record).map(({ path }) => path)));
    for (const path of Object.keys(catalogue.tables[table].units)) expect([...used], path).toContain(path);
  });

  it('says why wherever a value is missing', () => {
    for (const record of records(table)) {
      const { missing, ...rest } = record;
      const reasons = new Map(missing.map(({ field, reason }) => [field, reason]));
      const empty = leaves(rest).filter(({ value }) => value === null);
      for (const { path } of empty) expect(reasons.get(path) ?? '', `${record.name} ${path}`).not.toBe('');
      for (const reason of reasons.values()) expect(reason.length, record.name).toBeGreaterThan(10);
    }
  });
});
