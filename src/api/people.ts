import {
  personResponse,
  type createPersonRequest,
  type Person,
  type updatePersonRequest,
} from '@shared/contracts/auth.ts';
import { z } from 'zod';
import { get, post, request } from './http.ts';

const personListResponse = z.object({ people: z.array(personResponse) });

export const fetchPeople = () => get(personListResponse, '/api/people').then(({ people }) => people);

export const createPerson = (body: z.input<typeof createPersonRequest>) =>
  post(personResponse, '/api/people', { body });

export const updatePerson = (person: Person, body: z.input<typeof updatePersonRequest>) =>
  request(personResponse, 'PATCH', `/api/people/${person.id}`, { body, lockVersion: person.lockVersion });
