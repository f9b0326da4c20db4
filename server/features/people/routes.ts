import { z } from 'zod';
import { createPersonRequest, personResponse, updatePersonRequest } from '@shared/contracts/auth.ts';
import { idParams } from '@shared/contracts/common.ts';
import { defineRoutes, route } from '../../http/route.ts';
import { presentPerson } from './presenter.ts';
import { createPerson, listPeople, updatePerson } from './service.ts';

export const routes = defineRoutes('people', [
  route({
    method: 'get',
    path: '/api/people',
    summary: 'Everyone who may sign in, or could once',
    who: ['admin'],
    response: z.object({ people: z.array(personResponse) }),
    handler: async ({ app }) => ({ people: (await listPeople(app)).map(presentPerson) }),
  }),
  route({
    method: 'post',
    path: '/api/people',
    summary: 'Add a person',
    who: ['admin'],
    body: createPersonRequest,
    response: personResponse,
    status: 201,
    handler: async ({ app, person, body, etag }) => {
      const created = await createPerson(app, person, body);
      etag(created.lockVersion);
      return presentPerson(created);
    },
  }),
  route({
    method: 'patch',
    path: '/api/people/:id',
    summary: 'Change name, role or state',
    who: ['admin'],
    params: idParams,
    body: updatePersonRequest,
    ifMatch: true,
    response: personResponse,
    handler: async ({ app, person, params, body, ifMatch, etag }) => {
      const changed = await updatePerson(app, person, params.id, ifMatch, body);
      etag(changed.lockVersion);
      return presentPerson(changed);
    },
  }),
]);
