import { fileURLToPath } from 'node:url'
import { defineConfig } from 'vitest/config'

/** Measurements that need a database; not part of `npm test`. */
export default defineConfig({
  root: fileURLToPath(new URL('../..', import.meta.url)),
  test: { include: ['tests/bench/rateImport.bench.ts'], globalSetup: ['tests/support/startDatabase.ts'], testTimeout: 600_000 },
})
