import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { z } from 'zod';
import type { Role } from '@shared/contracts/common.ts';
import { defineRoutes, route, type RouteDeclaration } from '@server/http/route.ts';
import { allRoutes } from '@server/http/routes.ts';
import { createHarness, roles, type Agent, type Harness } from './harness.ts';

/*
 * Who may call what, written down a second time and by hand: S standards manager, E engineer, D drafter, A admin,
 * * anybody. A route that is not in this list fails, and so does a line without a route.
 */
const matrix: Record<string, string> = {
  'get /api/health': '*',
  'get /api/ready': '*',
  'get /api/openapi.json': '*',
  'post /api/auth/sign-in': '*',
  'post /api/auth/refresh': '*',
  'post /api/auth/sign-out': '*',
  'get /api/auth/demo-people': '*',
  'get /api/auth/me': 'SEDA',
  'post /api/auth/password': 'SEDA',
  'get /api/people': 'A',
  'post /api/people': 'A',
  'patch /api/people/:id': 'A',
  'get /api/settings': 'SEDA',
  'put /api/settings': 'A',
  'get /api/audit': 'A',
  'get /api/audit/verification': 'A',
  'get /api/catalogue': 'SEDA',
  'get /api/verification': 'SEDA',
  'get /api/families': 'SEDA',
  'post /api/families': 'S',
  'get /api/families/:id': 'SEDA',
  'patch /api/families/:id': 'S',
  'post /api/families/:id/revisions': 'S',
  'post /api/definitions/check': 'S',
  'get /api/revisions/:id': 'SEDA',
  'get /api/revisions/:id/saves': 'S',
  'put /api/revisions/:id/definition': 'S',
  'post /api/revisions/:id/sweep': 'S',
  'post /api/revisions/:id/submit': 'S',
  'post /api/revisions/:id/sign': 'SE',
  'post /api/revisions/:id/return': 'SE',
  'post /api/revisions/:id/publish': 'S',
  'post /api/revisions/:id/lock': 'A',
  'post /api/revisions/:id/withdraw': 'S',
  'get /api/sweeps': 'SA',
  'get /api/sweeps/:id': 'SA',
  'get /api/sweeps/:id/events': 'SA',
  'post /api/sweeps/:id/cancel': 'S',
  'get /api/revisions/:id/axes': 'SEDA',
  'get /api/revisions/:id/cells': 'SEDA',
  'get /api/revisions/:id/variants/:ordinal/curve': 'SEDA',
  'get /api/revisions/:id/variants/:ordinal/sheet': 'SEDA',
  'get /api/lookup/details': 'SEDA',
  'post /api/lookup': 'SEDA',
  'post /api/exports': 'SED',
  'get /api/exports': 'SEDA',
};
const letters: Record<Role, string> = { 'standards-manager': 'S', engineer: 'E', drafter: 'D', admin: 'A' };

let harness: Harness;
const agents = new Map<Role, Agent>();

beforeAll(async () => {
  harness = await createHarness();
  for (const role of roles) agents.set(role, await harness.signedIn(role));
});
afterAll(() => harness.close());

const nameOf = ({ method, path }: RouteDeclaration) => `${method} ${path}`;
const find = (name: string) => allRoutes.find((declared) => nameOf(declared) === name);

/** Nothing has this id, so that whoever may call gets 404, 422 or an empty list, and nothing changes. */
function call(agent: Agent, declared: RouteDeclaration) {
  const path = declared.path.replace(':ordinal', '0').replace(/:\w+/g, '999999');
  const request = agent[declared.method](path).set('If-Match', '"0"');
  return declared.body ? request.send({}) : request;
}

test('every route stands in the matrix, and every line has a route', () => {
  expect(allRoutes.map(nameOf).sort()).toEqual(Object.keys(matrix).sort());
});

test('no two routes are the same, and every one says what it is', () => {
  expect(new Set(allRoutes.map(nameOf)).size).toBe(allRoutes.length);
  for (const { summary, path } of allRoutes) {
    expect(summary.length, path).toBeGreaterThan(8);
    expect(path).toMatch(/^\/api\/[a-z/:.-]+$/);
  }
});

/** Lines without a route are told by the first test alone. */
const lines = Object.entries(matrix).filter(([name]) => find(name));

describe.each(lines)('%s', (name, allowed) => {
  test('somebody who has not signed in', async () => {
    const { status, body } = await call(harness.stranger(), find(name)!);
    if (allowed !== '*')
      expect({ status, body }).toMatchObject({ status: 401, body: { code: 'unauthenticated' } });
    else if (!name.endsWith('/refresh')) expect([200, 204, 404, 422]).toContain(status);
  });

  test.each(roles)('%s', async (role) => {
    // Signing out would end the session that the other lines need.
    const agent = name.endsWith('/sign-out') ? await harness.signedIn(role) : agents.get(role)!;
    const { status, body } = await call(agent, find(name)!);
    if (allowed === '*' || allowed.includes(letters[role])) {
      expect([200, 204, 404, 409, 412, 422], JSON.stringify(body)).toContain(status);
    } else {
      expect({ status, body }).toMatchObject({ status: 403, body: { code: 'forbidden' } });
    }
  });
});

test.each(lines.filter(([name]) => !name.startsWith('get')))(
  '%s is refused from another site',
  async (name) => {
    for (const agent of [harness.stranger(), agents.get('admin')!, agents.get('standards-manager')!]) {
      const { status, body } = await call(agent, find(name)!).set('Sec-Fetch-Site', 'cross-site');
      expect({ status, body }).toMatchObject({ status: 403, body: { code: 'cross-site' } });
    }
  },
);

test('a route that does not say who may call it is closed to everybody', async () => {
  const open = defineRoutes('trial', [
    route({
      method: 'get',
      path: '/api/trial',
      summary: 'Forgot to say',
      who: undefined as unknown as 'signed-in',
      response: z.object({ a: z.number() }),
      handler: () => ({ a: 1 }),
    }),
  ]);
  const closed = await createHarness({}, [...allRoutes, ...open]);
  await closed.stranger().get('/api/trial').expect(401);
  for (const role of roles) await (await closed.signedIn(role)).get('/api/trial').expect(403);
  await closed.close();
});

test('reading changes nothing', async () => {
  const tables = [
    'people',
    'settings',
    'audit',
    'families',
    'revisions',
    'variants',
    'jobs',
    'exports',
    'sessions',
  ];
  const sums = () => harness.db.select(`CHECKSUM TABLE ${tables.join(', ')}`);
  const before = await sums();
  for (const declared of allRoutes.filter(({ method }) => method === 'get')) {
    for (const agent of agents.values()) await call(agent, declared);
  }
  expect(await sums()).toEqual(before);
});
