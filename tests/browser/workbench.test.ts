import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { launchBrowser, openPage } from '../support/browser.ts';
import { signIn, type } from './desk.ts';

/* The standards manager's form: nothing that was typed is lost, and two at once see each other. */

let browser: Browser;
let manager: Page;
const folder = mkdtempSync(join(tmpdir(), 'backmark-files-'));

async function at(email: string): Promise<Page> {
  const { page } = await openPage(browser, { acceptDownloads: true });
  page.setDefaultTimeout(15_000);
  await signIn(page, email);
  return page;
}
const value = (page: Page, label: string) => page.getByLabel(label, { exact: true }).first().inputValue();
const status = (page: Page, text: string) => page.getByRole('status').getByText(text, { exact: true });

beforeAll(async () => {
  browser = await launchBrowser();
  manager = await at('standards@harrowquay.example');
});
afterAll(async () => {
  await browser.close();
  rmSync(folder, { recursive: true });
});

test('undo and redo go step by step through the whole form', async () => {
  await manager.goto('/families/new');
  await type(manager, 'Plate thickness', '16');
  await expect.poll(() => manager.getByRole('button', { name: 'Undo' }).isEnabled()).toBe(true);
  await manager.getByRole('button', { name: 'Undo' }).click();
  expect(await value(manager, 'Plate thickness')).toBe('12');
  await manager.getByRole('button', { name: 'Redo' }).click();
  expect(await value(manager, 'Plate thickness')).toBe('16');
  await type(manager, 'Weld leg', '10');
  await manager.keyboard.press('Control+z');
  expect(await value(manager, 'Weld leg')).toBe('8');
  expect(await value(manager, 'Plate thickness')).toBe('16');
  await manager.keyboard.press('Control+y');
  expect(await value(manager, 'Weld leg')).toBe('10');
});

test('a definition is written to a file and read back; a faulty file leaves the form as it was', async () => {
  await type(manager, 'Code', 'WB-01');
  await type(manager, 'Title', 'From the workbench');
  await manager.getByRole('button', { name: 'More for this definition' }).click();
  const download = manager.waitForEvent('download');
  await manager.getByText('Save as a file').click();
  const path = await (await download).path();
  const written = JSON.parse(readFileSync(path, 'utf8')) as {
    definition: { parameters: Record<string, unknown> };
  };
  expect(written).toMatchObject({ file: 'backmark-family', version: 1, code: 'WB-01' });
  expect(written.definition.parameters.weld_leg).toEqual({ mode: 'fixed', value: 10 });

  const chooser = manager.getByLabel('File with a family definition');
  const give = async (name: string, content: unknown) => {
    const file = join(folder, name);
    writeFileSync(file, typeof content === 'string' ? content : JSON.stringify(content));
    await chooser.setInputFiles(file);
  };
  await give('newer.json', { ...written, version: 7 });
  await manager.getByText('It has version 7, made by a newer Backmark; this one reads version 1.').waitFor();
  await give('broken.json', '{ "file": ');
  await manager.getByText(/It is not JSON/).waitFor();
  expect(await value(manager, 'Weld leg')).toBe('10');
  const thicker = structuredClone(written);
  thicker.definition.parameters.plate_thickness = { mode: 'fixed', value: 20 };
  await give('thicker.json', thicker);
  await expect.poll(() => value(manager, 'Plate thickness')).toBe('20');
});

test('a draft saves itself, keeps its versions, and is duplicated', async () => {
  await manager.getByRole('button', { name: 'Save', exact: true }).click();
  await manager.getByText('WB-01 is saved.').waitFor();
  await type(manager, 'Pitch', '75');
  await status(manager, 'Not saved yet').waitFor();
  await status(manager, 'Saved').waitFor();
  await manager.reload();
  expect(await value(manager, 'Pitch')).toBe('75');

  await manager.getByRole('button', { name: 'More for this definition' }).click();
  await manager.getByText('Saved versions').click();
  const dialog = manager.getByRole('dialog');
  await dialog.getByText('First version').waitFor();
  await dialog.getByText('Pitch:').waitFor();
  await dialog.getByRole('button', { name: 'Put into the form' }).last().click();
  expect(await value(manager, 'Pitch')).toBe('70');
  await manager.getByRole('button', { name: 'Undo' }).click();
  expect(await value(manager, 'Pitch')).toBe('75');

  await manager.getByRole('button', { name: 'More for this definition' }).click();
  await manager.getByText('Duplicate as a new family').click();
  await expect.poll(() => value(manager, 'Title')).toBe('From the workbench (copy)');
  expect(await value(manager, 'Pitch')).toBe('75');
  expect(await value(manager, 'Code')).toBe('');
});

test('two managers at once: the second to save chooses field by field, and nothing is lost', async () => {
  const other = await at('details@harrowquay.example');
  await manager.goto('/families');
  await manager.getByRole('link', { name: 'WB-01' }).click();
  await expect.poll(() => value(manager, 'Pitch')).toBe('75');
  await other.goto(manager.url());
  await expect.poll(() => value(other, 'Pitch')).toBe('75');

  await type(other, 'Plate thickness', '24');
  await other.getByRole('button', { name: 'Save', exact: true }).click();
  await other.getByText('WB-01 is saved.').waitFor();

  await type(manager, 'Pitch', '80');
  await manager.getByRole('button', { name: 'Save', exact: true }).click();
  const dialog = manager.getByRole('dialog', { name: 'Saved by somebody else in the meantime' });
  const row = dialog.getByRole('row').filter({ hasText: 'Plate thickness' });
  await row.getByRole('radio').last().check();
  await dialog.getByRole('button', { name: 'Save what is chosen' }).click();
  await status(manager, 'Saved').waitFor();
  expect(await value(manager, 'Plate thickness')).toBe('24');
  expect(await value(manager, 'Pitch')).toBe('80');
});

test("the load's arrow in the drawing is dragged round to set the angle, as far as the kind allows", async () => {
  await manager.goto('/families/new');
  const drawing = manager.getByRole('img', { name: /^Drawing to scale: plate 12 mm thick, 3 bolts/ });
  const typed = () => manager.getByRole('textbox', { name: 'Load angle', exact: true }).inputValue();
  const grip = drawing.locator('circle[aria-hidden]');
  const box = (await grip.boundingBox())!;
  await manager.mouse.move(box.x + box.width / 2, box.y + box.height / 2);
  await manager.mouse.down();
  // The sheet is fitted to the turned detail, so the place where the load acts is asked for again before each move.
  const dragTo = async (degrees: number) => {
    const [cx = 0, cy = 0, r = 1] = await Promise.all(
      ['cx', 'cy', 'r'].map(async (name) => Number(await grip.getAttribute(name))),
    );
    const now = (await grip.boundingBox())!;
    const pixels = now.width / (2 * r);
    const acts = { x: now.x + (r - cx) * pixels, y: now.y + (r - cy) * pixels };
    const theta = (degrees * Math.PI) / 180;
    await manager.mouse.move(acts.x + 150 * Math.cos(theta), acts.y - 150 * Math.sin(theta));
    return typed();
  };
  await expect.poll(() => dragTo(35)).toBe('35');
  await manager.getByRole('img', { name: /load at 35°/ }).waitFor();
  expect(await manager.getByRole('slider', { name: 'Load angle' }).getAttribute('aria-valuenow')).toBe('35');
  await expect.poll(() => dragTo(-89)).toBe('-80');
  await manager.mouse.up();
  await manager.mouse.move(box.x, box.y);
  expect(await typed()).toBe('-80');
});

test('a 0 that is no size says what it means; a kind that only pulls offers no push', async () => {
  await manager.goto('/families/new');
  const hole = manager.locator('.v-text-field').filter({ has: manager.getByLabel('Hole diameter') });
  await hole.getByText('normal hole', { exact: true }).waitFor();
  await type(manager, 'Hole diameter', '22');
  await hole.getByText('mm', { exact: true }).waitFor();
  const push = manager.getByRole('button', { name: 'Compression', exact: true });
  await push.click();
  await manager.getByRole('combobox', { name: 'Kind of detail' }).click({ force: true });
  await manager.getByRole('option', { name: 'Fin plate' }).click();
  await expect.poll(() => push.count()).toBe(0);
  await manager.getByRole('img', { name: /^Drawing to scale: plate 10 mm thick, 4 bolts/ }).waitFor();
  await manager.getByText('Bolt group in shear', { exact: true }).first().waitFor();
});
