import ExcelJS from 'exceljs';
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { launchBrowser, openPage, type WatchedPage } from '../support/browser.ts';
import { cellOf, pick, pickTyped, signIn, sweepBy, type } from './desk.ts';

/*
 * From a definition to a drawing, by four people. Bolt shear governs every cell of the family, so that each
 * capacity is worked out by hand:
 *
 * SANS 10162-1:2011 13.12.1.1, threads in the shear planes: V_r = 0.60 φ_b n m A_b f_ub × 0.70 with φ_b = 0.80,
 * two planes (angles back to back), M20 of class 8.8: A_b = π 20²/4 = 314.159 mm², f_ub = 830 MPa (ISO 898-1 above
 * 16 mm). One bolt: 0.60 × 0.80 × 2 × 314.159 × 830 × 0.70 = 175 225 N.
 */
const byHand = { '2': 350, '3': 525, '4': 700 } as const;
const unrounded = '525.67';

let browser: Browser;
const opened: WatchedPage[] = [];

beforeAll(async () => {
  browser = await launchBrowser();
});
afterAll(() => browser.close());

/** Signs somebody in on a page of their own. */
async function at(email: string): Promise<Page> {
  const watched = await openPage(browser, { acceptDownloads: true });
  opened.push(watched);
  watched.page.setDefaultTimeout(15_000);
  await signIn(watched.page, email);
  return watched.page;
}

const code = 'WP-01';
const confirm = (page: Page, name: string) => page.getByRole('dialog').getByRole('button', { name }).click();

test('a family goes from its definition to the drawing set', { timeout: 180_000 }, async () => {
  const manager = await at('standards@harrowquay.example');

  // Define.
  await manager.getByRole('link', { name: 'New family' }).click();
  await type(manager, 'Code', code);
  await type(manager, 'Title', 'Gusset, heavy plate, double shear');
  await pick(manager, 'Design basis', 'SANS 10162-1:2011, limit-states design of hot-rolled steelwork');
  await type(manager, 'Plate thickness', '25');
  await type(manager, 'End distance on the gusset', '60');
  await type(manager, 'Edge distance on the gusset', '70');
  await type(manager, 'Weld length', '500');
  await sweepBy(manager, 'Weld leg', 'List');
  await manager.getByLabel('Weld leg, values').fill('10 12 ');
  await sweepBy(manager, 'Rows of bolts', 'From–to');
  await type(manager, 'Rows of bolts, from', '2');
  await type(manager, 'Rows of bolts, to', '4');
  await type(manager, 'Rows of bolts, step', '1');
  await type(manager, 'Pitch', '80');
  await type(manager, 'Weld line to the first row', '200');
  await pickTyped(manager, 'Section', 'L120x120x12');
  await type(manager, 'End distance on the brace', '50');
  await type(manager, 'Load angle, from', '-30');
  await type(manager, 'Load angle, to', '30');
  await type(manager, 'Load angle, step', '5');
  // The fixed leg of 8 mm had become the first of the list.
  await manager.getByLabel('Take out 8', { exact: true }).click();
  // Two legs by three numbers of rows; 13 angles in both senses.
  await manager.getByText('6 variants').waitFor();
  await manager.getByText('156 cells').waitFor();
  const sample = manager.getByRole('region', { name: 'Sample variant' });
  await sample.getByText(`${byHand[2]} kN`, { exact: true }).waitFor();
  await sample.getByText('Bolt shear', { exact: true }).waitFor();
  await manager.getByRole('button', { name: 'Save' }).click();
  await manager.getByText(`${code} is saved.`).waitFor();

  // Sweep, and follow it to its end.
  await manager.getByRole('button', { name: /sweep/i }).click();
  await manager.getByRole('link', { name: 'Results', exact: true }).click();

  // Results: a capacity by its row and column, with what governs.
  const grid = manager.getByRole('grid');
  await grid.waitFor();
  for (const rows of ['2', '3', '4'] as const) {
    await expect.poll(() => cellOf(grid, ['12', rows], '−30')).toBe(`${byHand[rows]} BS`);
  }
  await manager.getByRole('link', { name: code }).first().click();

  // Submit; the author cannot sign.
  await manager.getByRole('button', { name: 'Submit for check' }).click();
  await manager.getByLabel('To the checker').fill('Bolt shear governs throughout.');
  await confirm(manager, 'Submit for check');
  await manager.getByText('The revision is in check.').waitFor();
  expect(await manager.getByRole('button', { name: 'Sign', exact: true }).count()).toBe(0);
  const address = new URL(manager.url()).pathname;

  // Another person signs with a remark.
  const checker = await at('checker@harrowquay.example');
  await checker.goto(address);
  await checker.getByRole('button', { name: 'Sign', exact: true }).click();
  await checker.getByLabel('What was checked, and how').fill('Three cells by hand: 350, 525 and 700 kN.');
  await confirm(checker, 'Sign');
  await checker.getByText('The revision is checked and signed.').waitFor();

  // Publish: the code has to be typed.
  await manager.reload();
  await manager.getByRole('button', { name: 'Publish', exact: true }).click();
  await manager.getByLabel(`Type ${code} to confirm`).fill(code);
  await confirm(manager, 'Publish');
  await manager.getByText('The revision is published.').waitFor();
  await manager.getByRole('heading', { level: 1, name: 'Revision A' }).waitFor();

  // Lock.
  const admin = await at('admin@harrowquay.example');
  await admin.goto(address);
  await admin.getByRole('button', { name: 'Lock', exact: true }).click();
  await admin.getByLabel(`Type ${code} to confirm`).fill(code);
  await confirm(admin, 'Lock');
  await admin.getByText('The revision is locked.').waitFor();
  const strip = admin.getByRole('group', { name: 'Title strip' });
  const hash = /[0-9a-f]{12}/.exec(await strip.innerText())?.[0] ?? '';
  expect(hash).toMatch(/^[0-9a-f]{12}$/);

  // Look up at an angle between those of the grid, with a load.
  const engineer = await at('engineer@harrowquay.example');
  await engineer.getByRole('link', { name: 'Look up' }).first().click();
  await pickTyped(engineer, 'Detail', `${code} Gusset, heavy plate, double shear`);
  await pick(engineer, 'Rows of bolts', '3');
  await type(engineer, 'Load angle', '17.3');
  await type(engineer, 'Load (optional)', '420');
  const answer = engineer.getByRole('region', { name: 'Answer' });
  await answer.getByText(`${byHand[3]} kN`, { exact: true }).waitFor();
  const said = (await answer.innerText()).replace(/\s+/g, ' ');
  expect(said).toContain('Bolt shear governs');
  expect(said).toContain('SANS 10162-1 13.12.1.1');
  expect(said).toContain(`rounded down from ${unrounded}`);
  // 420 / 525 = 80.0 %.
  expect(said).toContain('Adequate for 420 kN: utilisation 80.0 %');
  expect(said).toContain('Locked');
  expect(said).toContain(hash);
  await engineer.getByText('Capacities are for the use of competent engineers').first().waitFor();

  // Export, and read the workbook back.
  const drafter = await at('drafter@harrowquay.example');
  await drafter.getByRole('link', { name: 'Exports' }).click();
  await pickTyped(drafter, 'Published revision', code);
  await type(drafter, 'Drawing number', 'HQ-1204-S-017');
  const download = drafter.waitForEvent('download');
  await drafter.getByRole('button', { name: 'Make the workbook' }).click();
  const workbook = new ExcelJS.Workbook();
  await workbook.xlsx.readFile(await (await download).path());
  const texts = workbook.worksheets.flatMap((sheet) =>
    sheet.getSheetValues().flatMap((row) => (Array.isArray(row) ? row.map(String) : [])),
  );
  for (const text of [code, 'HQ-1204-S-017', hash, 'competent engineers']) {
    expect(
      texts.some((one) => one.includes(text)),
      text,
    ).toBe(true);
  }
  for (const capacity of Object.values(byHand)) expect(texts).toContain(String(capacity));
  await drafter.getByRole('cell', { name: 'HQ-1204-S-017' }).waitFor();

  for (const { faults } of opened) expect(faults).toEqual([]);
});
