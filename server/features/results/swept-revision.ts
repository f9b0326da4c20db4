import type { RevisionState } from '@shared/contracts/common.ts';
import { ENGINE_VERSION, findBasis, findKind } from '@shared/engine/index.ts';
import type { BasisInfo, DetailKind, ParameterValue, Rejection, Sense } from '@shared/engine/index.ts';
import {
  prepareVariant as prepare,
  variantValues,
  type SweepDefinition,
  type SweptAxis,
  type VariantFormulas,
  type VariantResult,
} from '@shared/engine/sweep/index.ts';
import { engineCatalogue } from '../../catalogue.ts';
import type { App } from '../../context.ts';
import type { FamilyRow } from '../../database/models/family.ts';
import type { ResultSummary, RevisionRow } from '../../database/models/revision.ts';
import { problem } from '../../http/problems.ts';
import type { SignedInPerson } from '../../http/route.ts';
import { formulasOf } from '../families/definition-service.ts';
import { definitionOf, visibleRevision } from '../revisions/service.ts';

/** A revision with results, and everything its cells are read with. */
export interface SweptRevision {
  readonly row: RevisionRow;
  readonly family: FamilyRow;
  readonly definition: SweepDefinition;
  readonly kind: DetailKind;
  readonly basis: BasisInfo;
  readonly axes: readonly SweptAxis[];
  readonly fixed: Readonly<Record<string, ParameterValue>>;
  /** What the definition's expressions say of a variant; null where it has none. */
  readonly formulas: VariantFormulas | null;
  readonly angles: readonly number[];
  readonly senses: readonly Sense[];
  readonly summary: ResultSummary;
  readonly variants: number;
  readonly engineVersion: string;
  /** Whether this program computes with the engine that the revision was swept with. */
  readonly current: boolean;
}

/**
 * A revision that has been swept, for a person who may see it.
 * @throws {ProblemError} not-found; state-conflict when it has no results yet
 */
export async function sweptRevision(
  app: App,
  person: Pick<SignedInPerson, 'role'>,
  id: number,
): Promise<SweptRevision> {
  const row = await visibleRevision(app, person, id);
  const family = await app.db.models.Family.findByPk(row.familyId);
  if (!family) throw new Error(`Revision ${id} has no family`);
  return withResults(row, family);
}

/** @throws {ProblemError} state-conflict when there are no results, or none that this program can read */
export function withResults(row: RevisionRow, family: FamilyRow): SweptRevision {
  const { resultSummary: summary, engineVersion, variantCount } = row;
  if (row.state === 'draft' || !summary || !engineVersion || variantCount === null) {
    return problem('state-conflict', { detail: 'It has not been swept: there are no results to read.' });
  }
  const definition = definitionOf(row) as SweepDefinition;
  const kind = findKind(definition.kind);
  const basis = findBasis(definition.basis);
  if (!kind || !basis) {
    const detail = `This version of Backmark has no ${kind ? definition.basis : definition.kind}; its results cannot be read here.`;
    return problem('state-conflict', { detail });
  }
  const fixed = Object.entries(definition.parameters).flatMap(([name, setting]) =>
    setting.mode === 'fixed' ? [[name, setting.value] as const] : [],
  );
  return {
    row,
    family,
    definition,
    kind,
    basis,
    axes: summary.axes as readonly SweptAxis[],
    fixed: Object.fromEntries(fixed),
    formulas: formulasOf(definition, kind),
    angles: summary.angles,
    senses: summary.senses as readonly Sense[],
    summary,
    variants: variantCount,
    engineVersion,
    current: engineVersion === ENGINE_VERSION,
  };
}

/** What a derived parameter follows from; null for every other. */
export function expressionOf({ definition }: SweptRevision, name: string): string | null {
  const setting = Object.hasOwn(definition.parameters, name) ? definition.parameters[name] : undefined;
  return setting?.mode === 'derived' ? setting.expression : null;
}

/** A variant worked out anew from the frozen definition, or why it cannot be. */
export function prepareVariant(
  { axes, fixed, formulas, kind, definition }: SweptRevision,
  ordinal: number,
): VariantResult {
  const given = variantValues({ axes, fixed }, ordinal);
  return prepare(definition, kind, formulas, engineCatalogue(), given);
}

/** What stands in place of a capacity where a variant cannot be prepared at any angle. */
export function outcomeWithout({
  rejections,
  faults,
}: Extract<VariantResult, { ok: false }>):
  { status: 'not-permitted'; rejections: Rejection[] } | { status: 'not-covered'; reason: string } {
  if (faults.length === 0) return { status: 'not-permitted', rejections: [...rejections] };
  const reason = faults.map(({ field, message }) => `${field}: ${message}`).join('; ');
  return { status: 'not-covered', reason };
}

/**
 * The place of a sense among those swept.
 * @throws {ProblemError} validation
 */
export function placeOfSense({ senses }: SweptRevision, sense: Sense): number {
  const place = senses.indexOf(sense);
  if (place >= 0) return place;
  const message = `The revision was swept for ${senses.join(' and ')} only.`;
  return problem('validation', { errors: [{ field: 'sense', message, value: sense }] });
}

/** @throws {ProblemError} not-found when the revision has no such variant */
export function existingVariant({ variants }: SweptRevision, ordinal: number): void {
  if (ordinal >= variants) problem('not-found', { detail: `It has ${variants} variants, counted from 0.` });
}

/** What must be said first wherever something is computed anew with another engine than it was published with. */
export const engineNote = ({ engineVersion, row }: SweptRevision): string =>
  `Worked out with engine ${ENGINE_VERSION}; revision ${row.letter ?? '(without a letter)'} was swept with engine ${engineVersion}, and its stored values stand.`;

const LOUD: Partial<Record<RevisionState, string>> = {
  superseded: 'SUPERSEDED: not for new work',
  withdrawn: 'WITHDRAWN: not to be used',
};

/** What is printed large over the values of a revision that is no longer in force. */
export const warningOf = (state: RevisionState): string | null => LOUD[state] ?? null;
