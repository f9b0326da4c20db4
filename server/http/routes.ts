import { routes as sweeps } from '../features/sweeps/routes.ts';
import { routes as revisions } from '../features/revisions/routes.ts';
import { routes as families } from '../features/families/routes.ts';
import { routes as audit } from '../features/audit/routes.ts';
import { routes as auth } from '../features/auth/routes.ts';
import { routes as catalogue } from '../features/catalogue/routes.ts';
import { routes as verification } from '../features/verification/routes.ts';
import { routes as exported } from '../features/exports/routes.ts';
import { routes as health } from '../features/health/routes.ts';
import { routes as lookup } from '../features/lookup/routes.ts';
import { routes as people } from '../features/people/routes.ts';
import { routes as results } from '../features/results/routes.ts';
import { routes as settings } from '../features/settings/routes.ts';
import { documentationRoutes } from './documentation.ts';
import type { RouteDeclaration } from './route.ts';

/** Every route there is: Express, the OpenAPI document and the test of roles and routes read this list. */
export const allRoutes: readonly RouteDeclaration[] = [
  ...health,
  ...auth,
  ...people,
  ...settings,
  ...audit,
  ...catalogue,
  ...verification,
  ...results,
  ...lookup,
  ...exported,
  ...sweeps,
  ...revisions,
  ...families,
  ...documentationRoutes(() => allRoutes),
];
