import type { BackmarkRecord, LegBackmarks, MissingValue } from './types.ts';

/** Leg, one line from the heel, two lines (heel to first, first to second). mm. */
type Row = readonly [leg: number, oneLine: number | null, twoLines: readonly [number, number] | null];

const rows: readonly Row[] = [
  [40, 23, null],
  [45, 25, null],
  [50, 28, null],
  [60, 35, null],
  [65, 35, null],
  [70, 40, null],
  [75, 45, null],
  [80, 45, null],
  [90, 50, null],
  [100, 55, null],
  [120, null, [45, 50]],
  [125, null, [45, 50]],
  [150, null, [55, 55]],
  [200, null, [75, 75]],
];

function missingOf(oneLine: number | null, twoLines: readonly number[] | null): readonly MissingValue[] {
  const missing: MissingValue[] = [];
  if (oneLine === null)
    missing.push({ field: 'oneLine', reason: 'common practice gives this leg two lines' });
  if (twoLines === null) missing.push({ field: 'twoLines', reason: 'the leg has no room for two lines' });
  return missing;
}

/** Suggested back marks by leg length: common practice, to be checked against the firm's own. mm. */
export const backmarks: readonly BackmarkRecord[] = rows.map(([leg, oneLine, twoLines]) => ({
  name: `leg ${leg}`,
  leg,
  oneLine,
  twoLines,
  source: 'common practice of the United Kingdom, not a standard',
  edition: 'undated',
  evidence: 'from memory; a suggestion, check before use',
  missing: missingOf(oneLine, twoLines),
}));

/** Suggested back marks of a leg; nulls where practice gives none for that length. */
export function backmarksOfLeg(leg: number): LegBackmarks {
  const found = backmarks.find((record) => record.leg === leg);
  return { oneLine: found?.oneLine ?? null, twoLines: found?.twoLines ?? null };
}
