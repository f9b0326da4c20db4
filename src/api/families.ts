import type { Definition } from '@shared/contracts/definition.ts';
import {
  definitionCheckResponse,
  familyListResponse,
  familyResponse,
  type createFamilyRequest,
  type updateFamilyRequest,
} from '@shared/contracts/families.ts';
import { revisionResponse } from '@shared/contracts/revisions.ts';
import type { z } from 'zod';
import { get, post, request } from './http.ts';

export const fetchFamilies = (signal?: AbortSignal) =>
  get(familyListResponse, '/api/families', { ...(signal ? { signal } : {}) });

export const fetchFamily = (id: number, signal?: AbortSignal) =>
  get(familyResponse, `/api/families/${id}`, { ...(signal ? { signal } : {}) });

export const createFamily = (body: z.input<typeof createFamilyRequest>) =>
  post(familyResponse, '/api/families', { body });

export const updateFamily = (id: number, lockVersion: number, body: z.input<typeof updateFamilyRequest>) =>
  request(familyResponse, 'PATCH', `/api/families/${id}`, { body, lockVersion });

/** Starts the next working revision from the definition of the one in force. */
export const startRevision = (familyId: number) =>
  post(revisionResponse, `/api/families/${familyId}/revisions`);

/** Counts and every fault of a definition, before it is saved. */
export const checkDefinition = (definition: Definition, signal?: AbortSignal) =>
  post(definitionCheckResponse, '/api/definitions/check', {
    body: { definition },
    ...(signal ? { signal } : {}),
  });
