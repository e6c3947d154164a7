import { Decimal as DecimalLibrary } from 'decimal.js'

/**
 * The engine's decimal number: 40 significant digits, halves rounded away from zero, never written with an exponent.
 * A clone, so that no other code can change its settings.
 *
 * Source: project rule, money is exact from the rate to the total.
 */
export const Decimal = DecimalLibrary.clone({
  precision: 40,
  rounding: DecimalLibrary.ROUND_HALF_UP,
  toExpNeg: -9e15,
  toExpPos: 9e15,
  defaults: true,
})
export type Decimal = DecimalLibrary

/** Sum of decimals; zero for none. */
export function sumOf(values: readonly Decimal[]): Decimal {
  return values.reduce((sum, value) => sum.plus(value), new Decimal(0))
}
