import { HyperFormula } from 'hyperformula';
import { findKind, NOT_COVERED, toRadians } from '@shared/engine/index.ts';
import { engineCatalogue } from '@server/catalogue.ts';
import { capacityColumn, sheetRows } from './gusset-formulas.ts';
import { angles, rows, valuesOf } from './gusset-table.ts';
import { median, timed } from './timing.ts';

/** The table by the engine, N, cell by cell. */
function byEngine(gammaM2: number): Float64Array {
  const kind = findKind('gusset-plate')!;
  const out = new Float64Array(kind.limitStates.length);
  const cells = new Float64Array(rows.length * angles.length);
  const catalogue = engineCatalogue();
  let cell = 0;
  for (const row of rows) {
    const prepared = kind.prepare(valuesOf(row), 'en-1993-1-8-2005', catalogue, { gammaM2 });
    if (!prepared.ok) throw new Error(JSON.stringify(prepared.faults));
    for (const angle of angles) {
      const governing = prepared.detail.at(toRadians(angle), 'tension', out);
      cells[cell++] = governing <= NOT_COVERED || governing < 0 ? NaN : out[governing]!;
    }
  }
  return cells;
}

/** Greatest difference as a share; every cell must have a number on both sides. */
function difference(sheet: HyperFormula, id: number, cells: Float64Array): number {
  let most = 0;
  cells.forEach((ours, row) => {
    const theirs = Number(sheet.getCellValue({ sheet: id, row, col: capacityColumn }));
    const share = Math.abs(theirs / ours - 1);
    if (!(share < 1e-9)) throw new Error(`Row ${row + 1}: the sheet has ${theirs}, the engine ${ours}`);
    most = Math.max(most, share);
  });
  return most;
}

/** Recalculates the same table by both, in one run, and prints the ratio. */
export function benchSpreadsheet(): void {
  const sheet = HyperFormula.buildFromSheets(
    { F: [[1.25]], T: sheetRows() },
    { licenseKey: 'gpl-v3', useColumnIndex: false },
  );
  const id = sheet.getSheetId('T')!;
  const factor = { sheet: sheet.getSheetId('F')!, row: 0, col: 0 };
  const most = difference(sheet, id, byEngine(1.25));
  const recalculate = (gammaM2: number) => timed(() => sheet.setCellContents(factor, gammaM2));
  const theirs = median([1.3, 1.2, 1.3, 1.2, 1.25].map(recalculate));
  for (let warm = 0; warm < 40; warm++) byEngine(1.3);
  const ours = median([1.3, 1.2, 1.3, 1.2, 1.25].map((gammaM2) => timed(() => byEngine(gammaM2))));
  const cells = rows.length * angles.length;
  console.log(
    `\nThe same gusset table of ${cells} cells, recalculated (greatest difference ${most.toExponential(1)})`,
  );
  console.log(`  spreadsheet engine  ${(theirs * 1000).toFixed(1).padStart(9)} ms`);
  console.log(`  this engine         ${(ours * 1000).toFixed(1).padStart(9)} ms`);
  console.log(`  ratio               ${(theirs / ours).toFixed(0).padStart(9)} ×`);
}
