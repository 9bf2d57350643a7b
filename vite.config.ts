import { fileURLToPath } from 'node:url';
import tailwindcss from '@tailwindcss/vite';
import react from '@vitejs/plugin-react';
import { defineConfig } from 'vitest/config';

const serverEntries = {
  main: 'server/main.ts',
  migrate: 'server/commands/migrate.ts',
  'verify-log': 'server/commands/verify-log.ts',
  nightly: 'server/commands/nightly.ts',
  'rebuild-memory': 'server/commands/rebuild-memory.ts',
};

/** Libraries that every page needs, and the small modules of ours that would each become a file of their own. */
const BASE =
  /node_modules\/(react|react-dom|scheduler|react-router|react-router-dom|@tanstack\/(query-core|react-query)|zod)\/|\/src\/lib\/(api|keeper|kept-keys|query-client)\.ts$|\/shared\/schemas\/(common|curriculum)\.ts$/;

// react-router's export map gives every bundler its development build, with checks that only help while developing.
const ROUTER = fileURLToPath(new URL('node_modules/react-router/dist/production/', import.meta.url));
const productionRouter = [
  { find: /^react-router$/, replacement: `${ROUTER}index.mjs` },
  { find: /^react-router\/dom$/, replacement: `${ROUTER}dom-export.mjs` },
];

export default defineConfig(({ isSsrBuild, command }) => ({
  plugins: [react(), tailwindcss()],
  resolve: { alias: command === 'build' ? productionRouter : [] },
  build: isSsrBuild
    ? { target: 'node20', sourcemap: true, rollupOptions: { input: serverEntries } }
    : {
        target: 'es2022',
        outDir: 'dist/client',
        assetsInlineLimit: 0,
        manifest: true,
        // One chunk of what every page needs compresses better than a dozen small ones.
        rollupOptions: { output: { codeSplitting: { groups: [{ name: 'base', test: BASE }] } } },
      },
  server: {
    proxy: { '/api': process.env.API_ORIGIN ?? 'http://127.0.0.1:3000' },
    // Builds and clusters made beside it are no reason to reload a page.
    watch: { ignored: ['**/.plait/**', '**/dist/**'] },
  },
  test: {
    projects: [
      { extends: true, test: { name: 'unit', include: ['tests/unit/**/*.test.{ts,tsx}'], environment: 'node' } },
      { extends: true, test: { name: 'property', include: ['tests/property/**/*.test.ts'], testTimeout: 60_000 } },
      {
        extends: true,
        test: {
          name: 'api',
          include: ['tests/api/**/*.test.ts'],
          globalSetup: ['tests/support/template-database.ts'],
          setupFiles: ['tests/support/worker-database.ts'],
          testTimeout: 20_000,
          hookTimeout: 30_000,
          maxWorkers: 2,
        },
      },
      {
        extends: true,
        test: {
          name: 'e2e',
          include: ['tests/e2e/**/*.test.ts'],
          globalSetup: ['tests/support/running-app.ts'],
          setupFiles: ['tests/support/running-app-database.ts'],
          testTimeout: 120_000,
          hookTimeout: 120_000,
          maxWorkers: 1,
          fileParallelism: false,
        },
      },
    ],
  },
}));
