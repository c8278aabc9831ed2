import { fileURLToPath } from 'node:url';
import react from '@vitejs/plugin-react';
import { defineConfig } from 'vitest/config';

const alias = { '@': fileURLToPath(new URL('.', import.meta.url)).replace(/\/$/, '') };
/** `server-only` throws outside of Next's server; here every test is its own judge of where code may run. */
const serverOnly = fileURLToPath(new URL('./tests/support/serverOnly.ts', import.meta.url));

export default defineConfig({
  test: {
    projects: [
      {
        resolve: { alias },
        test: {
          name: 'unit',
          include: [
            'tests/compiler/**/*.test.ts',
            'tests/architecture/**/*.test.ts',
            'tests/bin/**/*.test.ts',
          ],
          environment: 'node',
          testTimeout: 60_000,
        },
      },
      {
        plugins: [react()],
        resolve: { alias },
        test: {
          name: 'dom',
          include: ['tests/components/**/*.test.{ts,tsx}'],
          environment: 'jsdom',
          testTimeout: 30_000,
        },
      },
      {
        resolve: { alias: { ...alias, 'server-only': serverOnly } },
        test: {
          name: 'db',
          include: ['tests/db/**/*.test.ts', 'tests/app/**/*.test.ts'],
          environment: 'node',
          globalSetup: ['tests/support/databaseSetup.ts'],
          testTimeout: 60_000,
          hookTimeout: 60_000,
        },
      },
      {
        resolve: { alias },
        test: {
          name: 'e2e',
          include: ['tests/e2e/**/*.test.ts'],
          environment: 'node',
          globalSetup: ['tests/support/applicationSetup.ts'],
          // One browser at a time: two cores draw pictures in software.
          fileParallelism: false,
          // After all others, which would take those cores from it.
          sequence: { groupOrder: 1 },
          testTimeout: 300_000,
          // A busy machine may take its time to draw; a wait that ends well ends at once.
          expect: { poll: { timeout: 30_000, interval: 200 } },
          hookTimeout: 240_000,
        },
      },
    ],
  },
});
