import type { DataSource, QueryRunner } from 'typeorm'

const WAIT_S = 100

/** @throws Error when another process holds the lock for longer than we wait */
async function holdLock(runner: QueryRunner): Promise<void> {
  const [row]: { isHeld: unknown }[] = await runner.query("SELECT GET_LOCK(CONCAT('bothways.', DATABASE()), ?) AS isHeld", [
    WAIT_S,
  ])
  if (Number(row?.isHeld) !== 1) throw new Error('Another process is preparing the same database.')
}

/**
 * Brings the schema up to date, then does `more`, while no other process does either on the same database. The lock ends with
 * its connection, so that a process that was killed holds up nobody. Stored totals are worked out anew by this engine.
 */
export async function migrate(db: DataSource, more: () => Promise<void> = () => Promise.resolve()): Promise<void> {
  const runner = db.createQueryRunner()
  try {
    await holdLock(runner)
    await db.runMigrations({ transaction: 'none' })
    await db.query('UPDATE project SET totals_version = 0')
    await more()
  } finally {
    await runner.query("SELECT RELEASE_LOCK(CONCAT('bothways.', DATABASE()))")
    await runner.release()
  }
}
