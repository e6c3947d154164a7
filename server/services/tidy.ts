import { IsNull, LessThan, Not, type EntityManager } from 'typeorm'
import { IdempotencyEntity } from '../entities/IdempotencyEntity'
import { AttemptEntity } from '../entities/session/AttemptEntity'
import { SessionEntity } from '../entities/session/SessionEntity'
import { SingleUseTokenEntity } from '../entities/session/SingleUseTokenEntity'

const DAY_MS = 24 * 3600 * 1000

/** Removes what has run out a day ago and answers nothing any more: counted attempts, keys, sessions with their tokens, links. */
export async function tidy(db: EntityManager, now: Date): Promise<void> {
  const before = new Date(now.getTime() - DAY_MS)
  await db.delete(AttemptEntity, { windowStart: LessThan(before) })
  await db.delete(IdempotencyEntity, { createdAt: LessThan(before) })
  await db.delete(SessionEntity, { expiresAt: LessThan(before) })
  await db.delete(SessionEntity, { revokedAt: LessThan(before) })
  await db.delete(SingleUseTokenEntity, { expiresAt: LessThan(before) })
  await db.delete(SingleUseTokenEntity, { usedAt: Not(IsNull()), createdAt: LessThan(before) })
}
