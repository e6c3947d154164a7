import type { Quotation } from '#shared/contracts/resource'
import { Decimal } from '#shared/pricing/decimal'
import { formatDay } from '../base/formatMoment'
import { priceAgeInWords } from './priceAgeInWords'

/** Quotations for a resource as they stand side by side: price of one unit, how far over the cheapest, until when. @param today - ISO date */
export function quotationRows(quotations: readonly Quotation[], today: string) {
  const priced = quotations.map((quotation) => ({ quotation, unit: new Decimal(quotation.price).div(quotation.contains) }))
  const least = priced.length === 0 ? new Decimal(0) : Decimal.min(...priced.map(({ unit }) => unit))
  return priced.map(({ quotation, unit }) => {
    const over = least.isZero() ? null : unit.div(least).minus(1).times(100)
    const dates = { sourceDate: quotation.day, validUntil: quotation.validUntil }
    return {
      quotation,
      unitPrice: unit.toDecimalPlaces(6).toFixed(),
      over: over === null || over.isZero() ? 'cheapest' : `+${over.toFixed(1)}%`,
      holds: quotation.validUntil === null ? 'no end' : `until ${formatDay(quotation.validUntil)}`,
      flag: priceAgeInWords(dates, today),
    }
  })
}
