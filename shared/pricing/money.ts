import { Decimal } from './decimal'
import { minorUnit } from './minorUnit'

/**
 * An amount rounded to the currency's minor unit, halves away from zero: 1.005 USD is 1.01, −1.005 USD is −1.01.
 *
 * Source: project rule, rounding at each bill line and markup
 * @param currency - three capital letters
 */
export function roundMoney(amount: Decimal, currency: string): Decimal {
  return amount.toDecimalPlaces(minorUnit(currency))
}

/** An amount as printed: all decimals of the minor unit, no exponent, no sign before zero. */
export function printMoney(amount: Decimal, currency: string): string {
  const rounded = roundMoney(amount, currency)
  return (rounded.isZero() ? new Decimal(0) : rounded).toFixed(minorUnit(currency))
}
