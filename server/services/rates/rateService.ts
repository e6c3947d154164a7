import type { ItemCode } from '#shared/contracts/appraisal'
import type { BuildUp } from '#shared/contracts/buildUp'
import type { Rate, RateInput } from '#shared/contracts/rateBook'
import type { ThreePrices } from '#shared/contracts/resource'
import { builtUpRate } from '#shared/pricing/builtUpRate'
import { unitOf } from '#shared/takeoff/measurementRules'
import type { EntityManager } from 'typeorm'
import { EditionEntity } from '../../entities/rates/EditionEntity'
import { RateEntity } from '../../entities/rates/RateEntity'
import { AppError, refuse } from '../../errors'
import { createOnce, type CreatingRequest } from '../createOnce'
import { requireRole, type SignedIn } from '../session/signedIn'
import { duplicateIndex, inTransaction } from '../transaction'
import { deleteVersioned, updateVersioned } from '../versionedUpdate'
import { buildUpPricesOf, type InEdition } from './buildUpPricesOf'
import { editionCurrency } from './editionCurrency'
import { followChange } from './followChange'
import { rateRefused } from './rateRefused'
import { toRate } from './rateRow'
import { touchDraft } from './touchDraft'

/** Where a rate stands. */
export interface RatePlace {
  readonly editionId: string
  readonly item: ItemCode
}

function rethrowDuplicate(error: unknown): never {
  if (duplicateIndex(error) !== 'PRIMARY') throw error
  throw new AppError('conflict', undefined, [{ path: 'item', message: 'the edition has a rate for this item already' }])
}

/** Overheads and profit are added once: in the rates of an edition that holds them, else by each project. */
async function requireOverheadsOnce(tx: EntityManager, of: InEdition, buildUp: BuildUp): Promise<void> {
  const { holdsOverheads } = await tx.findOneByOrFail(EditionEntity, { firmId: of.firmId, id: of.editionId })
  const issues = (['overheadsPercent', 'profitPercent'] as const)
    .filter((field) => !holdsOverheads && Number(buildUp[field]) > 0)
    .map((field) => ({ path: `buildUp.${field}`, message: 'expected 0: projects add it to the rates of this edition' }))
  if (issues.length > 0) throw new AppError('invalid_request', undefined, issues)
}

async function builtPrice(tx: EntityManager, of: InEdition, buildUp: BuildUp): Promise<ThreePrices> {
  await requireOverheadsOnce(tx, of, buildUp)
  const prices = await buildUpPricesOf(tx, of, [buildUp])
  const currency = await editionCurrency(tx, of.firmId, of.editionId)
  return rateRefused(() => builtUpRate(buildUp, prices, currency)).price
}

/** Columns of a rate as given, with its price as given or as built up. */
async function columnsOf(tx: EntityManager, of: InEdition, item: ItemCode, input: RateInput) {
  const { price, buildUp, ...texts } = input
  if (texts.unit !== unitOf(item)) throw refuse('unit', `expected ${unitOf(item)}, the unit that ${item} is measured in`)
  if (buildUp !== null) return { ...texts, buildUp, ...(await builtPrice(tx, of, buildUp)) }
  if (price === null) throw refuse('price', 'expected either prices or a build-up')
  return { ...texts, buildUp: null, ...price }
}

const read = async (tx: EntityManager, of: InEdition, item: ItemCode): Promise<Rate> =>
  toRate(await tx.findOneByOrFail(RateEntity, { ...of, item }))

/** @throws AppError `not_found`, `conflict` when the item has a rate or the edition is no draft, `invalid_request` */
export async function createRate(
  db: EntityManager,
  who: SignedIn,
  { editionId, item }: RatePlace,
  input: RateInput,
  request: CreatingRequest,
): Promise<Rate> {
  requireRole(who, 'estimator')
  const of = { firmId: who.firmId, editionId }
  return await createOnce(db, who, request, async (tx) => {
    await touchDraft(tx, who, editionId)
    await tx.insert(RateEntity, { ...(await columnsOf(tx, of, item, input)), ...of, item }).catch(rethrowDuplicate)
    await followChange(tx, who, editionId, { what: 'rate', how: 'created', code: item })
    return await read(tx, of, item)
  })
}

/** @throws AppError `not_found`, `stale`, `conflict` when the edition is no draft, `invalid_request` */
export async function changeRate(
  db: EntityManager,
  who: SignedIn,
  { editionId, item }: RatePlace,
  version: number,
  input: RateInput,
): Promise<Rate> {
  requireRole(who, 'estimator')
  const of = { firmId: who.firmId, editionId }
  return await inTransaction(db, async (tx) => {
    await touchDraft(tx, who, editionId)
    await updateVersioned(tx, RateEntity, { ...of, item }, version, await columnsOf(tx, of, item, input))
    await followChange(tx, who, editionId, { what: 'rate', how: 'changed', code: item })
    return await read(tx, of, item)
  })
}

/** @throws AppError `not_found`, `stale`, `conflict` when the edition is no draft */
export async function removeRate(
  db: EntityManager,
  who: SignedIn,
  { editionId, item }: RatePlace,
  version: number,
): Promise<void> {
  requireRole(who, 'estimator')
  const of = { firmId: who.firmId, editionId }
  await inTransaction(db, async (tx) => {
    await touchDraft(tx, who, editionId)
    await deleteVersioned(tx, RateEntity, { ...of, item }, version)
    await followChange(tx, who, editionId, { what: 'rate', how: 'removed', code: item })
  })
}
