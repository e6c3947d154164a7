import { fileURLToPath } from 'node:url'
import vue from '@vitejs/plugin-vue'
import { defineConfig } from 'vitest/config'

const root = fileURLToPath(new URL('..', import.meta.url))

/** Four suites: the pure engine, the API on a real MariaDB, the client in jsdom, the product in a real browser. */
export default defineConfig({
  root,
  plugins: [vue()],
  test: {
    setupFiles: ['tests/support/seed.ts'],
    // a busy machine may take its time over what an idle one does at once
    expect: { poll: { timeout: 30_000 } },
    projects: [
      {
        extends: true,
        test: {
          name: 'shared',
          include: ['tests/*.test.ts', 'tests/shared/**/*.test.ts', 'tests/scripts/**/*.test.ts'],
          testTimeout: 180_000,
        },
      },
      {
        extends: true,
        test: {
          name: 'server',
          include: ['tests/server/**/*.test.ts'],
          globalSetup: ['tests/support/startDatabase.ts'],
          testTimeout: 90_000,
          hookTimeout: 120_000,
        },
      },
      {
        extends: true,
        test: {
          name: 'client',
          include: ['tests/client/**/*.test.ts'],
          environment: 'jsdom',
          setupFiles: ['tests/support/seed.ts', 'tests/support/browserGaps.ts'],
          server: { deps: { inline: ['element-plus'] } },
          testTimeout: 90_000,
        },
      },
      {
        extends: true,
        test: {
          name: 'e2e',
          include: ['tests/e2e/**/*.test.ts'],
          testTimeout: 300_000,
          hookTimeout: 300_000,
          fileParallelism: false,
        },
      },
    ],
  },
})
