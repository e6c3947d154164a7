import type { RateBook, RateBookInput } from '#shared/contracts/rateBook'
import type { EntityManager } from 'typeorm'
import { v7 } from 'uuid'
import { RateBookEntity } from '../../entities/rates/RateBookEntity'
import { AppError } from '../../errors'
import { recordEvent } from '../auditLog'
import { createOnce, type CreatingRequest } from '../createOnce'
import { requireRole, type SignedIn } from '../session/signedIn'
import { duplicateIndex } from '../transaction'

function rethrowDuplicate(error: unknown): never {
  if (duplicateIndex(error) !== 'uq_rate_book_region') throw error
  throw new AppError('conflict', undefined, [{ path: 'region', message: 'the firm has a rate book of this region already' }])
}

/** A new book without an edition. @throws AppError `forbidden`, `conflict` when the region has a book */
export async function createRateBook(
  db: EntityManager,
  who: SignedIn,
  input: RateBookInput,
  request: CreatingRequest,
): Promise<RateBook> {
  requireRole(who, 'estimator')
  return await createOnce(db, who, request, async (tx) => {
    const book = { id: v7(), ...input }
    await tx.insert(RateBookEntity, { ...book, firmId: who.firmId }).catch(rethrowDuplicate)
    const { firmId, personId } = who
    await recordEvent(tx, { event: 'rateBook.made', firmId, personId, detail: book })
    return { ...book, editions: [] }
  })
}
