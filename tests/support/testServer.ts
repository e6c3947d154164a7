import { tmpdir } from 'node:os'
import { join } from 'node:path'
import type { Express } from 'express'
import type { DataSource } from 'typeorm'
import { createApp } from '../../server/app'
import type { Env } from '../../server/env'
import { createLog } from '../../server/log'
import { createAppraisalPool, type PoolBounds } from '../../server/services/appraisal/appraisalPool'
import { openTestDatabase, testDatabaseSettings } from './testDatabase'

export interface TestServer {
  readonly app: Express
  readonly db: DataSource
  readonly env: Env
  close(): Promise<void>
}

/** Settings of a server under test. */
export function testEnv(changed: Partial<Env> = {}): Env {
  return {
    host: '127.0.0.1',
    port: 0,
    origin: 'http://127.0.0.1:4280',
    isHttps: false,
    database: testDatabaseSettings(),
    sessionSecret: 'a secret of tests, at least thirty-two bytes long',
    smtpUrl: null,
    mailFrom: 'Bothways <bothways@example.test>',
    localMailFolder: '/nonexistent',
    dataFolder: join(tmpdir(), `bothways-test-${process.pid}`),
    chromiumPath: '/usr/bin/chromium',
    clientFolder: '/nonexistent',
    trustedProxies: 0,
    logLevel: 'silent',
    ...changed,
  }
}

/** The whole application on this worker's database, not listening: the test client opens a port of its own each time. */
export async function openTestServer(changed: Partial<Env> = {}, bounds?: PoolBounds): Promise<TestServer> {
  const env = testEnv(changed)
  const db = await openTestDatabase()
  const appraisals = createAppraisalPool(bounds)
  const app = createApp({ db, env, appraisals, log: createLog('silent') })
  return {
    app,
    db,
    env,
    async close() {
      await appraisals.close()
      await db.destroy()
    },
  }
}
