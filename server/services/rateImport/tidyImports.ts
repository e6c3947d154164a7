import type { ImportState } from '#shared/contracts/rateImport'
import { In, LessThan, type EntityManager } from 'typeorm'
import { RateImportEntity } from '../../entities/rates/RateImportEntity'

/** A step takes seconds: one that was begun that long ago was broken off with the server it ran on. */
const BROKEN_OFF_MS = 15 * 60_000
const UNUSED_MS = 30 * 24 * 3_600_000
const BACK: readonly (readonly [ImportState, ImportState])[] = [
  ['reading', 'failed'],
  ['checking', 'matching'],
  ['committing', 'previewed'],
]

/** Lets imports go on whose step was broken off, and removes those that nobody put in for a month. */
export async function tidyImports(db: EntityManager, now: Date): Promise<void> {
  const touchedAt = LessThan(new Date(now.getTime() - BROKEN_OFF_MS))
  const failure = 'The server was stopped while it worked on this. Nothing was changed; try again.'
  for (const [state, back] of BACK) {
    await db.update(RateImportEntity, { state, touchedAt }, { state: back, progress: 0, failure, touchedAt: now })
  }
  const unused = LessThan(new Date(now.getTime() - UNUSED_MS))
  await db.delete(RateImportEntity, { state: In(['failed', 'matching', 'previewed']), touchedAt: unused })
}
