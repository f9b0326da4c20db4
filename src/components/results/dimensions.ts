import { ANGLE_AXIS } from '@shared/contracts/exports.ts';
import type { ResultAxes } from '@shared/contracts/revisions.ts';
import { degrees } from '../../composables/format.ts';
import { valueTitle } from '../../composables/value-title.ts';

/** The load angle's name among the dimensions of a table; no parameter is named so. */
export const ANGLE = ANGLE_AXIS;

/** What a table can be laid out over: a swept parameter, or the load angle. */
export interface Dimension {
  readonly name: string;
  readonly label: string;
  readonly symbol: string;
  readonly unit: string;
  readonly titles: readonly string[];
  /** How far the variant's ordinal moves for one step; 0 for the load angle. */
  readonly stride: number;
}

/** The swept parameters in ordinal order, the last fastest, and the load angle after them. */
export function dimensionsOf(axes: Pick<ResultAxes, 'axes' | 'angles'>, kind: string): Dimension[] {
  let stride = 1;
  const swept = axes.axes.toReversed().map((axis): Dimension => {
    const titles = axis.values.map((value) => valueTitle(kind, axis.name, value));
    const { name, label, symbol, unit } = axis;
    const dimension = { name, label, symbol, unit, titles, stride };
    stride *= axis.values.length;
    return dimension;
  });
  const angle = { label: 'Load angle', symbol: 'θ', unit: '°', titles: axes.angles.map(plainAngle) };
  return [...swept.toReversed(), { name: ANGLE, ...angle, stride: 0 }];
}

const plainAngle = (angle: number) => degrees(angle).replace('°', '');

/** The place of each dimension's value in a variant: its index by dimension name. */
export function placesOf(dimensions: readonly Dimension[], ordinal: number): Record<string, number> {
  const swept = dimensions.filter(({ stride }) => stride > 0);
  return Object.fromEntries(
    swept.map(({ name, stride, titles }) => [name, Math.floor(ordinal / stride) % titles.length]),
  );
}
