import type { EntityManager } from 'typeorm'
import { QuotationEntity } from '../../entities/rates/QuotationEntity'
import { ResourceEntity } from '../../entities/rates/ResourceEntity'
import { refuse } from '../../errors'
import { plainDecimal } from '../decimalText'
import { updateVersioned } from '../versionedUpdate'
import type { InEdition } from './buildUpPricesOf'
import { quotedPrice, todayUtc } from './quotedPrice'

/** What a resource takes over from a quotation chosen for it. @throws AppError `invalid_request` when it is not one of its quotations */
export async function takenFrom(db: EntityManager, of: InEdition, code: string, id: string) {
  const all = await db.findBy(QuotationEntity, { ...of, resource: code })
  const chosen = all.find((row) => row.id === id)
  if (chosen === undefined) throw refuse('quotation', `expected a quotation for ${code}, or null for none`)
  const { supplier, reference, day } = chosen
  const source = reference === '' ? supplier : `${supplier}, ${reference}`
  return { price: quotedPrice(chosen, all, todayUtc()), source, sourceDate: day }
}

/** Lets a resource with a chosen quotation follow its quotations as they now stand; leaves any other, and one that need not move, as it is. */
export async function takeChosenPrice(tx: EntityManager, of: InEdition, code: string): Promise<void> {
  const row = await tx.findOneByOrFail(ResourceEntity, { ...of, code })
  if (row.quotationId === null) return
  const { price, source, sourceDate } = await takenFrom(tx, of, code, row.quotationId)
  const isSame =
    (['low', 'likely', 'high'] as const).every((level) => plainDecimal(row[level]) === price[level]) &&
    row.source === source &&
    row.sourceDate === sourceDate
  if (!isSame) await updateVersioned(tx, ResourceEntity, { ...of, code }, row.version, { ...price, source, sourceDate })
}
