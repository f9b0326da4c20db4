import type { EngineCatalogue } from '@shared/engine/types.ts';
import { deepFreeze } from './freeze.ts';
import type { BoltSizeRecord, Catalogue } from './types.ts';

/**
 * The part of the reference data that a kind computes with, in the engine's own shape.
 * What a standard does not list is null or empty: its bases refuse it by name, or use their rule for the diameter.
 */
export function toEngineCatalogue(catalogue: Catalogue): EngineCatalogue {
  return deepFreeze({
    boltSizes: catalogue.bolts.map(boltSize),
    boltGrades: catalogue.boltGrades.map(({ name, fyb, nominal, minimum, aisc, source }) => ({
      name,
      fyb,
      nominal: nominal?.fub ?? null,
      minimum,
      aisc,
      source,
    })),
    steels: catalogue.steels.map(({ name, bands, source }) => ({
      name,
      bands: bands.map(({ tMax, fy, fu }) => ({ tMax, fy, fu })),
      source,
    })),
    electrodes: catalogue.electrodes.map(({ name, xu, source }) => ({ name, xu, source })),
    sections: [
      ...catalogue.angles.map(angleSection),
      ...catalogue.flats.map(flatSection),
      ...catalogue.iSections.map(iSection),
    ],
  });
}

function boltSize({ name, d, As, holes }: BoltSizeRecord): EngineCatalogue['boltSizes'][number] {
  return { name, d, stressArea: As, hole: holes.normal };
}

function angleSection(record: Catalogue['angles'][number]): EngineCatalogue['sections'][number] {
  const { name, a, b, t, r1, A, cx, cy, source } = record;
  return {
    shape: 'angle',
    name,
    longLeg: a,
    shortLeg: b,
    thickness: t,
    rootRadius: r1,
    area: A,
    centroidLong: cx,
    centroidShort: cy,
    source,
  };
}

function flatSection({
  name,
  b,
  t,
  A,
  source,
}: Catalogue['flats'][number]): EngineCatalogue['sections'][number] {
  return { shape: 'flat', name, width: b, thickness: t, area: A, source };
}

function iSection(record: Catalogue['iSections'][number]): EngineCatalogue['sections'][number] {
  const { name, h, b, tw, tf, r, A, source } = record;
  return {
    shape: 'i',
    name,
    depth: h,
    width: b,
    webThickness: tw,
    flangeThickness: tf,
    rootRadius: r,
    area: A,
    source,
  };
}
