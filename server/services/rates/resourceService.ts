import type { Resource, ResourceInput, RateMove } from '#shared/contracts/resource'
import type { EntityManager } from 'typeorm'
import { ResourceEntity } from '../../entities/rates/ResourceEntity'
import { QuotationEntity } from '../../entities/rates/QuotationEntity'
import { AppError, refuse } from '../../errors'
import { createOnce, type CreatingRequest } from '../createOnce'
import { plainDecimal } from '../decimalText'
import { requireRole, type SignedIn } from '../session/signedIn'
import { duplicateIndex, inTransaction } from '../transaction'
import { deleteVersioned, updateVersioned } from '../versionedUpdate'
import type { InEdition } from './buildUpPricesOf'
import { followChange } from './followChange'
import { movesWith } from './rateMoves'
import { readableEdition } from './readableEdition'
import { toResource } from './resourceRows'
import { requireNothingRests, restingOnResource } from './restingOn'
import { touchDraft } from './touchDraft'

/** Where a resource or a gang stands. */
export interface PricePlace {
  readonly editionId: string
  readonly code: string
}

function rethrowDuplicate(error: unknown): never {
  if (duplicateIndex(error) !== 'PRIMARY') throw error
  throw new AppError('conflict', undefined, [{ path: 'code', message: 'another resource of the edition has this code' }])
}

const columnsOf = ({ price, code, kind, description, unit, source, sourceDate }: ResourceInput) => ({
  ...{ code, kind, description, unit, source, sourceDate },
  ...price,
})

/** Hours are what labour and plant are priced by. */
function requireUnit({ kind, unit }: ResourceInput): void {
  if (kind !== 'material' && unit !== 'h') throw refuse('unit', `expected h, since ${kind} is priced by the hour`)
}

async function find(db: EntityManager, of: InEdition, code: string): Promise<ResourceEntity> {
  const row = await db.findOneBy(ResourceEntity, { ...of, code })
  if (row === null) throw new AppError('not_found')
  return row
}

/** What cannot change: the code ever, kind and unit while something counts in them, the price while a quotation gives it. */
async function requireChangeable(db: EntityManager, of: InEdition, row: ResourceEntity, input: ResourceInput): Promise<void> {
  requireUnit(input)
  if (input.code !== row.code) throw refuse('code', `expected ${row.code}: a code stays; make another resource instead`)
  const { price } = toResource(row)
  const isPriced = (['low', 'likely', 'high'] as const).every((level) => plainDecimal(input.price[level]) === price[level])
  if (row.quotationId !== null && !isPriced) {
    throw refuse('price', 'expected the price of the chosen quotation; choose none to type a price')
  }
  if (input.kind !== row.kind) requireNothingRests(await restingOnResource(db, of, row.code), 'kind')
  if (input.unit !== row.unit) requireNothingRests(await restingOnResource(db, of, row.code), 'unit')
}

/** @throws AppError `not_found`, `conflict` when the code is taken or the edition is no draft, `invalid_request` */
export async function createResource(
  db: EntityManager,
  who: SignedIn,
  editionId: string,
  input: ResourceInput,
  request: CreatingRequest,
): Promise<Resource> {
  requireRole(who, 'estimator')
  requireUnit(input)
  const of = { firmId: who.firmId, editionId }
  return await createOnce(db, who, request, async (tx) => {
    await touchDraft(tx, who, editionId)
    await tx.insert(ResourceEntity, { ...columnsOf(input), ...of }).catch(rethrowDuplicate)
    await followChange(tx, who, editionId, { what: 'resource', how: 'created', code: input.code })
    return toResource(await find(tx, of, input.code))
  })
}

/** Changes a resource and every rate that rests on it. @throws AppError `not_found`, `stale`, `conflict`, `invalid_request` */
export async function changeResource(
  db: EntityManager,
  who: SignedIn,
  { editionId, code }: PricePlace,
  version: number,
  input: ResourceInput,
): Promise<Resource> {
  requireRole(who, 'estimator')
  const of = { firmId: who.firmId, editionId }
  return await inTransaction(db, async (tx) => {
    await touchDraft(tx, who, editionId)
    const row = await find(tx, of, code)
    if (row.version !== version) throw new AppError('stale')
    await requireChangeable(tx, of, row, input)
    await updateVersioned(tx, ResourceEntity, { ...of, code }, version, columnsOf(input))
    await followChange(tx, who, editionId, { what: 'resource', how: 'changed', code })
    return toResource(await find(tx, of, code))
  })
}

/** Removes a resource with its quotations. @throws AppError `not_found`, `stale`, `conflict` that names what rests on it */
export async function removeResource(
  db: EntityManager,
  who: SignedIn,
  { editionId, code }: PricePlace,
  version: number,
): Promise<void> {
  requireRole(who, 'estimator')
  const of = { firmId: who.firmId, editionId }
  await inTransaction(db, async (tx) => {
    await touchDraft(tx, who, editionId)
    const row = await find(tx, of, code)
    if (row.version !== version) throw new AppError('stale')
    requireNothingRests(await restingOnResource(tx, of, code), 'code')
    await tx.delete(QuotationEntity, { ...of, resource: code })
    await deleteVersioned(tx, ResourceEntity, { ...of, code }, version)
    await followChange(tx, who, editionId, { what: 'resource', how: 'removed', code })
  })
}

/** Which rates a changed resource would move, and by how much, without saving; in a fixed edition a question only. */
export async function previewResource(
  db: EntityManager,
  who: SignedIn,
  { editionId, code }: PricePlace,
  input: ResourceInput,
): Promise<RateMove[]> {
  await readableEdition(db, who, editionId)
  const of = { firmId: who.firmId, editionId }
  await requireChangeable(db, of, await find(db, of, code), input)
  return await movesWith(db, of, { resources: new Map([[code, input]]) })
}
