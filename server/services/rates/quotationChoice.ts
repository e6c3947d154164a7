import type { RateMove, ThreePrices } from '#shared/contracts/resource'
import type { QuotationChoice, ResourceSheet } from '#shared/contracts/resourceSheet'
import type { EntityManager } from 'typeorm'
import { QuotationEntity } from '../../entities/rates/QuotationEntity'
import { ResourceEntity } from '../../entities/rates/ResourceEntity'
import { AppError, refuse } from '../../errors'
import { requireRole, type SignedIn } from '../session/signedIn'
import { inTransaction } from '../transaction'
import { updateVersioned } from '../versionedUpdate'
import { toPriced, type InEdition } from './buildUpPricesOf'
import { followChange } from './followChange'
import { quotedPrice, todayUtc } from './quotedPrice'
import { movesWith } from './rateMoves'
import { readableEdition } from './readableEdition'
import { resourceSheetOf } from './resourceList'
import type { PricePlace } from './resourceService'
import { touchDraft } from './touchDraft'

/** What a resource takes over from a quotation chosen for it. @throws AppError `invalid_request` when it is not one of its quotations */
async function takenFrom(db: EntityManager, of: InEdition, code: string, id: string) {
  const all = await db.findBy(QuotationEntity, { ...of, resource: code })
  const chosen = all.find((row) => row.id === id)
  if (chosen === undefined) throw refuse('quotation', `expected a quotation for ${code}, or null for none`)
  const { supplier, reference, day } = chosen
  const source = reference === '' ? supplier : `${supplier}, ${reference}`
  return { price: quotedPrice(chosen, all, todayUtc()) satisfies ThreePrices, source, sourceDate: day }
}

/** Lets a resource with a chosen quotation follow its quotations as they now stand; leaves any other as it is. */
export async function takeChosenPrice(tx: EntityManager, of: InEdition, code: string): Promise<void> {
  const { quotationId, version } = await tx.findOneByOrFail(ResourceEntity, { ...of, code })
  if (quotationId === null) return
  const { price, source, sourceDate } = await takenFrom(tx, of, code, quotationId)
  await updateVersioned(tx, ResourceEntity, { ...of, code }, version, { ...price, source, sourceDate })
}

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
