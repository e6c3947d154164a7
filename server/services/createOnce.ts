import type { EntityManager } from 'typeorm'
import { IdempotencyEntity } from '../entities/IdempotencyEntity'
import { AppError } from '../errors'
import type { SignedIn } from './session/signedIn'
import { sha256 } from './sha256'
import { duplicateIndex, inTransaction } from './transaction'

/** A creating request: the caller's key, if one was sent, and all that was asked. */
export interface CreatingRequest {
  readonly key: string | undefined
  readonly asked: unknown
}

async function replayed<T>(db: EntityManager, who: SignedIn, keyHash: string, requestHash: string): Promise<T | undefined> {
  const row = await db.findOneBy(IdempotencyEntity, { firmId: who.firmId, personId: who.personId, keyHash })
  if (row === null) return undefined
  if (row.requestHash !== requestHash) {
    throw new AppError('out_of_scope', 'This Idempotency-Key was used for another request.', [
      { path: 'Idempotency-Key', message: 'expected a new key, since the request is another one' },
    ])
  }
  return row.answer as T
}

/**
 * What `create` makes, exactly once for one key of one person: the same request again, even at the same moment, gets the first answer.
 * @throws AppError `out_of_scope` when the key was used for another request
 */
export async function createOnce<T>(
  db: EntityManager,
  who: SignedIn,
  request: CreatingRequest,
  create: (tx: EntityManager) => Promise<T>,
): Promise<T> {
  if (request.key === undefined) return await inTransaction(db, create)
  const keyHash = sha256(request.key)
  const requestHash = sha256(JSON.stringify(request.asked))
  const earlier = await replayed<T>(db, who, keyHash, requestHash)
  if (earlier !== undefined) return earlier
  const row = { firmId: who.firmId, personId: who.personId, keyHash }
  try {
    return await inTransaction(db, async (tx) => {
      await tx.insert(IdempotencyEntity, { ...row, requestHash, answer: {}, createdAt: new Date() })
      const answer = await create(tx)
      await tx.update(IdempotencyEntity, row, { answer: answer as object })
      return answer
    })
  } catch (error) {
    if (duplicateIndex(error) !== 'PRIMARY') throw error
    const first = await replayed<T>(db, who, keyHash, requestHash)
    if (first === undefined) throw error
    return first
  }
}
