import type { Font, stream } from 'exceljs';
import { plainText } from './text.ts';
import type { HeaderValue } from './types.ts';

type Worksheet = ReturnType<stream.xlsx.WorkbookWriter['addWorksheet']>;

/** Writes rows from the top down; a row that is written is not held any longer. */
export class SheetWriter {
  constructor(private readonly sheet: Worksheet) {}

  /** Column widths in characters; before the first row. */
  widths(widths: readonly number[]): void {
    widths.forEach((width, index) => {
      this.sheet.getColumn(index + 1).width = width;
    });
  }

  /** One row; null leaves a cell empty. */
  row(values: readonly (HeaderValue | null)[], font?: Partial<Font>): void {
    const row = this.add(values);
    if (font) row.font = font;
    row.commit();
  }

  /** A row of labels, then of pairs whose first is a capacity in this number format. */
  cells(
    labels: readonly HeaderValue[],
    pairs: readonly (readonly [HeaderValue, HeaderValue])[],
    capacityFormat: string,
  ): void {
    const row = this.add([...labels, ...pairs.flat()]);
    pairs.forEach((_, index) => {
      row.getCell(labels.length + 2 * index + 1).numFmt = capacityFormat;
    });
    row.commit();
  }

  private add(values: readonly (HeaderValue | null)[]) {
    return this.sheet.addRow(values.map((value) => (typeof value === 'string' ? plainText(value) : value)));
  }

  line(text: string, font?: Partial<Font>): void {
    this.row([text], font);
  }

  end(): void {
    this.sheet.commit();
  }
}
