import type { Rates } from '../contracts/appraisal'
import type { SchemeRates } from './priceScheme'

/** The rates that one scheme is priced by: its own go before those of all. */
export function ratesOfScheme({ currency, items, byScheme, markups }: Rates, mark: string, weeks?: string): SchemeRates {
  const own = Object.hasOwn(byScheme, mark) ? byScheme[mark] : undefined
  return {
    currency,
    items: own === undefined ? items : { ...items, ...own },
    markups,
    ...(weeks === undefined ? {} : { weeks }),
  }
}
