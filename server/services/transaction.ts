import { QueryFailedError, type EntityManager } from 'typeorm'
import { setTimeout as pause } from 'node:timers/promises'

/** Deadlock, snapshot gone, lock wait too long: the whole transaction may be tried again. */
const REPEATABLE = new Set(['ER_LOCK_DEADLOCK', 'ER_CHECKREAD', 'ER_LOCK_WAIT_TIMEOUT'])
const TRIES = 3

/** The driver's code of a failed query, as `ER_DUP_ENTRY`; undefined for any other error. */
export function driverCode(error: unknown): string | undefined {
  if (!(error instanceof QueryFailedError)) return undefined
  const cause: unknown = error.driverError
  return cause instanceof Error && 'code' in cause && typeof cause.code === 'string' ? cause.code : undefined
}

/** Name of the unique index a failed insert or update ran against; undefined for any other error. */
export function duplicateIndex(error: unknown): string | undefined {
  if (driverCode(error) !== 'ER_DUP_ENTRY' || !(error instanceof Error)) return undefined
  return /for key '(?:\w+\.)?(\w+)'/.exec(error.message)?.[1]
}

/**
 * Result of `work`, which writes with the manager it is given and with no other. A transaction that lost a race is run again
 * from its start, at most three times. Inside a transaction it is a savepoint of the outer one, which is what is run again.
 */
export async function inTransaction<T>(db: EntityManager, work: (tx: EntityManager) => Promise<T>): Promise<T> {
  const isNested = db.queryRunner?.isTransactionActive ?? false
  for (let attempt = 1; ; attempt++) {
    try {
      return await db.transaction(work)
    } catch (error) {
      if (isNested || attempt === TRIES || !REPEATABLE.has(driverCode(error) ?? '')) throw error
      await pause(attempt * 20 * (1 + Math.random()))
    }
  }
}
