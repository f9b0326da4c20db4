import { fileURLToPath } from 'node:url';
import vue from '@vitejs/plugin-vue';
import vuetify from 'vite-plugin-vuetify';
import { defineConfig } from 'vitest/config';
import { projectsWith } from './tests/projects.ts';

const folder = (name: string) => fileURLToPath(new URL(`./${name}`, import.meta.url));

/** The folders that may be named from anywhere; tsconfig.json lists the same three. */
const alias = {
  '@shared': folder('shared'),
  '@catalog': folder('catalog'),
  '@server': folder('server'),
};

const apiAddress = process.env.BACKMARK_API ?? 'http://127.0.0.1:8080';

export default defineConfig({
  plugins: [vue(), vuetify({ autoImport: true })],
  resolve: { alias },
  publicDir: 'src/public',
  build: {
    outDir: 'dist/client',
    emptyOutDir: true,
    target: 'es2022',
    // No inline data: the content policy allows fonts and scripts from our own address only.
    assetsInlineLimit: 0,
    chunkSizeWarningLimit: 700,
  },
  server: { host: '127.0.0.1', proxy: { '/api': apiAddress } },
  test: {
    coverage: { include: ['shared/**', 'server/**', 'src/**'], exclude: ['server/dev/**'] },
    projects: projectsWith(alias),
  },
});
