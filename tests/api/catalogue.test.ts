import { afterAll, beforeAll, expect, test } from 'vitest';
import type { EngineCatalogue } from '@shared/engine/index.ts';
import { engineCatalogue } from '@server/catalogue.ts';
import { createHarness, type Harness } from './harness.ts';

let harness: Harness;

beforeAll(async () => {
  harness = await createHarness();
});
afterAll(() => harness.close());

test('the catalogue arrives whole, as the engine takes it', async () => {
  const drafter = await harness.signedIn('drafter');
  const { body, headers } = await drafter.get('/api/catalogue').expect(200);
  expect(body).toEqual(JSON.parse(JSON.stringify(engineCatalogue())));
  // ISO 261 coarse thread M20: nominal tensile stress area 245 mm2 (ISO 898-1, from memory).
  const m20 = (body as EngineCatalogue).boltSizes.find(({ name }) => name === 'M20');
  expect(m20).toMatchObject({ d: 20, stressArea: 245 });
  expect(headers['cache-control']).toBe('private, no-cache');
});

test('what the browser has already is not sent again', async () => {
  const engineer = await harness.signedIn('engineer');
  const first = await engineer.get('/api/catalogue').expect(200);
  const etag = first.headers.etag as string;
  expect(etag).toMatch(/^"[0-9a-f]{64}"$/);
  const again = await engineer.get('/api/catalogue').set('If-None-Match', etag).expect(304);
  expect(again.text).toBe('');
  await engineer.get('/api/catalogue').set('If-None-Match', '"another"').expect(200);
});
