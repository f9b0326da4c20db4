import type { TestProject } from 'vitest/node';
import { startApp } from './app.ts';

declare module 'vitest' {
  interface ProvidedContext {
    /** The address of the running program with its demo data. */
    appUrl: string;
  }
}

/** Starts the built program with demo data for all browser tests. */
export default async function setup(project: TestProject): Promise<() => Promise<void>> {
  const app = await startApp({ BACKMARK_DEMO: 'true' });
  project.provide('appUrl', app.url);
  return async () => {
    await app.stop();
  };
}
