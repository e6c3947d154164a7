import type { BuildUp } from '#shared/contracts/buildUp'
import type { RateMove, ThreePrices } from '#shared/contracts/resource'
import { builtUpRate } from '#shared/pricing/builtUpRate'
import type { BuildUpPrices, PricedGang, PricedResource } from '#shared/pricing/buildUpPrices'
import { BuildUpRefusedError } from '#shared/pricing/buildUpRefused'
import type { EntityManager } from 'typeorm'
import { RateEntity } from '../../entities/rates/RateEntity'
import { AppError } from '../../errors'
import { plainDecimal } from '../decimalText'
import { buildUpPricesOf, type InEdition } from './buildUpPricesOf'
import { editionCurrency } from './editionCurrency'

type BuiltRate = RateEntity & { buildUp: BuildUp }

const isBuiltUp = (row: RateEntity): row is BuiltRate => row.buildUp !== null

/** Resources and gangs as they would be, by their codes. */
export interface ProposedPrices {
  readonly resources?: ReadonlyMap<string, PricedResource>
  readonly gangs?: ReadonlyMap<string, PricedGang>
}

function priceOf({ item, buildUp }: BuiltRate, prices: BuildUpPrices, currency: string): ThreePrices {
  try {
    const { low, likely, high } = builtUpRate(buildUp, prices, currency).price
    return { low: plainDecimal(low), likely: plainDecimal(likely), high: plainDecimal(high) }
  } catch (error) {
    if (!(error instanceof BuildUpRefusedError)) throw error
    const issues = error.issues.map(({ path, message }) => ({
      path: ['rates', item, path].filter((step) => step !== '').join('.'),
      message,
    }))
    throw new AppError('conflict', `The rate of ${item} could not be worked out any more.`, issues)
  }
}

function moveOf(row: BuiltRate, prices: BuildUpPrices, currency: string): RateMove[] {
  const { item, description, unit } = row
  const before = { low: plainDecimal(row.low), likely: plainDecimal(row.likely), high: plainDecimal(row.high) }
  const after = priceOf(row, prices, currency)
  const isMoved = before.low !== after.low || before.likely !== after.likely || before.high !== after.high
  return isMoved ? [{ item, description, unit, before, after }] : []
}

/**
 * Which built-up rates of an edition move, and by how much: from the stored price to the one that its resources and gangs make as they
 * stand, or as they are proposed. Nothing is written.
 * @throws AppError `conflict` that names the rate, where a build-up could no longer be worked out
 */
export async function movesWith(db: EntityManager, of: InEdition, proposed: ProposedPrices = {}): Promise<RateMove[]> {
  const built = (await db.find(RateEntity, { where: of, order: { item: 'ASC' } })).filter(isBuiltUp)
  if (built.length === 0) return []
  const buildUps = built.map(({ buildUp }) => buildUp)
  const stored = await buildUpPricesOf(db, of, buildUps, proposed.gangs)
  const prices = { ...stored, resources: new Map([...stored.resources, ...(proposed.resources ?? [])]) }
  const currency = await editionCurrency(db, of.firmId, of.editionId)
  return built.flatMap((row) => moveOf(row, prices, currency))
}
