import type { AddWorksheetOptions, Font } from 'exceljs';
import { footerText } from './text.ts';
import type { TableDocument } from './types.ts';

/** Numbers of paper sizes in the format. */
const PAPER = { A3: 8, A4: 9 } as const;

export const BOLD: Partial<Font> = { bold: true };
export const LARGE: Partial<Font> = { bold: true, size: 14 };
export const LOUD: Partial<Font> = { bold: true, size: 16, color: { argb: 'FFB00020' } };

/**
 * Landscape, fitted to the width, with code, hash and page in the footer.
 * @param frozen rows and columns that stay in sight, and are repeated on each page
 */
export function pageOf(
  { paper, footer }: TableDocument,
  frozen: { rows: number; columns: number },
): Partial<AddWorksheetOptions> {
  const { rows, columns } = frozen;
  return {
    pageSetup: {
      // Its type lists some sizes only.
      paperSize: PAPER[paper] as never,
      orientation: 'landscape',
      fitToPage: true,
      fitToWidth: 1,
      fitToHeight: 0,
      margins: { left: 0.4, right: 0.4, top: 0.5, bottom: 0.6, header: 0.3, footer: 0.3 },
      ...(rows > 0 ? { printTitlesRow: `1:${rows}` } : {}),
    },
    headerFooter: {
      oddFooter: `&L${footerText(footer.left)}&Chash ${footerText(footer.centre)}&RPage &P of &N`,
    },
    views: rows > 0 ? [{ state: 'frozen', xSplit: columns, ySplit: rows }] : [],
  };
}
