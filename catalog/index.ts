/**
 * The reference data of every detail: the one way in. Plain, frozen, JSON-serialisable.
 * Units stand in `catalogue.tables`; each record names its source, edition and evidence.
 */
import { equalAngles } from './angles/equal.ts';
import { unequalAngles } from './angles/unequal.ts';
import { backmarks } from './backmarks.ts';
import { boltGrades } from './bolt-grades.ts';
import { inchBolts } from './bolts/inch.ts';
import { metricBolts } from './bolts/metric.ts';
import { electrodes } from './electrodes.ts';
import { flats } from './flats.ts';
import { deepFreeze } from './freeze.ts';
import { americanISections } from './i-sections/american.ts';
import { britishISections } from './i-sections/british.ts';
import { europeanISections } from './i-sections/european.ts';
import { en10025Steels } from './steels/en-10025.ts';
import { northAmericanSteels } from './steels/north-american.ts';
import { sans1431Steels } from './steels/sans-1431.ts';
import { tables } from './tables.ts';
import type {
  AngleRecord,
  BoltGradeRecord,
  BoltSizeRecord,
  Catalogue,
  ElectrodeRecord,
  FlatRecord,
  ISectionRecord,
  SteelRecord,
} from './types.ts';

export { toEngineCatalogue } from './engine-catalogue.ts';
export type * from './types.ts';

export const catalogue: Catalogue = deepFreeze({
  bolts: [...metricBolts, ...inchBolts],
  boltGrades,
  steels: [...en10025Steels, ...sans1431Steels, ...northAmericanSteels],
  electrodes,
  angles: [...equalAngles, ...unequalAngles],
  flats,
  iSections: [...europeanISections, ...britishISections, ...americanISections],
  backmarks,
  tables,
});

function finder<T extends { readonly name: string }>(records: readonly T[]): (name: string) => T | undefined {
  const byName = new Map(records.map((record) => [record.name, record]));
  return (name) => byName.get(name);
}

/** Bolt size by name, e.g. `M20` or `3/4 in`; undefined when unknown. */
export const findBolt: (name: string) => BoltSizeRecord | undefined = finder(catalogue.bolts);

/** Bolt grade by name, e.g. `8.8`; undefined when unknown. */
export const findBoltGrade: (name: string) => BoltGradeRecord | undefined = finder(catalogue.boltGrades);

/** Steel by name, e.g. `S355`; undefined when unknown. */
export const findSteel: (name: string) => SteelRecord | undefined = finder(catalogue.steels);

/** Weld metal by classification, e.g. `E70XX`; undefined when unknown. */
export const findElectrode: (name: string) => ElectrodeRecord | undefined = finder(catalogue.electrodes);

/** Angle by name, long leg first, e.g. `L150x75x10`; undefined when unknown. */
export const findAngle: (name: string) => AngleRecord | undefined = finder(catalogue.angles);

/** Flat bar by name, e.g. `FL100x10`; undefined when unknown. */
export const findFlat: (name: string) => FlatRecord | undefined = finder(catalogue.flats);

/** I or H section by name, e.g. `HEA200`; undefined when unknown. */
export const findISection: (name: string) => ISectionRecord | undefined = finder(catalogue.iSections);
