import { flushPromises } from '@vue/test-utils';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import LookUpView from '../../src/views/LookUpView.vue';
import { mountInApp } from '../support/client/mount.ts';
import { fieldLabelled, messages } from './queries.ts';

// The document of the tests has no canvas to draw on.
vi.mock('../../src/components/charts/CapacityChart.vue', () => ({
  __esModule: true,
  default: { render: () => null },
}));

const details = [
  {
    familyId: 1,
    code: 'GP-01',
    title: 'Light bracing gussets',
    revisionId: 11,
    letter: 'B',
    state: 'published',
    shortHash: 'a41c07f3d29b',
    basis: 'sans-10162-1-2011',
    senses: ['tension', 'compression'],
    angleMinimum: -80,
    angleMaximum: 80,
    choices: [],
    fixed: [],
    derived: [],
  },
];
const governing = { id: 'bolt-shear', code: 'BS', title: 'Bolt shear', part: 'bolt', clause: '13.12.1.1' };
const capacity = (load: number | undefined) => ({
  status: 'capacity',
  capacity: 340,
  unrounded: 340.09,
  governing,
  utilisation: load ? load / 340 : null,
  adequate: load ? load <= 340 : null,
});
const answer = (outcome: unknown, angle: number) => ({
  family: { id: 1, code: 'GP-01', title: 'Light bracing gussets' },
  revision: {
    id: 11,
    letter: 'B',
    state: 'published',
    contentHash: 'a41c07f3d29b00',
    shortHash: 'a41c07f3d29b',
    publishedAt: '2026-11-20T10:00:00Z',
    engineVersion: '1.0.0',
  },
  basis: { id: 'sans-10162-1-2011', title: 'SANS 10162-1:2011', resultLabel: 'Factored resistance' },
  ordinal: 0,
  angle,
  sense: 'tension',
  outcome,
  curve: { angles: [-30, 0, 30], capacity: [300, 340, 300], governing: [0, 0, 0] },
  legend: [governing],
  notes: [],
  cautions: ['Read the cautions.'],
});

const json = (status: number, body: unknown) => new Response(JSON.stringify(body), { status });
const asked: { angle: number; load?: number; signal: AbortSignal | null | undefined }[] = [];
let outcomeOf: (load?: number) => unknown;
let listed: unknown[];

beforeEach(() => {
  vi.useFakeTimers({ toFake: ['setTimeout', 'clearTimeout'] });
  asked.length = 0;
  listed = details;
  outcomeOf = capacity;
  vi.stubGlobal(
    'fetch',
    vi.fn<typeof fetch>((address, options) => {
      if (address === '/api/lookup/details') return Promise.resolve(json(200, { details: listed }));
      const body = JSON.parse(String(options?.body)) as { angle: number; load?: number };
      asked.push({ ...body, signal: options?.signal });
      return Promise.resolve(json(200, answer(outcomeOf(body.load), body.angle)));
    }),
  );
});
afterEach(() => vi.useRealTimers());

const rest = async () => {
  await vi.advanceTimersByTimeAsync(400);
  await flushPromises();
};
const routes = ['results', 'sheet', 'families'].map((name) => ({
  path: `/${name}/:id?/:ordinal?`,
  name,
  component: { render: () => null },
}));
async function openAt(query: string): Promise<void> {
  await mountInApp(LookUpView, { at: `/look-up?${query}`, routes });
  await flushPromises();
  await rest();
}
const panel = (name: string) => document.querySelector(`section[aria-label="${name}"]`)?.textContent ?? '';

describe('looking a capacity up', () => {
  it('answers with kN, the governing limit state and its clause, the revision and its hash', async () => {
    await openAt('detail=GP-01&angle=25');
    const text = panel('Answer');
    for (const part of ['340', 'kN', 'BS', 'Bolt shear governs', '13.12.1.1', 'a41c07f3d29b', 'Published'])
      expect(text).toContain(part);
    expect(document.querySelector('[aria-label="Cautions"]')?.textContent).toContain('Read the cautions.');
  });

  it('says whether a load can be carried in a word and in per cent', async () => {
    await openAt('detail=GP-01&angle=25&load=300');
    expect(panel('Answer')).toContain('Adequate');
    expect(panel('Answer')).toContain('88.3 %');
    fieldLabelled('Load (optional)', '400');
    await rest();
    expect(panel('Answer')).toContain('Not adequate');
    expect(panel('Answer')).toContain('117.7 %');
  });

  it('asks once for what was typed in one go', async () => {
    await openAt('detail=GP-01&angle=0');
    for (const typed of ['1', '12', '12.5']) fieldLabelled('Load angle', typed);
    await rest();
    expect(asked.map(({ angle }) => angle)).toEqual([0, 12.5]);
  });

  it('aborts an older question when a newer one is asked', async () => {
    await openAt('detail=GP-01&angle=0');
    fieldLabelled('Load angle', '10');
    await rest();
    fieldLabelled('Load angle', '20');
    await flushPromises();
    expect(asked[1]?.signal?.aborted).toBe(true);
  });

  it('names an angle that the detail does not cover, and asks nothing', async () => {
    await openAt('detail=GP-01&angle=0');
    fieldLabelled('Load angle', '85');
    await rest();
    expect(messages()).toContain('From −80° to 80°, from the normal of the face.');
    expect(asked.length).toBe(1);
    expect(panel('Answer')).toBe('');
  });

  it('lists every broken rule of a detail that is not permitted', async () => {
    const rule = { rule: 'a', title: 'Too close', clause: '22.3', message: '8 mm; at least 10 mm.' };
    outcomeOf = () => ({
      status: 'not-permitted',
      rejections: [{ ...rule, value: 8, limit: 10, unit: 'mm' }],
    });
    await openAt('detail=GP-01&angle=75');
    expect(panel('Answer')).toContain('Not permitted');
    expect(panel('Answer')).toContain('8 mm; at least 10 mm.');
  });

  it('says that nothing has been published', async () => {
    listed = [];
    await openAt('');
    expect(document.body.textContent).toContain('Nothing to look up yet');
  });
});
