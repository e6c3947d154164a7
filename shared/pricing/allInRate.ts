import { Decimal } from './decimal'
import { minorUnit } from './minorUnit'

/** A rate is printed with at least this many significant digits. */
const RATE_DIGITS = 4
/** Most decimals of a rate in the contract. */
const MOST_RATE_DECIMALS = 6

/**
 * A rate with markups folded in, as printed: to the minor unit or to four significant digits, whichever is finer.
 *
 * Source: project rule, no more digits than explain the amounts, so that markups cannot be worked back
 * @param factor - of all markups together, ≥ 1
 */
export function allInRate(rate: string, factor: Decimal, currency: string): string {
  const allIn = new Decimal(rate).times(factor)
  const decimals = allIn.isZero() ? 0 : RATE_DIGITS - 1 - allIn.e
  return allIn.toFixed(Math.min(MOST_RATE_DECIMALS, Math.max(minorUnit(currency), decimals)))
}
