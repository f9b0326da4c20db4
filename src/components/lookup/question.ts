import type { LookupDetails, lookupRequest } from '@shared/contracts/lookup.ts';
import type { Sense } from '@shared/engine/types.ts';
import type { LocationQuery, LocationQueryRaw } from 'vue-router';
import type { z } from 'zod';
import { numberOf } from '../../composables/number-text.ts';

export type LookUpDetail = LookupDetails['details'][number];
export type LookUpRequest = z.input<typeof lookupRequest>;

/** What is asked, as it stands in the address of the page. */
export interface Question {
  /** Code of the family; empty while none is chosen. */
  readonly code: string;
  /** Degrees. */
  readonly angle: number;
  readonly sense: Sense;
  /** kN; null when no load is given. */
  readonly load: number | null;
  /** Of each swept parameter, the place of the chosen value. */
  readonly places: Readonly<Record<string, number>>;
}

const text = (value: LocationQuery[string] | undefined) => (typeof value === 'string' ? value : '');

/** Reads an address; what cannot be read is the usual. */
export function readQuestion(query: LocationQuery): Question {
  const places = text(query.sizes)
    .split(',')
    .flatMap((pair) => {
      const [, name = '', place] = /^(\w+):(\d{1,4})$/.exec(pair) ?? [];
      return place === undefined ? [] : [[name, Number(place)] as const];
    });
  const load = numberOf(text(query.load));
  return {
    code: text(query.detail),
    angle: numberOf(text(query.angle)) ?? 0,
    sense: query.sense === 'compression' ? 'compression' : 'tension',
    load: load !== undefined && load > 0 ? load : null,
    places: Object.fromEntries(places),
  };
}

export function writeQuestion({ code, angle, sense, load, places }: Question): LocationQueryRaw {
  const sizes = Object.entries(places).map(([name, place]) => `${name}:${place}`);
  return {
    ...(code ? { detail: code } : {}),
    angle: String(angle),
    sense,
    ...(load === null ? {} : { load: String(load) }),
    ...(sizes.length ? { sizes: sizes.join(',') } : {}),
  };
}

/** A question that the detail can answer: its own senses, its own sizes, each with a value. */
export function fittingQuestion(question: Question, detail: LookUpDetail): Question {
  const places = Object.fromEntries(
    detail.choices.map(({ name, values }) => [
      name,
      Math.min(Math.max(0, question.places[name] ?? 0), values.length - 1),
    ]),
  );
  const sense = detail.senses.includes(question.sense) ? question.sense : (detail.senses[0] ?? 'tension');
  return { ...question, code: detail.code, sense, places };
}

/** What is wrong with the typed angle, in words; null when nothing is. */
export function angleFault(angle: number, { angleMinimum, angleMaximum }: LookUpDetail): string | null {
  if (Number.isNaN(angle)) return 'A number of degrees.';
  if (angle >= angleMinimum && angle <= angleMaximum) return null;
  return `From ${angleMinimum}° to ${angleMaximum}°, from the normal of the face.`.replaceAll('-', '−');
}

/** The request for a fitting question, or null where the angle cannot be asked for. */
export function requestOf(question: Question, detail: LookUpDetail): LookUpRequest | null {
  if (angleFault(question.angle, detail)) return null;
  const choices = Object.fromEntries(
    detail.choices.flatMap(({ name, values }) => {
      const value = values[question.places[name] ?? 0];
      return value === undefined ? [] : [[name, value] as const];
    }),
  );
  const load = question.load === null ? {} : { load: question.load };
  return { revisionId: detail.revisionId, choices, angle: question.angle, sense: question.sense, ...load };
}
