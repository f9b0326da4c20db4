import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { launchBrowser, openPage } from '../support/browser.ts';
import { signIn, sweepBy, type } from './desk.ts';

/* A standards manager derives a parameter and gives the family a rule; both are stored. */

let browser: Browser;
let page: Page;

beforeAll(async () => {
  browser = await launchBrowser();
  ({ page } = await openPage(browser));
  page.setDefaultTimeout(15_000);
  await signIn(page, 'standards@harrowquay.example');
  await page.goto('/families/new');
});
afterAll(() => browser.close());

test('an expression is written with the keyboard, and its fault stands under its characters', async () => {
  await sweepBy(page, 'Pitch', 'Derived');
  const pitch = page.getByLabel('Pitch =', { exact: true });
  await pitch.fill('');
  await pitch.pressSequentially('5 * bolt_');
  const offer = page.getByRole('option', { name: /^bolt_d/ });
  await offer.waitFor();
  while ((await offer.getAttribute('aria-selected')) !== 'true') await page.keyboard.press('ArrowDown');
  await page.keyboard.press('Enter');
  expect(await pitch.inputValue()).toBe('5 * bolt_d');
  await page.getByText('= 100 mm in the sample variant').waitFor();

  // Long enough to break its line: the mark stands where the word does, in the second line.
  await pitch.fill(`${'1 * '.repeat(40)}bolt_dd`);
  const mark = page.locator('.mirror .mark');
  await mark.waitFor();
  expect(await mark.innerText()).toBe('bolt_dd');
  const [field, marked] = [(await pitch.boundingBox())!, (await mark.boundingBox())!];
  expect(marked.y).toBeGreaterThan(field.y + 22);
  expect(marked.y + marked.height).toBeLessThanOrEqual(field.y + field.height);
  await pitch.fill('ceil(3 * bolt_d, 5)');
  await page.getByText('= 60 mm in the sample variant').waitFor();
});

test('a rule of the family rejects with its message, and is stored', async () => {
  await page.getByRole('button', { name: 'Add a rule' }).click();
  await page.getByLabel('Rule 1 holds where', { exact: true }).fill('pitch >= 3.5 * bolt_d');
  await type(page, 'Message of rule 1', 'Pitch below three and a half diameters');
  await page.getByText('pitch >= 3.5 * bolt_d does not hold: 60 against 70.').first().waitFor();
  await type(page, 'Code', 'EX-01');
  await type(page, 'Title', 'With expressions');
  await page.getByRole('button', { name: 'Save', exact: true }).click();
  await page.getByText('EX-01 is saved.').waitFor();
  await page.waitForURL((url) => !url.pathname.endsWith('/new'));
  await page.reload();
  expect(await page.getByLabel('Pitch =', { exact: true }).inputValue()).toBe('ceil(3 * bolt_d, 5)');
  expect(await page.getByLabel('Rule 1 holds where', { exact: true }).inputValue()).toBe(
    'pitch >= 3.5 * bolt_d',
  );
});
