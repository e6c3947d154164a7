import type { EntityManager } from 'typeorm'
import { EditionEntity } from '../../entities/rates/EditionEntity'
import { RateBookEntity } from '../../entities/rates/RateBookEntity'

/** Currency of the book that an edition of the firm belongs to. */
export async function editionCurrency(db: EntityManager, firmId: string, editionId: string): Promise<string> {
  const { bookId } = await db.findOneByOrFail(EditionEntity, { firmId, id: editionId })
  return (await db.findOneByOrFail(RateBookEntity, { firmId, id: bookId })).currency
}
