import { LIMITS, type AngleGrid, type ParameterSetting } from '@shared/contracts/definition.ts';
import { countOfRange } from '@shared/engine/sweep/index.ts';
import { count } from '../../composables/format.ts';

const many = (grid: AngleGrid | ParameterSetting): number => {
  if (grid.mode === 'fixed' || grid.mode === 'derived') return 1;
  return grid.mode === 'list' ? grid.values.length : countOfRange(grid.from, grid.to, grid.step);
};

export interface Counts {
  readonly variants: number;
  readonly angles: number;
  readonly cells: number;
}

export function countsOf(
  settings: Readonly<Record<string, ParameterSetting>>,
  angles: AngleGrid | null,
  senses: number,
): Counts {
  const variants = Object.values(settings).reduce((product, setting) => product * many(setting), 1);
  const perVariant = angles ? many(angles) : 0;
  return { variants, angles: perVariant, cells: variants * perVariant * senses };
}

/** Above this a sweep still runs, but the person should mean it. */
export const MANY_CELLS = 100_000;

/** Why a sweep of this size is refused, or null. */
export function refusalOf({ variants, cells }: Counts): string | null {
  const over = (what: string, given: number, limit: number) =>
    `${count(given)} ${what} are more than the ${count(limit)} that one family may have. Sweep fewer values, or make two families.`;
  if (variants > LIMITS.variants) return over('variants', variants, LIMITS.variants);
  if (cells > LIMITS.cells) return over('cells', cells, LIMITS.cells);
  return null;
}
