import type { ExportRequest } from '@shared/contracts/exports.ts';
import type { ResultAxes } from '@shared/contracts/revisions.ts';
import type { Sense } from '@shared/engine/types.ts';
import { ANGLE, type Dimension } from '../results/dimensions.ts';

/** A drafter's table before it is made. Each dimension has one place in it. */
export interface TablePlan {
  readonly revisionId: number;
  readonly down: readonly string[];
  readonly across: string;
  /** Place of the value at which a dimension is held; one that is named nowhere makes a sheet for each value. */
  readonly held: Readonly<Record<string, number>>;
  readonly sense: Sense;
  readonly drawingNumber: string;
  readonly paper: ExportRequest['paper'];
}

export const MOST_DOWN = 4;

/** Sizes down the side, load angles across, and sheets for what does not fit down. */
export function usualPlan(axes: ResultAxes, dimensions: readonly Dimension[]): TablePlan {
  const swept = dimensions.filter(({ name }) => name !== ANGLE).map(({ name }) => name);
  return {
    revisionId: axes.revisionId,
    down: swept.length ? swept.slice(-MOST_DOWN) : [ANGLE],
    across: swept.length ? ANGLE : '',
    held: {},
    sense: axes.senses[0] ?? 'tension',
    drawingNumber: '',
    paper: 'A3',
  };
}

/** The dimensions that stand neither down nor across. */
export const restOf = (plan: TablePlan, dimensions: readonly Dimension[]): Dimension[] =>
  dimensions.filter(({ name }) => name !== plan.across && !plan.down.includes(name));

/** The load angle makes no sheets: where it stands neither down nor across it is held, at first nearest to 0°. */
export function fittingPlan(plan: TablePlan, axes: ResultAxes): TablePlan {
  const stands = plan.across === ANGLE || plan.down.includes(ANGLE) || plan.held[ANGLE] !== undefined;
  if (stands) return plan;
  const size = (place: number) => Math.abs(axes.angles[place] ?? 0);
  const nearest = axes.angles.reduce((best, _, place) => (size(place) < size(best) ? place : best), 0);
  return { ...plan, held: { ...plan.held, [ANGLE]: nearest } };
}

/** How large the workbook gets. */
export function sizeOf(plan: TablePlan, dimensions: readonly Dimension[]) {
  const many = (name: string) => dimensions.find((dimension) => dimension.name === name)?.titles.length ?? 1;
  const product = (names: readonly string[]) => names.reduce((sum, name) => sum * many(name), 1);
  const sheets = restOf(plan, dimensions).filter(({ name }) => plan.held[name] === undefined);
  return {
    rows: product(plan.down),
    columns: plan.across ? many(plan.across) : 1,
    sheets: product(sheets.map(({ name }) => name)),
  };
}

/** What is asked of the server: held places become the values themselves. */
export function requestOf(
  plan: TablePlan,
  axes: ResultAxes,
  dimensions: readonly Dimension[],
): ExportRequest {
  const valueAt = (name: string, place: number) =>
    name === ANGLE ? axes.angles[place] : axes.axes.find((axis) => axis.name === name)?.values[place];
  const held = restOf(plan, dimensions).flatMap(({ name }) => {
    const place = plan.held[name];
    const value = place === undefined ? undefined : valueAt(name, place);
    return value === undefined ? [] : [[name, value as ExportRequest['held'][string]] as const];
  });
  return {
    revisionId: plan.revisionId,
    format: 'xlsx',
    down: [...plan.down],
    across: plan.across,
    held: Object.fromEntries(held),
    sense: plan.sense,
    drawingNumber: plan.drawingNumber.trim(),
    paper: plan.paper,
  };
}
