import type { BasisId } from '../engine/index.ts';

/**
 * How a published value is known. `rule evaluation` is a formula worked out by hand, not a number seen in print:
 * it guards against change and is no evidence from outside.
 */
export type Evidence = 'found in text' | 'from memory' | 'rule evaluation';

/** A value as its source prints it. */
export interface Printed {
  readonly value: number;
  /** One unit of the last printed place. */
  readonly place: number;
}

/** Why a value may differ by more than half a unit of its last place: something in its source was rounded first. */
export interface RoundedFirst {
  readonly what: string;
  /** Share of the published value, from the printed and the exact intermediate, never from our own result. */
  readonly share: number;
}

/** One comparison of the engine with a value from outside it. */
export interface Check {
  readonly id: string;
  readonly basis: BasisId;
  readonly clause: string;
  readonly source: string;
  readonly evidence: Evidence;
  readonly inputs: string;
  readonly published: Printed;
  readonly unit: string;
  readonly ours: () => number;
  /** The limit state of a kind that is asked about, where a whole detail is. */
  readonly asks?: { readonly kind: string; readonly code: string };
  readonly roundedFirst?: RoundedFirst;
  /** What makes the check weak, when something does. */
  readonly weak?: string;
  readonly note?: string;
}

/** A published value that the engine does not or should not meet, and who is right. */
export interface Disagreement {
  readonly id: string;
  readonly published: string;
  readonly reason: string;
}

export interface Verdict {
  readonly ours: number;
  readonly difference: number;
  readonly tolerance: number;
  readonly agrees: boolean;
}

/** A value with the decimals of its source, e.g. `94.1` or `0.620`. */
export function printed(text: string): Printed {
  const decimals = text.split('.')[1]?.length ?? 0;
  return { value: Number(text), place: 10 ** -decimals };
}

/** A value that its source prints to three significant figures. */
export function threeFigures(value: number): Printed {
  return { value, place: 10 ** (Math.floor(Math.log10(value)) - 2) };
}

/** The share by which an intermediate was rounded in the source. */
export function rounding(what: string, asPrinted: number, exact: number): RoundedFirst {
  return { what: `${what} printed as ${asPrinted}`, share: Math.abs(asPrinted / exact - 1) };
}

/** Half a unit of the last printed place, and what rounded intermediates explain; nothing looser. */
export function toleranceOf({ published, roundedFirst }: Check): number {
  return published.place / 2 + (roundedFirst?.share ?? 0) * published.value;
}

/** Compares; a value on the edge of its rounding agrees. */
export function verdictOf(check: Check): Verdict {
  const ours = check.ours();
  const difference = ours - check.published.value;
  const tolerance = toleranceOf(check);
  return { ours, difference, tolerance, agrees: Math.abs(difference) <= tolerance * (1 + 1e-9) };
}
