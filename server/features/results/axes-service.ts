import type { z } from 'zod';
import type { resultAxesResponse } from '@shared/contracts/revisions.ts';
import { findBasis, toRadians, type LimitStateInfo } from '@shared/engine/index.ts';
import { RULE_CODE, ruleLegend } from '@shared/engine/sweep/index.ts';
import { engineCatalogue } from '../../catalogue.ts';
import type { App } from '../../context.ts';
import { prepareVariant, type SweptRevision } from './swept-revision.ts';

export interface LegendRule {
  readonly rule: string;
  readonly title: string;
  readonly clause: string;
  readonly cells: number;
}

/** The limit states with the clauses of the revision's basis, in the order of the packed codes. */
export function limitStatesOf({ kind, definition }: SweptRevision): readonly LimitStateInfo[] {
  const prepared = kind.prepare({}, definition.basis, engineCatalogue(), definition.factors);
  if (prepared.ok) return prepared.detail.limitStates;
  return kind.limitStates.map((state) => ({ ...state, clause: findBasis(definition.basis)?.short ?? '' }));
}

/** Every rule in the order of the packed codes, with the cells it rejects and, where it does, its clause. */
export async function rulesOf(app: App, swept: SweptRevision): Promise<LegendRule[]> {
  const counts = new Map(swept.summary.rejected.map(({ rule, cells }) => [rule, cells]));
  return Promise.all(
    ruleLegend(swept.kind, swept.definition.rules).map(async ({ id, title }, index) => {
      const cells = counts.get(id) ?? 0;
      const clause = cells > 0 ? await clauseOf(app, swept, id, RULE_CODE - index) : '';
      return { rule: id, title, clause, cells };
    }),
  );
}

/** Only a rejection names its clause, so the first rejected cell is worked out again. */
async function clauseOf(app: App, swept: SweptRevision, rule: string, code: number): Promise<string> {
  const [found] = await app.db.select<{ ordinal: number; place: number }>(
    `SELECT ordinal, LOCATE(CHAR(:code), governing) AS place FROM variants
     WHERE revision_id = :id AND LOCATE(CHAR(:code), governing) > 0 ORDER BY ordinal LIMIT 1`,
    { id: swept.row.id, code },
  );
  const prepared = found ? prepareVariant(swept, found.ordinal) : undefined;
  if (!found || !prepared) return '';
  if (!prepared.ok) return prepared.rejections[0]?.clause ?? '';
  const { angles, senses } = swept;
  const cell = Number(found.place) - 1;
  const angle = angles[cell % angles.length] ?? 0;
  const sense = senses[Math.floor(cell / angles.length)] ?? 'tension';
  const outcome = prepared.detail.outcome(toRadians(angle), sense);
  if (outcome.status !== 'not-permitted') return '';
  return outcome.rejections.find((rejection) => rejection.rule === rule)?.clause ?? '';
}

/** A parameter as legends name it; unknown to the kind, it goes by its name. */
export function nameParameter({ kind }: SweptRevision, name: string) {
  const { label = name, symbol = '', unit = '' } = kind.parameters.find((spec) => spec.name === name) ?? {};
  return { name, label, symbol, unit };
}

/** What the cells are laid out over, and their legend. */
export async function viewAxes(app: App, swept: SweptRevision): Promise<z.input<typeof resultAxesResponse>> {
  const { row, axes, angles, senses, summary, variants } = swept;
  return {
    revisionId: row.id,
    axes: axes.map(({ name, values }) => ({ ...nameParameter(swept, name), values: [...values] })),
    angles: [...angles],
    senses: [...senses],
    increment: summary.increment,
    variants,
    limitStates: [...limitStatesOf(swept)],
    rules: await rulesOf(app, swept),
    lowest: summary.lowest,
    highest: summary.highest,
    rejectedCells: row.rejectedCells ?? 0,
  };
}
