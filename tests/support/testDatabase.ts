import type { DataSource } from 'typeorm'
import { inject } from 'vitest'
import { createDataSource, POOL_LIMITS, type PoolLimits } from '../../server/dataSource'
import type { DatabaseSettings } from '../../server/env'

const PATIENT: PoolLimits = { ...POOL_LIMITS, queryMs: 20_000 }

/** Settings of a database of this worker; `name` tells several of one worker apart. */
export function testDatabaseSettings(name = ''): DatabaseSettings {
  return { ...inject('database'), database: `bothways_test_${process.env['VITEST_POOL_ID'] ?? '0'}${name}` }
}

/** Makes the database where it is not there yet. */
export async function makeDatabase(settings: DatabaseSettings): Promise<void> {
  const outside = await createDataSource({ ...settings, database: 'bothways' }, PATIENT).initialize()
  await outside.query(`CREATE DATABASE IF NOT EXISTS ${settings.database}`)
  await outside.destroy()
}

/** This worker's database, migrated. Rows of earlier tests stay: every test makes a firm of its own and sees nothing else. */
export async function openTestDatabase(limits: PoolLimits = PATIENT): Promise<DataSource> {
  const settings = testDatabaseSettings()
  await makeDatabase(settings)
  const db = await createDataSource(settings, limits).initialize()
  await db.runMigrations({ transaction: 'none' })
  return db
}
