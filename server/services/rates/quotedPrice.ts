import type { ThreePrices } from '#shared/contracts/resource'
import { Decimal } from '#shared/pricing/decimal'
import type { QuotationEntity } from '../../entities/rates/QuotationEntity'

/** Decimals that a price is stored with. */
const STORED_DECIMALS = 6

/** Price of one unit of the resource by a quotation, as it is stored. */
export const unitPrice = ({ price, contains }: Pick<QuotationEntity, 'price' | 'contains'>): Decimal =>
  new Decimal(price).div(contains).toDecimalPlaces(STORED_DECIMALS)

/**
 * The price of a resource by its chosen quotation: likely what that says, low and high the least and the most of the quotations that
 * hold on `today`. The chosen one counts even when it has run out.
 *
 * Source: project rule
 * @param today - ISO date
 */
export function quotedPrice(chosen: QuotationEntity, all: readonly QuotationEntity[], today: string): ThreePrices {
  const current = all.filter(({ id, validUntil }) => id === chosen.id || validUntil === null || validUntil >= today)
  const prices = current.map(unitPrice)
  const [low, high] = [Decimal.min(...prices), Decimal.max(...prices)]
  return { low: low.toFixed(), likely: unitPrice(chosen).toFixed(), high: high.toFixed() }
}

/** Today's date by the clock, UTC. */
export const todayUtc = (): string => new Date().toISOString().slice(0, 10)
