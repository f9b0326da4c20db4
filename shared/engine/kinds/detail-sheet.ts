import type { Basis, Rec } from '../standards/basis.ts';
import type { LimitStateInfo, Recorder, Rejection } from '../types.ts';

/** Capacities closer than this share of each other are a tie, which goes to the first listed. */
const TIE = 1e-9;

/** Index of the least of the first `count` capacities. */
export function governing(out: Float64Array, count: number): number {
  let index = 0;
  let least = out[0]!;
  for (let state = 1; state < count; state++) {
    if (out[state]! < least * (1 - TIE)) {
      least = out[state]!;
      index = state;
    }
  }
  return index;
}

/** Each limit state under its own heading; `work` are the functions of the sweep, in the same order. */
export function recordLimitStates(
  states: readonly LimitStateInfo[],
  work: readonly ((rec: Rec) => number)[],
  rec: Recorder,
): void {
  states.forEach(({ id, code, title, clause }, index) => {
    rec.section(id, `${code}  ${title}`);
    const capacity = work[index]?.(rec) ?? Infinity;
    if (capacity === Infinity) rec.line('R', 'capacity', '', 'does not apply', '', clause);
    else rec.line('R', 'capacity', '', capacity, 'N', clause);
  });
}

/** The governing limit state and the capacity. */
export function recordResult(
  state: LimitStateInfo | undefined,
  label: string,
  capacity: number,
  rec: Recorder,
): void {
  rec.section('result', 'Result');
  rec.line('', 'governing limit state', '', `${state?.code}  ${state?.title}`, '', state?.clause ?? '');
  rec.line('R', label, 'the least of the above', capacity, 'N', '');
}

/** The rules that a detail breaks, in place of a result. */
export function recordRejections(rejections: readonly Rejection[], rec: Recorder): void {
  rec.section('rules', 'Rules that the detail breaks');
  for (const { title, message, clause } of rejections) rec.line('', title, '', message, '', clause);
}

/** Why a load is not covered, in place of a result. */
export function recordNotCovered(reason: string, rec: Recorder): void {
  rec.section('result', 'Result');
  rec.line('', 'not covered', '', reason, '', '');
}

/** What the kind and the basis assume. */
export function recordNotes(lines: readonly string[], basis: Basis, rec: Recorder): void {
  rec.section('notes', 'Notes');
  for (const note of lines) rec.line('', note, '', '', '', '');
  for (const note of basis.info.notes) rec.line('', note.text, '', '', '', note.clause);
}
