import {
  demoPeopleResponse,
  meResponse,
  type changePasswordRequest,
  type signInRequest,
} from '@shared/contracts/auth.ts';
import type { z } from 'zod';
import { call, get } from './http.ts';
import { ProblemError } from './problem.ts';

export async function signIn(body: z.input<typeof signInRequest>): Promise<void> {
  await call('POST', '/api/auth/sign-in', { body });
}

export async function signOut(): Promise<void> {
  await call('POST', '/api/auth/sign-out');
}

export const fetchMe = () => get(meResponse, '/api/auth/me');

export async function changePassword(body: z.input<typeof changePasswordRequest>): Promise<void> {
  await call('POST', '/api/auth/password', { body });
}

export type DemoPerson = z.output<typeof demoPeopleResponse>['people'][number];

/** The invented people, in demo mode; nobody otherwise. */
export async function fetchDemoPeople(): Promise<readonly DemoPerson[]> {
  try {
    return (await get(demoPeopleResponse, '/api/auth/demo-people')).people;
  } catch (error) {
    if (error instanceof ProblemError && error.status === 404) return [];
    throw error;
  }
}
