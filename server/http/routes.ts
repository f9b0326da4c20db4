import type { RouteDeclaration } from './route.ts';

/** Every route there is: Express, the OpenAPI document and the test of roles and routes read this list. */
export const allRoutes: readonly RouteDeclaration[] = [];
