import type { SteelRecord, StrengthBand } from '../types.ts';
import { bands } from './bands.ts';

function sans1431(name: string, table: readonly StrengthBand[]): SteelRecord {
  return {
    name,
    standard: 'SANS 1431',
    products: ['plate', 'section'],
    tMin: 3,
    bands: table,
    practices: ['sans'],
    note: 'Yield falls by 10 MPa a band above 16 mm and above 40 mm.',
    source: 'SANS 1431 (weldable structural steels), grade WA',
    edition: 'SANS 1431:2007',
    evidence: 'from memory; the values to 16 mm agree with general practice, thicker bands unconfirmed',
    missing: [{ field: 'bands above 63 mm', reason: 'value not known to us' }],
  };
}

/** Grades of SANS 1431. MPa by thickness in mm. */
export const sans1431Steels: readonly SteelRecord[] = [
  sans1431('300WA', bands([16, 300, 450], [40, 290, 450], [63, 280, 450])),
  sans1431('350WA', bands([16, 350, 480], [40, 340, 480], [63, 330, 480])),
];
