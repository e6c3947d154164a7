import { mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { startDatabase } from '../../scripts/localDatabase.js'
import { createDataSource } from '../../server/dataSource'
import type { DatabaseSettings } from '../../server/env'

let folder: string
let database: Awaited<ReturnType<typeof startDatabase>>
beforeAll(async () => {
  folder = mkdtempSync(join(tmpdir(), 'bothways-local-'))
  database = await startDatabase({ dataFolder: join(folder, 'database'), isDurable: false })
})
afterAll(async () => {
  await database?.stop()
  rmSync(folder, { recursive: true, force: true })
})

/** Who the database takes the caller for. @throws Error when it lets nobody in by these settings */
async function letIn(settings: Pick<DatabaseSettings, 'username' | 'password'> & Partial<DatabaseSettings>): Promise<string> {
  const db = createDataSource({ database: '', ...settings })
  try {
    await db.initialize()
    const rows: { who: string }[] = await db.query('SELECT CURRENT_USER() AS who')
    return rows[0]!.who
  } finally {
    if (db.isInitialized) await db.destroy()
  }
}

describe('the local database', () => {
  it.each(['root', '', 'bothways', 'mysql', 'nobody'])(
    'lets nobody in without a password, by its port or socket, as "%s"',
    async (username) => {
      for (const place of [{ host: '127.0.0.1', port: database.port }, { socketPath: database.socketPath }]) {
        await expect(letIn({ ...place, username, password: '' })).rejects.toThrow(/Access denied/)
      }
    },
  )

  it('lets its one user in by the password it was started with, to its own databases alone', async () => {
    const { user: username, password, socketPath, port } = database
    expect(await letIn({ socketPath, username, password, database: 'bothways' })).toBe('bothways@localhost')
    expect(await letIn({ host: '127.0.0.1', port, username, password, database: 'bothways' })).toBe('bothways@127.0.0.1')
    await expect(letIn({ socketPath, username, password, database: 'mysql' })).rejects.toThrow(/Access denied/)
  })
})
