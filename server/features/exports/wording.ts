import type { ExportRequest } from '@shared/contracts/exports.ts';
import type { ParameterValue } from '@shared/engine/index.ts';
import type { HeaderValue } from '../../documents/xlsx/types.ts';
import { type SweptRevision, valueText, warningOf } from '../results/service.ts';
import type { Dimension, Place, TableLayout } from './layout.ts';

/** A value as a table shows it: a number, the label of a choice, or text. */
export function shownValue({ kind }: SweptRevision, name: string, value: ParameterValue): HeaderValue {
  if (typeof value === 'number') return value;
  const choices = kind.parameters.find((spec) => spec.name === name)?.choices ?? [];
  return choices.find((choice) => choice.value === value)?.label ?? valueText(value);
}

/** A dimension over its values: `Plate thickness t, mm`. */
export const titleOf = ({ label, symbol, unit }: Dimension): string =>
  `${label}${symbol && ` ${symbol}`}${unit && `, ${unit}`}`;

function valueAt(swept: SweptRevision, { name, unit, values }: Dimension, place: Place): string {
  return `${shownValue(swept, name, values[place[name] ?? 0] ?? '')}${unit && ` ${unit}`}`;
}

/** What holds for a whole sheet, e.g. `Bolt size: M20`. */
export const holdsOf = (
  swept: SweptRevision,
  { held, sheets, heldPlace }: TableLayout,
  sheet: Place,
): string[] =>
  [...sheets, ...held].map(
    (dimension) => `${dimension.label}: ${valueAt(swept, dimension, { ...heldPlace, ...sheet })}`,
  );

/** The values that tell a sheet from the others. */
export const nameOf = (swept: SweptRevision, { sheets }: TableLayout, sheet: Place): string =>
  sheets.map((dimension) => valueAt(swept, dimension, sheet)).join(', ') || 'Table';

/** The people who stand in a title block. */
export interface People {
  readonly author: string;
  readonly checker: string;
  readonly publisher: string;
  readonly drafter: string;
}

const day = (moment: Date | null): string => moment?.toISOString().slice(0, 10) ?? '';

/** The lines of the title block, after firm and heading. */
export function titleLines(
  { row, basis, summary }: SweptRevision,
  { sense, drawingNumber }: ExportRequest,
  people: People,
  now: Date,
): string[] {
  return [
    `Revision ${row.letter} (${row.state}), published ${day(row.publishedAt)}, hash ${row.contentHash?.slice(0, 12)}`,
    `${basis.title}: ${basis.resultLabel}`,
    `Load in ${sense}; capacities rounded down to steps of ${summary.increment} kN`,
    `Drawing ${drawingNumber || '(none given)'}`,
    `Author ${people.author}, checker ${people.checker}, publisher ${people.publisher}`,
    `Table made ${day(now)} by ${people.drafter}`,
  ];
}

/** What is printed large over a revision that is no longer in force. */
export function warningText({ row }: SweptRevision): string | null {
  const warning = warningOf(row.state);
  if (!warning) return null;
  return row.withdrawnReason ? `${warning}. Reason: ${row.withdrawnReason}` : warning;
}

/** Decimals that show every multiple of an increment (kN). */
export const decimalsOf = (increment: number): number => String(increment).split('.')[1]?.length ?? 0;
