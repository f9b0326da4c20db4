import { idParams, type Role } from '@shared/contracts/common.ts';
import { sweepListResponse, sweepResponse } from '@shared/contracts/revisions.ts';
import { defineRoutes, route } from '../../http/route.ts';
import { streamSweep } from './events.ts';
import { cancelSweep, listSweeps, startSweep, viewSweep } from './service.ts';

const readers: readonly Role[] = ['standards-manager', 'admin'];

export const routes = defineRoutes('sweeps', [
  route({
    method: 'post',
    path: '/api/revisions/:id/sweep',
    summary: 'Sweep the draft',
    who: ['standards-manager'],
    params: idParams,
    ifMatch: true,
    response: sweepResponse,
    status: 202,
    handler: ({ app, person, params, ifMatch }) => startSweep(app, person, params.id, ifMatch),
  }),
  route({
    method: 'get',
    path: '/api/sweeps',
    summary: 'The latest sweeps',
    who: readers,
    response: sweepListResponse,
    handler: async ({ app, person }) => ({ sweeps: await listSweeps(app, person) }),
  }),
  route({
    method: 'get',
    path: '/api/sweeps/:id',
    summary: 'A sweep and how far it is',
    who: readers,
    params: idParams,
    response: sweepResponse,
    handler: ({ app, person, params }) => viewSweep(app, person, params.id),
  }),
  route({
    method: 'get',
    path: '/api/sweeps/:id/events',
    summary: 'Progress of a sweep as server-sent events',
    who: readers,
    params: idParams,
    response: 'stream',
    handler: ({ app, person, params, res }) => streamSweep(app, person, params.id, res),
  }),
  route({
    method: 'post',
    path: '/api/sweeps/:id/cancel',
    summary: 'Stop a sweep',
    who: ['standards-manager'],
    params: idParams,
    response: sweepResponse,
    handler: ({ app, person, params }) => cancelSweep(app, person, params.id),
  }),
]);
