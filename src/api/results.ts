import {
  curveResponse,
  resultAxesResponse,
  resultBlockResponse,
  sheetResponse,
} from '@shared/contracts/revisions.ts';
import type { Sense } from '@shared/engine/types.ts';
import { get } from './http.ts';

const options = (query: Record<string, string | number>, signal?: AbortSignal) =>
  signal ? { query, signal } : { query };

export const fetchAxes = (revisionId: number, signal?: AbortSignal) =>
  get(resultAxesResponse, `/api/revisions/${revisionId}/axes`, options({}, signal));

/** Whole variants in ordinal order, as flat columns. */
export const fetchCells = (revisionId: number, from: number, count: number, signal?: AbortSignal) =>
  get(resultBlockResponse, `/api/revisions/${revisionId}/cells`, options({ from, count }, signal));

const variant = (revisionId: number, ordinal: number) => `/api/revisions/${revisionId}/variants/${ordinal}`;

export const fetchCurve = (
  revisionId: number,
  ordinal: number,
  sense: Sense,
  step: number,
  signal?: AbortSignal,
) => get(curveResponse, `${variant(revisionId, ordinal)}/curve`, options({ sense, step }, signal));

export const fetchSheet = (
  revisionId: number,
  ordinal: number,
  sense: Sense,
  angle: number,
  signal?: AbortSignal,
) => get(sheetResponse, `${variant(revisionId, ordinal)}/sheet`, options({ sense, angle }, signal));
