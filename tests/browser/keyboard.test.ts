import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { launchBrowser, openPage, type WatchedPage } from '../support/browser.ts';

/* Signing in and looking a capacity up with nothing but a keyboard. */

let browser: Browser;
let watched: WatchedPage;
let page: Page;

beforeAll(async () => {
  browser = await launchBrowser();
  watched = await openPage(browser);
  page = watched.page;
});
afterAll(() => browser.close());

/** Role and name of what has the focus, and whether anybody can see that it has. */
const focus = () =>
  page.evaluate<{ role: string; name: string; seen: boolean }>(`(() => {
    const at = document.activeElement;
    const box = at.closest('.v-field, label') ?? at;
    const style = [at, box, at.parentElement].map((one) => getComputedStyle(one));
    const outlined = style.some(({ outlineStyle, outlineWidth }) => outlineStyle !== 'none' && outlineWidth !== '0px');
    const label = at.getAttribute('aria-label') ?? at.labels?.[0]?.textContent ?? at.textContent ?? '';
    return {
      role: at.getAttribute('role') ?? at.tagName.toLowerCase(),
      name: label.trim().replace(/\\s+/g, ' '),
      seen: outlined || box.classList.contains('v-field--focused'),
    };
  })()`);

/** Presses Tab until what is wanted has the focus; each stop on the way can be seen. */
async function tabTo(wanted: (at: { role: string; name: string }) => boolean, most = 40): Promise<void> {
  const stops: string[] = [];
  for (let presses = 0; presses < most; presses++) {
    await page.keyboard.press('Tab');
    const at = await focus();
    if (at.role !== 'body') expect(at.seen, `the focus on ${at.role} "${at.name}" can be seen`).toBe(true);
    if (wanted(at)) return;
    stops.push(`${at.role} ${at.name}`);
  }
  throw new Error(`Tab leads elsewhere: ${stops.join(' · ')}`);
}

test('a person signs in and looks a capacity up by keyboard alone', async () => {
  await page.goto('/sign-in');
  // The first field has the focus.
  await expect.poll(async () => (await focus()).name).toContain('Mail address');
  await page.keyboard.type('engineer@harrowquay.example');
  await page.keyboard.press('Tab');
  await page.keyboard.type('harrow quay drawing office');
  await page.keyboard.press('Enter');
  await page.getByRole('heading', { level: 1, name: 'Home' }).waitFor();

  await tabTo(({ role, name }) => role === 'link' && name === 'Look up');
  await page.keyboard.press('Enter');
  await page.getByRole('heading', { level: 1, name: 'Look up' }).waitFor();

  await tabTo(({ role, name }) => role === 'combobox' && name.includes('Detail'));
  await page.keyboard.type('GP-01');
  await page.getByRole('option', { name: /GP-01/ }).waitFor();
  await page.keyboard.press('ArrowDown');
  await page.keyboard.press('Enter');
  const answer = page.getByRole('region', { name: 'Answer' });
  await answer.getByText('at 0°', { exact: false }).waitFor();

  // The dial goes a degree at a press.
  await tabTo(({ role, name }) => role === 'slider' && name.includes('Load angle'));
  for (let press = 0; press < 3; press++) await page.keyboard.press('ArrowUp');
  await answer.getByText('at 3°', { exact: false }).waitFor();
  expect(await page.getByRole('slider').getAttribute('aria-valuenow')).toBe('3');
  expect(watched.faults).toEqual([]);
});
