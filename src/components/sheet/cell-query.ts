import type { Sense } from '@shared/engine/types.ts';
import type { LocationQuery } from 'vue-router';
import { numberOf } from '../../composables/number-text.ts';

/** The sense and the load angle, degrees, of a sheet's address; null where either is missing or not one. */
export function readCellQuery({ sense, angle }: LocationQuery): { sense: Sense; angle: number } | null {
  if (sense !== 'tension' && sense !== 'compression') return null;
  const degrees = typeof angle === 'string' ? numberOf(angle) : undefined;
  return degrees === undefined || Math.abs(degrees) > 180 ? null : { sense, angle: degrees };
}
