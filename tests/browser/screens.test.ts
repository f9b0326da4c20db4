import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { accessibilityFaults, launchBrowser, openPage, type WatchedPage } from '../support/browser.ts';
import { signIn } from './desk.ts';

/*
 * Every screen with the demo firm's data, at a desk and in the hand, light and dark: no barrier that axe finds, no
 * page wider than its window, no script error, no request to another host. With SCREENSHOTS=folder each is kept.
 */

const sizes = [
  { name: 'desk', width: 1440, height: 900 },
  { name: 'hand', width: 390, height: 844 },
] as const;
const schemes = ['light', 'dark'] as const;
const folder = process.env.SCREENSHOTS;

interface Screen {
  readonly name: string;
  readonly path: string;
  readonly as: 'standards' | 'engineer' | 'drafter' | 'admin' | 'nobody';
  /** What stands there once it is loaded. */
  readonly shows: string | RegExp;
}

const screens: readonly Screen[] = [
  { name: 'sign-in', path: '/sign-in', as: 'nobody', shows: 'Mail address' },
  { name: 'home', path: '/', as: 'standards', shows: 'Recently published' },
  { name: 'families', path: '/families', as: 'standards', shows: 'GP-01' },
  { name: 'new-family', path: '/families/new', as: 'standards', shows: 'Plate thickness' },
  { name: 'family', path: '/families/1', as: 'standards', shows: 'Revision B' },
  { name: 'revision', path: '/revisions/2', as: 'standards', shows: 'Definition' },
  { name: 'results', path: '/revisions/2/results', as: 'standards', shows: /rounded down to/ },
  {
    name: 'sheet',
    path: '/revisions/2/variants/3/sheet?sense=tension&angle=30',
    as: 'engineer',
    shows: 'Given',
  },
  {
    name: 'look-up',
    path: '/look-up?detail=GP-01&angle=33.5&load=120',
    as: 'engineer',
    shows: /utilisation/,
  },
  { name: 'exports', path: '/exports?revision=2', as: 'drafter', shows: 'Drawing number' },
  { name: 'sweeps', path: '/sweeps', as: 'standards', shows: 'Sweeps' },
  { name: 'verification', path: '/verification', as: 'engineer', shows: /checks by engine/ },
  { name: 'people', path: '/people', as: 'admin', shows: 'Priya Oduya' },
  { name: 'settings', path: '/settings', as: 'admin', shows: 'Name of the firm' },
  { name: 'audit', path: '/audit', as: 'admin', shows: /revision/i },
  { name: 'account', path: '/account', as: 'engineer', shows: 'Ivo Brandgard' },
  { name: 'not-found', path: '/nowhere', as: 'engineer', shows: /not/i },
];

let browser: Browser;
const people = new Map<string, WatchedPage>();

beforeAll(async () => {
  browser = await launchBrowser();
  for (const who of new Set(screens.map(({ as }) => as))) {
    const watched = await openPage(browser);
    if (who !== 'nobody') await signIn(watched.page, `${who}@harrowquay.example`);
    people.set(who, watched);
  }
});
afterAll(() => browser.close());

async function shown(page: Page, { shows }: Screen): Promise<void> {
  await page.getByText(shows).or(page.getByLabel(shows)).filter({ visible: true }).first().waitFor();
}

/** How far the page is wider than its window, px. */
const overflow = (page: Page) =>
  page.evaluate<number>('document.documentElement.scrollWidth - document.documentElement.clientWidth');

describe.each(screens)('$name', (screen) => {
  test.each(sizes)('in the $name', async ({ name, width, height }) => {
    const { page, faults } = people.get(screen.as)!;
    await page.setViewportSize({ width, height });
    for (const colorScheme of schemes) {
      await page.emulateMedia({ colorScheme });
      await page.goto(screen.path);
      await shown(page, screen);
      expect(await accessibilityFaults(page), colorScheme).toEqual([]);
      expect(await overflow(page), colorScheme).toBeLessThanOrEqual(0);
      if (folder) await page.screenshot({ path: `${folder}/${screen.name}-${name}-${colorScheme}.png` });
    }
    expect(faults.splice(0)).toEqual([]);
  });
});

describe('when the program does not answer', () => {
  test.each(screens.filter(({ as, name }) => as !== 'nobody' && name !== 'not-found' && name !== 'account'))(
    '$name says so and offers to try again',
    async (screen) => {
      const { page } = people.get(screen.as)!;
      await page.setViewportSize({ width: 1440, height: 900 });
      const broken = (url: URL) => url.pathname.startsWith('/api/') && !url.pathname.startsWith('/api/auth/');
      const body = JSON.stringify({
        type: 'urn:backmark:problem:internal',
        title: 'Something went wrong.',
        status: 500,
        code: 'internal',
        instance: '/api',
        requestId: '00000000-0000-4000-8000-000000000000',
      });
      await page.route(broken, (route) =>
        route.fulfill({ status: 500, contentType: 'application/problem+json', body }),
      );
      try {
        await page.goto(screen.path);
        await page.getByRole('alert').first().waitFor();
        await page.getByRole('button', { name: /again/i }).first().waitFor();
        if (folder) await page.screenshot({ path: `${folder}/${screen.name}-failed.png` });
      } finally {
        await page.unroute(broken);
      }
      await page.getByRole('button', { name: /again/i }).first().click();
      await shown(page, screen);
    },
  );
});
