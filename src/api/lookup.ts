import { lookupDetailsResponse, lookupResponse, type lookupRequest } from '@shared/contracts/lookup.ts';
import type { z } from 'zod';
import { get, post } from './http.ts';

export const fetchLookupDetails = (signal?: AbortSignal) =>
  get(lookupDetailsResponse, '/api/lookup/details', signal ? { signal } : {}).then(({ details }) => details);

export const lookUp = (body: z.input<typeof lookupRequest>, signal?: AbortSignal) =>
  post(lookupResponse, '/api/lookup', signal ? { body, signal } : { body });
