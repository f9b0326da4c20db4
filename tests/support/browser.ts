import { createRequire } from 'node:module';
import { readFileSync } from 'node:fs';
import type { AxeResults, RunOptions } from 'axe-core';
import { chromium, type Browser, type BrowserContextOptions, type Page } from 'playwright-core';
import { inject } from 'vitest';

const axeSource = readFileSync(createRequire(import.meta.url).resolve('axe-core/axe.min.js'), 'utf8');
const wcag = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa', 'best-practice'];
const transitionsEnd = 600;

/** Debian's Chromium; it is given no way to talk to anybody but us. */
export function launchBrowser(): Promise<Browser> {
  return chromium.launch({
    executablePath: '/usr/bin/chromium',
    args: [
      '--no-sandbox',
      '--disable-gpu',
      '--disable-quic',
      '--no-first-run',
      '--disable-background-networking',
      '--disable-component-update',
      '--disable-sync',
    ],
  });
}

/** A page of its own session, and what went wrong in it. */
export interface WatchedPage {
  page: Page;
  /** Script errors, console errors (refused content included) and requests to other hosts, in order. */
  faults: string[];
  close(): Promise<void>;
}

/** Opens a page in a new session on the running program; relative addresses work. */
export async function openPage(browser: Browser, options: BrowserContextOptions = {}): Promise<WatchedPage> {
  const baseURL = inject('appUrl');
  const context = await browser.newContext({ baseURL, viewport: { width: 1440, height: 900 }, ...options });
  const page = await context.newPage();
  const faults: string[] = [];
  page.on('pageerror', (error) => faults.push(`script: ${error.message}`));
  page.on('console', (message) => {
    // A refused request is the API's answer, which the tests look at themselves.
    const isAnswer = message.text().startsWith('Failed to load resource: the server responded');
    if (message.type() === 'error' && !isAnswer) faults.push(`console: ${message.text()}`);
  });
  page.on('request', (request) => {
    const local = request.url().startsWith(baseURL) || /^(data|blob|about):/.test(request.url());
    if (!local) faults.push(`request: ${request.url()}`);
  });
  return { page, faults, close: () => context.close() };
}

/**
 * Looks for barriers to people who use a keyboard or a screen reader, after transitions have ended.
 * @returns one line for each rule broken, with the first element that breaks it
 */
export async function accessibilityFaults(page: Page): Promise<string[]> {
  await page.waitForTimeout(transitionsEnd);
  await page.evaluate(axeSource);
  const options: RunOptions = { runOnly: { type: 'tag', values: wcag }, resultTypes: ['violations'] };
  const results = await page.evaluate<AxeResults, RunOptions>(
    (given) => (globalThis as unknown as { axe: { run(o: unknown): Promise<never> } }).axe.run(given),
    options,
  );
  return results.violations.map(
    (fault) =>
      `${fault.impact} ${fault.id}: ${fault.help}: ${String(fault.nodes[0]?.target)} (${fault.nodes.length})`,
  );
}
