import type { Sheet } from '@shared/contracts/revisions.ts';
import { ENGINE_VERSION, kilonewtons, toRadians } from '@shared/engine/index.ts';
import type {
  ParameterSpec,
  ParameterValues,
  PreparedDetail,
  Sense,
  SheetSection,
} from '@shared/engine/index.ts';
import { roundDown } from '@shared/engine/sweep/index.ts';
import { CAUTIONS } from '@shared/wording/cautions.ts';
import {
  engineNote,
  expressionOf,
  existingVariant,
  outcomeWithout,
  placeOfSense,
  prepareVariant,
  warningOf,
  type SweptRevision,
} from './swept-revision.ts';

/** The section of a record that holds its notes. */
const NOTES = 'notes';

/** Whether a parameter counts for this basis beside the other values. */
function applies({ when, bases }: ParameterSpec, values: ParameterValues, swept: SweptRevision): boolean {
  if (bases && !bases.includes(swept.basis.id)) return false;
  return !when || when.is.includes(String(values[when.parameter]));
}

/** Every parameter that counts for a variant, in the order of the kind's schema, left-out ones at their defaults. */
export function parametersOf(swept: SweptRevision, given: ParameterValues): Sheet['parameters'] {
  const defaults = Object.fromEntries(swept.kind.parameters.map((spec) => [spec.name, spec.default]));
  const values: ParameterValues = { ...defaults, ...given };
  return swept.kind.parameters
    .filter((spec) => applies(spec, values, swept))
    .map(({ name, label, symbol, unit, group }) => {
      const expression = expressionOf(swept, name);
      // The default stands for a parameter that was left out, never for one that could not be derived.
      const without = expression !== null && given[name] === undefined;
      const read = without ? { unit: '', value: 'no usable value' } : { unit, value: values[name] };
      return { name, label, symbol, group, ...read, expression };
    });
}

const noted = (text: string, clause: string): string => (clause ? `${text} (${clause})` : text);

/** The notes that hold for a variant: what its record says, or those of kind and basis where there is none. */
export function notesOf(swept: SweptRevision, sections: readonly SheetSection[] = []): string[] {
  const recorded = sections.find(({ id }) => id === NOTES)?.lines.map((l) => noted(l.meaning, l.clause));
  const general = [...swept.kind.notes, ...swept.basis.notes.map(({ text, clause }) => noted(text, clause))];
  return [...(swept.current ? [] : [engineNote(swept)]), ...(recorded ?? general)];
}

/** Cautions, after the warning of a revision that is no longer in force. */
export function cautionsOf({ row }: SweptRevision): string[] {
  const warning = warningOf(row.state);
  return [...(warning ? [`${warning}.`] : []), ...CAUTIONS];
}

function outcomeOf(detail: PreparedDetail, theta: number, sense: Sense, increment: number): Sheet['outcome'] {
  const outcome = detail.outcome(theta, sense);
  if (outcome.status === 'not-covered') return outcome;
  if (outcome.status === 'not-permitted') return { ...outcome, rejections: [...outcome.rejections] };
  return {
    status: 'capacity',
    capacity: kilonewtons(outcome.capacity),
    rounded: roundDown(outcome.capacity, increment),
    governing: detail.limitStates[outcome.governing]?.id ?? '',
  };
}

/** The record's sections; a limit state's own carries its code and capacity in kN. */
function sectionsOf(detail: PreparedDetail, theta: number, sense: Sense, recorded: readonly SheetSection[]) {
  const out = new Float64Array(detail.limitStates.length);
  const permitted = detail.at(theta, sense, out) >= 0;
  return recorded
    .filter(({ id }) => id !== NOTES)
    .map(({ id, title, lines }) => {
      const index = detail.limitStates.findIndex((state) => state.id === id);
      const state = detail.limitStates[index];
      const capacity = state && permitted && Number.isFinite(out[index]) ? kilonewtons(out[index]!) : null;
      return { id, title: state?.title ?? title, code: state?.code ?? null, capacity, lines };
    });
}

/**
 * The whole calculation of one cell, at any load angle (degrees), worked out anew with this engine.
 * @throws {ProblemError} not-found, validation
 */
export function viewSheet(
  swept: SweptRevision,
  ordinal: number,
  { sense, angle }: { sense: Sense; angle: number },
): Sheet {
  existingVariant(swept, ordinal);
  placeOfSense(swept, sense);
  const { row, family, basis, summary } = swept;
  const prepared = prepareVariant(swept, ordinal);
  const theta = toRadians(angle);
  const recorded = prepared.ok ? prepared.detail.record(theta, sense) : [];
  return {
    family: { code: family.code, title: family.title },
    revision: {
      id: row.id,
      letter: row.letter,
      state: row.state,
      shortHash: row.contentHash?.slice(0, 12) ?? null,
    },
    basis: { id: basis.id, title: basis.title, resultLabel: basis.resultLabel },
    engineVersion: ENGINE_VERSION,
    angle,
    sense,
    parameters: parametersOf(swept, prepared.values),
    outcome: prepared.ok
      ? outcomeOf(prepared.detail, theta, sense, summary.increment)
      : outcomeWithout(prepared),
    sections: prepared.ok ? sectionsOf(prepared.detail, theta, sense, recorded) : [],
    notes: notesOf(swept, recorded),
    cautions: cautionsOf(swept),
  };
}
