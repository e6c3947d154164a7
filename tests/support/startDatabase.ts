import { mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import type { TestProject } from 'vitest/node'
import { startDatabase } from '../../scripts/localDatabase.js'

/** How tests reach the MariaDB that was started for this run. */
export interface TestDatabase {
  readonly socketPath: string
  readonly username: string
  readonly password: string
}

declare module 'vitest' {
  export interface ProvidedContext {
    database: TestDatabase
  }
}

/** A MariaDB of this run alone, in a fresh folder; it ends with the run, however that ends. */
export default async function ({ provide }: TestProject): Promise<() => Promise<void>> {
  const folder = mkdtempSync(join(tmpdir(), 'bothways-test-'))
  const database = await startDatabase({
    dataFolder: join(folder, 'database'),
    isDurable: false,
    onExit: (output) => process.stderr.write(output),
  })
  provide('database', { socketPath: database.socketPath, username: database.user, password: database.password })
  return async () => {
    await database.stop()
    rmSync(folder, { recursive: true, force: true })
  }
}
