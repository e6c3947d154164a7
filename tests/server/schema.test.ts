import { randomUUID } from 'node:crypto'
import type { DataSource } from 'typeorm'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { createDataSource, POOL_LIMITS } from '../../server/dataSource'
import { MIGRATIONS } from '../../server/migrations/migrationList'
import { migrate } from '../../server/migrate'
import { makeDatabase, testDatabaseSettings } from '../support/testDatabase'

const PATIENT = { ...POOL_LIMITS, queryMs: 30_000 }

describe('schema', () => {
  const settings = testDatabaseSettings(`_schema_${randomUUID().slice(0, 8)}`)
  let db: DataSource

  beforeAll(async () => {
    await makeDatabase(settings)
    db = await createDataSource(settings, PATIENT).initialize()
  })
  afterAll(async () => {
    await db.query(`DROP DATABASE ${settings.database}`)
    await db.destroy()
  })

  const names = async (): Promise<string[]> => {
    const rows: { name: string }[] = await db.query(
      `SELECT table_name AS name FROM information_schema.tables WHERE table_schema = DATABASE() AND table_name <> 'migration'
       UNION SELECT trigger_name FROM information_schema.triggers WHERE trigger_schema = DATABASE()`,
    )
    return rows.map(({ name }) => name)
  }

  it('is built by migrations exactly as the entities describe it', async () => {
    expect(await db.runMigrations({ transaction: 'none' })).toHaveLength(MIGRATIONS.length)
    const { upQueries } = await db.driver.createSchemaBuilder().log()
    expect(upQueries.map(({ query }) => query)).toEqual([])
  })

  it('is built of steps that can each be taken again, as after a kill between a step and its record', async () => {
    await db.query('DELETE FROM migration')
    expect(await db.runMigrations({ transaction: 'none' })).toHaveLength(MIGRATIONS.length)
  })

  it('can be undone step by step down to nothing', async () => {
    for (let left = MIGRATIONS.length; left > 0; left--) await db.undoLastMigration({ transaction: 'none' })
    expect(await names()).toEqual([])
  })

  it('is built once when several processes prepare it at the same moment', async () => {
    const others = await Promise.all([1, 2, 3].map(() => createDataSource(settings, PATIENT).initialize()))
    let inside = 0
    let most = 0
    await Promise.all(
      others.map((other) =>
        migrate(other, async () => {
          most = Math.max(most, ++inside)
          await new Promise((resolve) => setTimeout(resolve, 30))
          inside--
        }),
      ),
    )
    const rows: unknown[] = await db.query('SELECT name FROM migration')
    expect(rows).toHaveLength(MIGRATIONS.length)
    expect(most).toBe(1)
    await Promise.all(others.map((other) => other.destroy()))
  })

  it('keeps one statement to a migration', async () => {
    for (const Migration of MIGRATIONS) {
      const statements: string[] = []
      const runner = { query: (sql: string) => Promise.resolve(statements.push(sql)) }
      await new Migration().up(runner as never)
      expect(statements, Migration.name).toHaveLength(1)
    }
  })

  it('names the firm in the key of every table that belongs to one', async () => {
    const rows: { name: string; columns: string }[] = await db.query(
      `SELECT table_name AS name, GROUP_CONCAT(column_name ORDER BY seq_in_index) AS columns FROM information_schema.statistics
       WHERE table_schema = DATABASE() AND index_name = 'PRIMARY' GROUP BY table_name`,
    )
    const withoutFirm = rows.filter(({ columns }) => !columns.startsWith('firm_id')).map(({ name }) => name)
    expect(withoutFirm.sort()).toEqual(['attempt', 'audit', 'firm', 'migration', 'refresh_token', 'session', 'single_use_token'])
  })
})
