import { z } from 'zod';
import { describeRoutes } from './openapi.ts';
import { defineRoutes, route, type RouteDeclaration } from './route.ts';

/** The route that describes all routes. */
export const documentationRoutes = (list: () => readonly RouteDeclaration[]): readonly RouteDeclaration[] =>
  defineRoutes('documentation', [
    route({
      method: 'get',
      path: '/api/openapi.json',
      summary: 'This API as an OpenAPI 3.1 document',
      who: 'public',
      response: z.record(z.string(), z.unknown()),
      handler: () => describeRoutes(list()),
    }),
  ]);
