import vue from '@vitejs/plugin-vue';
import vuetify from 'vite-plugin-vuetify';
import type { TestProjectConfiguration } from 'vitest/config';

/** What is tested, and how: `npx vitest --project engine` runs one of them. */
export const projectsWith = (alias: Readonly<Record<string, string>>): TestProjectConfiguration[] => {
  const resolve = { alias };
  return [
    {
      resolve,
      test: {
        name: 'engine',
        include: ['tests/{engine,verification,catalog}/**/*.test.ts'],
        testTimeout: 20_000,
      },
    },
    {
      resolve,
      test: {
        name: 'api',
        include: ['tests/{api,faults}/**/*.test.ts'],
        globalSetup: ['tests/support/database-setup.ts'],
        testTimeout: 30_000,
        hookTimeout: 60_000,
      },
    },
    {
      plugins: [vue(), vuetify({ autoImport: true })],
      resolve,
      test: {
        name: 'client',
        include: ['tests/client/**/*.test.ts'],
        environment: 'happy-dom',
        setupFiles: ['tests/support/client/setup.ts'],
        // Vuetify imports its style sheets, which Node.js cannot; Vite must take it in.
        server: { deps: { inline: ['vuetify'] } },
        testTimeout: 20_000,
      },
    },
    {
      resolve,
      test: {
        name: 'browser',
        include: ['tests/browser/**/*.test.ts'],
        globalSetup: ['tests/support/app-setup.ts'],
        // One program and one database serve all files; two at once would disturb each other's catalogue.
        fileParallelism: false,
        testTimeout: 120_000,
        hookTimeout: 120_000,
      },
    },
  ];
};
