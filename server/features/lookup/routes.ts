import { lookupDetailsResponse, lookupRequest, lookupResponse } from '@shared/contracts/lookup.ts';
import { defineRoutes, route } from '../../http/route.ts';
import { listDetails } from './details-service.ts';
import { lookUp } from './service.ts';

export const routes = defineRoutes('lookup', [
  route({
    method: 'get',
    path: '/api/lookup/details',
    summary: 'The details in force, with what is chosen of each',
    who: 'signed-in',
    response: lookupDetailsResponse,
    handler: async ({ app }) => ({ details: await listDetails(app) }),
  }),
  route({
    method: 'post',
    path: '/api/lookup',
    summary: 'The capacity of one detail at any load angle, and whether it carries a load',
    who: 'signed-in',
    body: lookupRequest,
    response: lookupResponse,
    handler: ({ app, person, body }) => lookUp(app, person, body),
  }),
]);
