import { formatDay } from '../base/formatMoment'

/** Where a price comes from in time: day of the price, and the last day that a quotation holds; ISO dates. */
export interface PriceDates {
  readonly sourceDate: string | null
  readonly validUntil?: string | null
}

/** The same day a year before. */
const yearBefore = (day: string): string => `${Number(day.slice(0, 4)) - 1}${day.slice(4)}`

/**
 * Why a price should be asked for again, in words; null while it need not: its quotation has run out, or its source is older than a
 * year.
 * @param today - ISO date
 */
export function priceAgeInWords({ sourceDate, validUntil = null }: PriceDates, today: string): string | null {
  if (validUntil !== null && validUntil < today) return `the quotation ran out on ${formatDay(validUntil)}`
  if (sourceDate !== null && sourceDate < yearBefore(today)) return `price of ${formatDay(sourceDate)}, older than a year`
  return null
}

/** Today, as an ISO date. */
export const isoToday = (): string => new Date().toISOString().slice(0, 10)
