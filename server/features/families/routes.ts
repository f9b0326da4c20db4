import { idParams } from '@shared/contracts/common.ts';
import {
  createFamilyRequest,
  definitionCheckRequest,
  definitionCheckResponse,
  familyListResponse,
  familyResponse,
  updateFamilyRequest,
} from '@shared/contracts/families.ts';
import { defineRoutes, route } from '../../http/route.ts';
import { checkDefinition } from './definition-service.ts';
import { createFamily, listFamilies, startRevision, updateFamily, viewFamily } from './service.ts';

export const routes = defineRoutes('families', [
  route({
    method: 'get',
    path: '/api/families',
    summary: 'Detail families that you may see',
    who: 'signed-in',
    response: familyListResponse,
    handler: async ({ app, person }) => ({
      families: await listFamilies(app, person),
      can: { create: person.role === 'standards-manager' },
    }),
  }),
  route({
    method: 'post',
    path: '/api/families',
    summary: 'Define a family',
    who: ['standards-manager'],
    body: createFamilyRequest,
    response: familyResponse,
    status: 201,
    handler: async ({ app, person, body, etag }) => {
      const family = await createFamily(app, person, body);
      etag(family.lockVersion);
      return family;
    },
  }),
  route({
    method: 'get',
    path: '/api/families/:id',
    summary: 'A family with its revisions',
    who: 'signed-in',
    params: idParams,
    response: familyResponse,
    handler: async ({ app, person, params, etag }) => {
      const family = await viewFamily(app, person, params.id);
      etag(family.lockVersion);
      return family;
    },
  }),
  route({
    method: 'patch',
    path: '/api/families/:id',
    summary: 'Change code or title',
    who: ['standards-manager'],
    params: idParams,
    body: updateFamilyRequest,
    ifMatch: true,
    response: familyResponse,
    handler: async ({ app, person, params, body, ifMatch, etag }) => {
      const family = await updateFamily(app, person, params.id, ifMatch, body);
      etag(family.lockVersion);
      return family;
    },
  }),
  route({
    method: 'post',
    path: '/api/families/:id/revisions',
    summary: 'Start the next revision',
    who: ['standards-manager'],
    params: idParams,
    response: familyResponse,
    status: 201,
    handler: ({ app, person, params }) => startRevision(app, person, params.id),
  }),
  route({
    method: 'post',
    path: '/api/definitions/check',
    summary: 'Count a definition and list its faults',
    who: ['standards-manager'],
    body: definitionCheckRequest,
    response: definitionCheckResponse,
    handler: ({ body }) => {
      const { variantCount, cellCount, angles } = checkDefinition(body.definition).grid;
      return { variants: variantCount, angles: angles.length, cells: cellCount };
    },
  }),
]);
