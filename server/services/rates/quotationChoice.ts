import type { RateMove } from '#shared/contracts/resource'
import type { QuotationChoice, ResourceSheet } from '#shared/contracts/resourceSheet'
import type { EntityManager } from 'typeorm'
import { ResourceEntity } from '../../entities/rates/ResourceEntity'
import { AppError } from '../../errors'
import { requireRole, type SignedIn } from '../session/signedIn'
import { inTransaction } from '../transaction'
import { updateVersioned } from '../versionedUpdate'
import { toPriced } from './buildUpPricesOf'
import { takenFrom } from './chosenPrices'
import { followChange } from './followChange'
import { movesWith } from './rateMoves'
import { readableEdition } from './readableEdition'
import { resourceSheetOf } from './resourceList'
import type { PricePlace } from './resourceService'
import { touchDraft } from './touchDraft'

/**
 * Chooses the quotation that a resource takes its price, source and date from, or none: then all three stay as they are, to be typed
 * over. Rates that rest on it follow.
 * @throws AppError `not_found`, `stale`, `conflict`, `invalid_request`
 */
export async function chooseQuotation(
  db: EntityManager,
  who: SignedIn,
  { editionId, code }: PricePlace,
  version: number,
  { quotation }: QuotationChoice,
): Promise<ResourceSheet> {
  requireRole(who, 'estimator')
  const of = { firmId: who.firmId, editionId }
  return await inTransaction(db, async (tx) => {
    await touchDraft(tx, who, editionId)
    await updateVersioned(tx, ResourceEntity, { ...of, code }, version, { quotationId: quotation })
    if (quotation !== null) {
      const { price, source, sourceDate } = await takenFrom(tx, of, code, quotation)
      await tx.update(ResourceEntity, { ...of, code }, { ...price, source, sourceDate })
    }
    await followChange(tx, who, editionId, { what: 'choice', how: 'changed', code })
    return await resourceSheetOf(tx, of, code)
  })
}

/** Which rates a choice would move, and by how much, without saving. @throws AppError `not_found`, `invalid_request` */
export async function previewChoice(
  db: EntityManager,
  who: SignedIn,
  { editionId, code }: PricePlace,
  { quotation }: QuotationChoice,
): Promise<RateMove[]> {
  await readableEdition(db, who, editionId)
  const of = { firmId: who.firmId, editionId }
  const row = await db.findOneBy(ResourceEntity, { ...of, code })
  if (row === null) throw new AppError('not_found')
  if (quotation === null) return []
  const { price } = await takenFrom(db, of, code, quotation)
  return await movesWith(db, of, { resources: new Map([[code, { ...toPriced(row), price }]]) })
}
