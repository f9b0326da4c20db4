import { idParams } from '@shared/contracts/common.ts';
import {
  curveQuery,
  curveResponse,
  resultAxesResponse,
  resultBlockQuery,
  resultBlockResponse,
  sheetQuery,
  sheetResponse,
  variantParams,
} from '@shared/contracts/revisions.ts';
import { defineRoutes, route } from '../../http/route.ts';
import { viewAxes } from './axes-service.ts';
import { viewCells } from './cells-service.ts';
import { viewCurve } from './curve-service.ts';
import { viewSheet } from './sheet-service.ts';
import { sweptRevision } from './swept-revision.ts';

export const routes = defineRoutes('results', [
  route({
    method: 'get',
    path: '/api/revisions/:id/axes',
    summary: 'What the cells of a swept revision are laid out over, with their legend',
    who: 'signed-in',
    params: idParams,
    response: resultAxesResponse,
    handler: async ({ app, person, params }) => viewAxes(app, await sweptRevision(app, person, params.id)),
  }),
  route({
    method: 'get',
    path: '/api/revisions/:id/cells',
    summary: 'A block of whole variants with all their cells',
    who: 'signed-in',
    params: idParams,
    query: resultBlockQuery,
    response: resultBlockResponse,
    handler: async ({ app, person, params, query }) =>
      viewCells(app, await sweptRevision(app, person, params.id), query),
  }),
  route({
    method: 'get',
    path: '/api/revisions/:id/variants/:ordinal/curve',
    summary: 'Capacity over the load angle of one variant',
    who: 'signed-in',
    params: variantParams,
    query: curveQuery,
    response: curveResponse,
    handler: async ({ app, person, params, query }) =>
      viewCurve(app, await sweptRevision(app, person, params.id), params.ordinal, query),
  }),
  route({
    method: 'get',
    path: '/api/revisions/:id/variants/:ordinal/sheet',
    summary: 'The calculation of one cell, line by line',
    who: 'signed-in',
    params: variantParams,
    query: sheetQuery,
    response: sheetResponse,
    handler: async ({ app, person, params, query }) =>
      viewSheet(await sweptRevision(app, person, params.id), params.ordinal, query),
  }),
]);
