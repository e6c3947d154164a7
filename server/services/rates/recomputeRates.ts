import type { ItemCode } from '#shared/contracts/appraisal'
import type { RateMove } from '#shared/contracts/resource'
import type { EntityManager } from 'typeorm'
import { RateEntity } from '../../entities/rates/RateEntity'
import { movesWith } from './rateMoves'

/**
 * Works out every built-up rate of a draft again from its resources and gangs as they stand in this transaction, and stores what
 * moved. The version of a rate stays: it guards what an estimator typed, and a computed price is not typed.
 * @returns what moved, from the price stored before
 * @throws AppError `conflict` where a build-up can no longer be worked out
 */
export async function recomputeRates(tx: EntityManager, firmId: string, editionId: string): Promise<RateMove[]> {
  const moves = await movesWith(tx, { firmId, editionId })
  for (const { item, after } of moves) await tx.update(RateEntity, { firmId, editionId, item: item as ItemCode }, after)
  return moves
}
