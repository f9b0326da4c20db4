import type { Sweep } from '@shared/contracts/revisions.ts';
import { count } from '../../composables/format.ts';

export const isLive = ({ state }: Pick<Sweep, 'state'>): boolean => state === 'queued' || state === 'running';

export const SWEEP_WORDS: Readonly<Record<Sweep['state'], string>> = {
  queued: 'Waiting',
  running: 'Running',
  done: 'Done',
  failed: 'Failed',
  cancelled: 'Cancelled',
};

/** Per cent, never 100 before the end. */
export const percent = ({ fraction, state }: Pick<Sweep, 'fraction' | 'state'>): number =>
  state === 'done' ? 100 : Math.min(99, Math.floor(fraction * 100));

/** "12 s left", "about 3 min left"; nothing while it cannot be said. */
export function timeLeft(seconds: number | null): string {
  if (seconds === null) return '';
  if (seconds < 60) return `${Math.ceil(seconds)} s left`;
  const minutes = Math.round(seconds / 60);
  return minutes < 60 ? `about ${minutes} min left` : `about ${Math.round(seconds / 3600)} h left`;
}

export const rate = (cellsPerSecond: number | null): string =>
  cellsPerSecond === null ? '' : `${count(Math.round(cellsPerSecond))} cells/s`;

/** What is said to who listens: once each ten per cent, and at the end. */
export function announcement(sweep: Pick<Sweep, 'fraction' | 'state'>): string {
  if (sweep.state === 'running') return `Sweep at ${Math.floor(percent(sweep) / 10) * 10} per cent`;
  return `Sweep: ${SWEEP_WORDS[sweep.state].toLowerCase()}`;
}
