import { createDataSource, POOL_LIMITS } from '../server/dataSource'
import { EnvError, readEnv } from '../server/env'
import { migrate } from '../server/migrate'
import { ensureDemoSignIns } from './demo/demoSignIns'
import { ensureDemoFirm } from './demoFirm'

const LONGEST_STEP_MS = 120_000

/** Brings the schema up to date; in the local set-up, loads the demo firm once. */
async function prepareDatabase(): Promise<void> {
  const env = readEnv(process.env)
  const isLocal = env.localMailFolder !== null && env.database.socketPath !== undefined
  const db = createDataSource(env.database, { ...POOL_LIMITS, queryMs: LONGEST_STEP_MS })
  await db.initialize()
  try {
    await migrate(db, async () => {
      if (!isLocal) return
      await ensureDemoFirm(db.manager)
      await ensureDemoSignIns(db, env.dataFolder)
    })
  } finally {
    await db.destroy()
  }
}

prepareDatabase().catch((cause: unknown) => {
  process.stderr.write(`${cause instanceof EnvError ? cause.message : cause instanceof Error ? cause.stack : String(cause)}\n`)
  process.exit(1)
})
