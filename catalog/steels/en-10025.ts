import type { AlternativeStrength, Practice, SteelRecord, StrengthBand } from '../types.ts';
import { bands } from './bands.ts';

const EC3 = 'EN 1993-1-1:2005 Table 3.1';
const EC3_AC = 'EN 1993-1-1:2005 Table 3.1 with corrigendum AC:2009';

const structural = {
  products: ['plate', 'section'] as const,
  tMin: 3,
  evidence:
    'from memory; yield of S275 and S355 to 80 mm and of S460 to 100 mm seen in published resistance-table notes',
};
const beyond = { field: 'bands above 100 mm', reason: 'not taken up: connection parts do not reach it' };

const table31 = (fy: number, fu: number): AlternativeStrength => ({ fy, fu, source: EC3 });

const s235 = bands(
  [16, 235, 360, [table31(235, 360)]],
  [40, 225, 360, [table31(235, 360)]],
  [63, 215, 360, [table31(215, 360)]],
  [80, 215, 360, [table31(215, 360)]],
  [100, 215, 360],
);
const s275 = bands(
  [16, 275, 410, [table31(275, 430)]],
  [40, 265, 410, [table31(275, 430)]],
  [63, 255, 410, [table31(255, 410)]],
  [80, 245, 410, [table31(255, 410)]],
  [100, 235, 410],
);
const thinS355: readonly AlternativeStrength[] = [
  { fy: 355, fu: 490, source: EC3_AC },
  { fy: 355, fu: 510, source: `${EC3}, first printing` },
];
const s355 = bands(
  [16, 355, 470, thinS355],
  [40, 345, 470, thinS355],
  [63, 335, 470, [table31(335, 470)]],
  [80, 325, 470, [table31(335, 470)]],
  [100, 315, 470],
);
const s460 = bands(
  [16, 460, 540, [{ fy: 460, fu: 540, source: `${EC3}, S460N and S460M` }]],
  [40, 440, 540, [{ fy: 460, fu: 540, source: `${EC3}, S460N and S460M` }]],
  [63, 430, 530, [{ fu: 540, source: 'EN 10025-3, S460N' }]],
  [80, 410, 510, [{ fu: 540, source: 'EN 10025-3, S460N' }]],
  [100, 400, 500, [{ fu: 540, source: 'EN 10025-3, S460N' }]],
);

const lowest =
  'f_u is the lowest printed value (3 mm to 100 mm); the others stand beside it with their source.';

function en10025(name: string, table: readonly StrengthBand[]): SteelRecord {
  return {
    ...structural,
    name,
    standard: 'EN 10025-2',
    bands: table,
    practices: ['en'],
    note: `Every toughness quality (JR, J0, J2, K2) of the grade. ${lowest}`,
    source: 'EN 10025-2 Table 6 (yield strength, tensile strength)',
    edition: 'EN 10025-2:2019',
    missing: [beyond],
  };
}

function sans50025(name: string, table: readonly StrengthBand[]): SteelRecord {
  const practices: readonly Practice[] = ['sans'];
  return {
    ...structural,
    name,
    standard: 'SANS 50025-2',
    bands: table.map((band) => ({ ...band, alternatives: [] })),
    practices,
    note: 'The values of EN 10025-2, which SANS 50025-2 adopts.',
    source: 'SANS 50025-2 / EN 10025-2 (yield strength, tensile strength)',
    edition: 'SANS 50025-2 as adopted from EN 10025-2:2004',
    missing: [beyond],
  };
}

const s460Record: SteelRecord = {
  ...structural,
  name: 'S460',
  standard: 'EN 10025-4',
  bands: s460,
  practices: ['en'],
  note:
    'The values of S460M (EN 10025-4), at no thickness above those of S460N (EN 10025-3). ' +
    'Not for S460JR of EN 10025-2:2019, which has a table of its own.',
  source: 'EN 10025-4 (S460M), compared with EN 10025-3 (S460N)',
  edition: 'EN 10025-4:2019; EN 10025-3:2019',
  missing: [beyond],
};

/** Steels of EN 10025, and the same under SANS 50025. MPa by thickness in mm. */
export const en10025Steels: readonly SteelRecord[] = [
  en10025('S235', s235),
  en10025('S275', s275),
  en10025('S355', s355),
  s460Record,
  sans50025('S275JR', s275),
  sans50025('S355JR', s355),
];
