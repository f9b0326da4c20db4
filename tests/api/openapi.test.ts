import { afterAll, beforeAll, expect, test } from 'vitest';
import { allRoutes } from '@server/http/routes.ts';
import { createHarness, type Harness } from './harness.ts';

interface Operation {
  parameters: { name: string; in: string; required: boolean }[];
  requestBody?: {
    content: Record<string, { schema: { properties: Record<string, unknown>; required: string[] } }>;
  };
  responses: Record<string, unknown>;
  security?: unknown;
}
interface Document {
  openapi: string;
  paths: Record<string, Record<string, Operation>>;
  components: { responses: Record<string, { description: string }> };
}

let harness: Harness;
let document: Document;

beforeAll(async () => {
  harness = await createHarness();
  document = (await harness.stranger().get('/api/openapi.json').expect(200)).body as Document;
});
afterAll(() => harness.close());

test('the document describes every route and no other', () => {
  expect(document.openapi).toBe('3.1.0');
  const described = Object.entries(document.paths).flatMap(([path, operations]) =>
    Object.keys(operations).map((method) => `${method} ${path}`),
  );
  const declared = allRoutes.map(({ method, path }) => `${method} ${path.replace(/:(\w+)/g, '{$1}')}`);
  expect(described.sort()).toEqual(declared.sort());
});

test('it tells fields, versions and who may', () => {
  const change = document.paths['/api/people/{id}']?.patch;
  expect(change?.parameters.map(({ name, in: place, required }) => [name, place, required])).toEqual([
    ['id', 'path', true],
    ['If-Match', 'header', true],
  ]);
  expect(change?.security).toEqual([{ session: [] }]);
  const create = document.paths['/api/people']?.post?.requestBody?.content['application/json']?.schema;
  expect(create?.required).toEqual(['name', 'email', 'role', 'password']);
  expect(document.paths['/api/auth/sign-in']?.post?.security).toBeUndefined();
  expect(document.components.responses.Problem?.description).toContain('stale-version (412)');
});
