/** A number stays a number in the file; text is always plain text. */
export type HeaderValue = number | string;

/** One cell of a table: kN and what governs, or the number of the rule that rejects it. */
export type TableCell =
  { readonly capacity: number; readonly code: string } | { readonly capacity: null; readonly rule: number };

export interface TableRow {
  readonly labels: readonly HeaderValue[];
  readonly cells: readonly TableCell[];
}

/** One sheet of capacities; its rows are read while they are written. */
export interface TableSheet {
  readonly name: string;
  /** What holds for the whole sheet, e.g. `Bolt size: M20`. */
  readonly holds: readonly string[];
  readonly down: readonly string[];
  readonly across: { readonly title: string; readonly values: readonly HeaderValue[] };
  rows(): AsyncIterable<TableRow>;
}

export interface NumberedRule {
  readonly number: number;
  readonly title: string;
  readonly clause: string;
}

/** Everything that a file of tables shows; no part of it is worked out while it is written. */
export interface TableDocument {
  /** SUPERSEDED or WITHDRAWN, said loudly; null while the revision is in force. */
  readonly warning: string | null;
  readonly heading: string;
  /** Lines of the title block: firm first, then revision, basis, people … */
  readonly firm: string;
  readonly titleLines: readonly string[];
  readonly paper: 'A4' | 'A3';
  readonly footer: { readonly left: string; readonly centre: string };
  /** Decimals of a capacity. */
  readonly decimals: number;
  readonly created: Date;
  readonly sheets: readonly TableSheet[];
  readonly limitStates: readonly { readonly code: string; readonly title: string; readonly clause: string }[];
  readonly rules: readonly NumberedRule[];
  readonly cautions: readonly string[];
  readonly notes: readonly string[];
  /** Hash, engine version and fixed parameters: a name, a value and a unit. */
  readonly facts: readonly (readonly [string, HeaderValue, string])[];
}
