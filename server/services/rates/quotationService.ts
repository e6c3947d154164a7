import type { Quotation, QuotationInput } from '#shared/contracts/resource'
import { Decimal } from '#shared/pricing/decimal'
import type { EntityManager } from 'typeorm'
import { v7 } from 'uuid'
import { QuotationEntity } from '../../entities/rates/QuotationEntity'
import { ResourceEntity } from '../../entities/rates/ResourceEntity'
import { AppError, refuse } from '../../errors'
import { createOnce, type CreatingRequest } from '../createOnce'
import { requireRole, type SignedIn } from '../session/signedIn'
import { inTransaction } from '../transaction'
import { deleteVersioned, updateVersioned } from '../versionedUpdate'
import type { InEdition } from './buildUpPricesOf'
import { takeChosenPrice } from './chosenPrices'
import { followChange } from './followChange'
import { unitPrice } from './quotedPrice'
import { toQuotation } from './resourceRows'
import { touchDraft } from './touchDraft'

const MOST_QUOTATIONS = 50
/** The first price that is too large to store. */
const TOO_LARGE = new Decimal(1_000_000_000)

/** Where a quotation stands. */
export interface QuotationPlace {
  readonly editionId: string
  readonly id: string
}

function requireSound(input: QuotationInput): void {
  if (unitPrice(input).gte(TOO_LARGE)) throw refuse('contains', 'expected a price of one unit below 1,000,000,000')
  const { day, validUntil } = input
  if (validUntil !== null && validUntil < day) throw refuse('validUntil', `expected a day not before ${day}`)
}

/** A quotation and the resource it is for. @throws AppError `not_found` */
async function find(db: EntityManager, { firmId, editionId }: InEdition, id: string) {
  const row = await db.findOneBy(QuotationEntity, { firmId, editionId, id })
  if (row === null) throw new AppError('not_found')
  const resource = await db.findOneByOrFail(ResourceEntity, { firmId, editionId, code: row.resource })
  return { row, resource }
}

async function answer(db: EntityManager, of: InEdition, id: string): Promise<Quotation> {
  const { row, resource } = await find(db, of, id)
  return toQuotation(row, resource.quotationId)
}

/** @throws AppError `not_found`, `conflict` when the edition is no draft, `invalid_request`, also for the 51st of a resource */
export async function createQuotation(
  db: EntityManager,
  who: SignedIn,
  editionId: string,
  input: QuotationInput,
  request: CreatingRequest,
): Promise<Quotation> {
  requireRole(who, 'estimator')
  requireSound(input)
  const of = { firmId: who.firmId, editionId }
  return await createOnce(db, who, request, async (tx) => {
    await touchDraft(tx, who, editionId)
    if (!(await tx.existsBy(ResourceEntity, { ...of, code: input.resource }))) {
      throw refuse('resource', `expected the code of a resource of the edition, got ${JSON.stringify(input.resource)}`)
    }
    if ((await tx.countBy(QuotationEntity, { ...of, resource: input.resource })) >= MOST_QUOTATIONS) {
      throw refuse('resource', `expected at most ${MOST_QUOTATIONS} quotations for one resource`)
    }
    const id = v7()
    await tx.insert(QuotationEntity, { ...input, ...of, id })
    await takeChosenPrice(tx, of, input.resource)
    await followChange(tx, who, editionId, { what: 'quotation', how: 'created', code: input.resource })
    return await answer(tx, of, id)
  })
}

/** Changes a quotation, and what rests on it where it counts. @throws AppError `not_found`, `stale`, `conflict`, `invalid_request` */
export async function changeQuotation(
  db: EntityManager,
  who: SignedIn,
  { editionId, id }: QuotationPlace,
  version: number,
  input: QuotationInput,
): Promise<Quotation> {
  requireRole(who, 'estimator')
  requireSound(input)
  const of = { firmId: who.firmId, editionId }
  return await inTransaction(db, async (tx) => {
    await touchDraft(tx, who, editionId)
    const { row } = await find(tx, of, id)
    if (input.resource !== row.resource) throw refuse('resource', `expected ${row.resource}: a quotation stays with its resource`)
    await updateVersioned(tx, QuotationEntity, { ...of, id }, version, input)
    await takeChosenPrice(tx, of, row.resource)
    await followChange(tx, who, editionId, { what: 'quotation', how: 'changed', code: row.resource })
    return await answer(tx, of, id)
  })
}

/** @throws AppError `not_found`, `stale`, `conflict` when it is the chosen one */
export async function removeQuotation(
  db: EntityManager,
  who: SignedIn,
  { editionId, id }: QuotationPlace,
  version: number,
): Promise<void> {
  requireRole(who, 'estimator')
  const of = { firmId: who.firmId, editionId }
  await inTransaction(db, async (tx) => {
    await touchDraft(tx, who, editionId)
    const { row, resource } = await find(tx, of, id)
    if (resource.quotationId === id) {
      const message = `expected a quotation that is not chosen; ${resource.code} takes its price from this one`
      throw new AppError('conflict', 'Choose another quotation, or none, first.', [{ path: 'id', message }])
    }
    await deleteVersioned(tx, QuotationEntity, { ...of, id }, version)
    await takeChosenPrice(tx, of, row.resource)
    await followChange(tx, who, editionId, { what: 'quotation', how: 'removed', code: row.resource })
  })
}
