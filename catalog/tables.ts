import type { TableDescription, TableName } from './types.ts';

const holes = { en: 'mm', sans: 'mm', csa: 'mm', aisc: 'mm' };

/** `{ en: 'mm' }` under `holes.normal` becomes `{ 'holes.normal.en': 'mm' }`. */
function under(prefix: string, units: Readonly<Record<string, string>>): Record<string, string> {
  return Object.fromEntries(Object.entries(units).map(([field, unit]) => [`${prefix}.${field}`, unit]));
}

const leg = { oneLine: 'mm', twoLines: 'mm' };

/** Title of each table and the unit of every number in it; a list's items share the path of the list. */
export const tables: Readonly<Record<TableName, TableDescription>> = {
  bolts: {
    title: 'Bolts M12 to M36 and 1/2 in to 1-1/2 in',
    units: {
      ...{ d: 'mm', pitch: 'mm', As: 'mm2', headAcrossFlats: 'mm', headAcrossCorners: 'mm' },
      ...under('holes.normal', holes),
      ...under('holes.oversize', holes),
    },
  },
  boltGrades: {
    title: 'Bolt property classes and grades',
    units: {
      ...{ dMin: 'mm', dMax: 'mm' },
      fyb: 'MPa',
      ...under('nominal', { fyb: 'MPa', fub: 'MPa' }),
      ...under('minimum', { dMax: 'mm', fub: 'MPa' }),
      ...under('aisc', { dMax: 'mm', fnt: 'MPa', fnvN: 'MPa', fnvX: 'MPa' }),
    },
  },
  steels: {
    title: 'Structural steels by thickness',
    units: {
      tMin: 'mm',
      ...under('bands', { tMax: 'mm', fy: 'MPa', fu: 'MPa' }),
      ...under('bands.alternatives', { fy: 'MPa', fu: 'MPa' }),
    },
  },
  electrodes: { title: 'Weld metals', units: { xu: 'MPa' } },
  angles: {
    title: 'Equal and unequal angles',
    units: {
      ...{ a: 'mm', b: 'mm', t: 'mm', r1: 'mm', r2: 'mm', A: 'mm2', cx: 'mm', cy: 'mm', mass: 'kg/m' },
      ...under('backmarks.a', leg),
      ...under('backmarks.b', leg),
    },
  },
  flats: { title: 'Flat bars', units: { b: 'mm', t: 'mm', A: 'mm2', mass: 'kg/m' } },
  iSections: {
    title: 'Rolled I and H sections',
    units: { h: 'mm', b: 'mm', tw: 'mm', tf: 'mm', r: 'mm', A: 'mm2', mass: 'kg/m' },
  },
  backmarks: { title: 'Suggested back marks by leg', units: { leg: 'mm', ...leg } },
};
