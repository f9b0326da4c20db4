import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import request from 'supertest';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { createApp } from '@server/app.ts';
import { loadConfig } from '@server/config/config.ts';
import { createContext, type App } from '@server/context.ts';
import { allRoutes } from '@server/http/routes.ts';

const folder = mkdtempSync(join(tmpdir(), 'backmark-client-'));
const page = '<!doctype html><title>Backmark</title>';
let app: App;
let server: ReturnType<typeof createApp>;

const appWith = (client: string, environment: Record<string, string> = {}) => {
  const settings = {
    DATABASE_URL: 'mariadb://a:b@127.0.0.1:1/none',
    AUTH_SECRET: 'x'.repeat(32),
    LOG_LEVEL: 'silent',
  };
  app = createContext(loadConfig({ ...settings, ...environment }));
  return createApp(app, allRoutes, client);
};

beforeAll(() => {
  mkdirSync(join(folder, 'client/assets'), { recursive: true });
  writeFileSync(join(folder, 'client/index.html'), page);
  writeFileSync(join(folder, 'client/assets/index-3f2a.js'), 'export {};');
  writeFileSync(join(folder, 'client/.hidden'), 'canary');
  writeFileSync(join(folder, 'secret.txt'), 'canary');
  server = appWith(join(folder, 'client'));
});
afterAll(async () => {
  await app.db.close();
  rmSync(folder, { recursive: true });
});

test.each(['/', '/families', '/families/3/revisions/7', '/sign-in?next=%2F', '/.hidden'])(
  '%s is the page, asked for anew each time',
  async (path) => {
    const { text, headers } = await request(server).get(path).expect(200).expect('Cache-Control', 'no-cache');
    expect(text).toBe(page);
    expect(headers['content-security-policy']).toContain("script-src 'self';");
  },
);

test('a hashed asset may be kept for ever, a missing one is not the page', async () => {
  await request(server)
    .get('/assets/index-3f2a.js')
    .expect(200)
    .expect('Content-Type', /javascript/)
    .expect('Cache-Control', 'public, max-age=31536000, immutable');
  await request(server).get('/assets/index-0000.js').expect(404).expect('Cache-Control', 'no-store');
});

test.each([
  '/..%2fsecret.txt',
  '/assets/..%2f..%2f..%2fsecret.txt',
  '/%2e%2e/secret.txt',
  '/..%5csecret.txt',
  '/%00',
])('%s does not lead out of the folder', async (path) => {
  const { text } = await request(server).get(path);
  expect(text).not.toContain('canary');
});

test('a page takes no changes, and an unknown API address is no page', async () => {
  await request(server).post('/families').expect(405).expect('Allow', 'GET, HEAD');
  await request(server)
    .get('/api/families/none/at/all')
    .expect(404)
    .expect('Content-Type', /problem\+json/);
});

test('without a built client the API is served all the same', async () => {
  const bare = appWith(join(folder, 'nothing'));
  await request(bare).get('/').expect(404);
  await request(bare).get('/api/health').expect(200);
});

test('behind https the browser is told to stay there, and cookies have the stricter name', async () => {
  const secure = appWith(join(folder, 'client'), { PUBLIC_URL: 'https://backmark.example' });
  const { headers } = await request(secure).get('/');
  expect(headers['strict-transport-security']).toBe('max-age=31536000; includeSubDomains');
  expect(headers['content-security-policy']).toContain('upgrade-insecure-requests');
  const out = await request(secure)
    .post('/api/auth/sign-out')
    .set('Origin', 'https://backmark.example')
    .expect(204);
  const cookies = out.headers['set-cookie'] as unknown as string[];
  expect(cookies.map((cookie) => cookie.split('=')[0])).toEqual([
    '__Host-backmark_access',
    '__Host-backmark_refresh',
  ]);
  for (const cookie of cookies) expect(cookie).toMatch(/Path=\/; .*HttpOnly; Secure; SameSite=Lax/);
});

test('more requests than allowed are told to wait', async () => {
  const limited = appWith(join(folder, 'client'), { RATE_LIMIT_PER_MINUTE: '3' });
  for (let n = 0; n < 3; n += 1) await request(limited).get('/api/health').expect(200);
  const { body } = await request(limited).get('/api/health').expect(429).expect('Retry-After', /\d+/);
  expect(body).toMatchObject({ code: 'rate-limited' });
  await request(limited).get('/').expect(200);
});
