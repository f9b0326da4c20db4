import type { Locator, Page } from 'playwright-core';

/** What people do at any screen, found as they find it: by role and by label. */

const password = 'harrow quay drawing office';

export async function signIn(page: Page, email: string): Promise<void> {
  await page.goto('/sign-in');
  await page.getByLabel('Mail address').fill(email);
  await page.getByLabel('Password', { exact: true }).fill(password);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await page.getByRole('heading', { level: 1, name: 'Home' }).waitFor();
}

/** A field of text by its label, emptied and typed into. */
export async function type(scope: Page | Locator, label: string, text: string): Promise<void> {
  await scope.getByLabel(label, { exact: true }).first().fill(text);
}

/** Picks from a list that opens on its field. */
export async function pick(page: Page, label: string, option: string): Promise<void> {
  const field = page.getByRole('combobox', { name: label }).first();
  // The chosen value lies over the field; it is the field's own.
  await field.click({ force: true });
  await page.getByRole('option', { name: option, exact: true }).first().click();
}

/** Picks from a long list by typing a part of it. */
export async function pickTyped(page: Page, label: string, option: string): Promise<void> {
  const field = page.getByRole('combobox', { name: label, exact: true });
  // The chosen value lies over the field; it is the field's own.
  await field.click({ force: true });
  await field.fill(option);
  await page.getByRole('option', { name: option }).first().click();
}

/** Turns a parameter of the editor from fixed to another mode. */
export async function sweepBy(
  page: Page,
  parameter: string,
  mode: 'List' | 'From–to' | 'Derived',
): Promise<void> {
  const group = page.getByRole('group', { name: new RegExp(`^${parameter}: fixed`) });
  await group.getByRole('radio', { name: mode }).check();
}

/** The text of a table's cell by what heads its row and its column. */
export async function cellOf(grid: Locator, row: readonly string[], column: string): Promise<string> {
  const heads = await grid.getByRole('columnheader').all();
  const names = await Promise.all(heads.map(async (head) => (await head.innerText()).trim()));
  const index = await heads[names.indexOf(column)]?.getAttribute('aria-colindex');
  if (!index) throw new Error(`No column ${column} among ${names.join(' | ')}`);
  for (const line of await grid.getByRole('row').all()) {
    const titles = await line.getByRole('rowheader').allInnerTexts();
    if (titles.join('|') !== row.join('|')) continue;
    return (await line.locator(`[role=gridcell][aria-colindex="${index}"]`).innerText())
      .replace(/\s+/g, ' ')
      .trim();
  }
  throw new Error(`No row ${row.join(' | ')}`);
}
