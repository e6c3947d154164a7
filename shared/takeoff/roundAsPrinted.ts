/** Digits that a measured figure is good for; what float arithmetic leaves behind them is noise. */
const SIGNIFICANT_DIGITS = 12

/**
 * A measured figure rounded to the decimals it is printed with, halves away from zero.
 * Noise of binary arithmetic is taken off first: 2.675 and 2.6749999999999998 both print as 2.68.
 *
 * Source: project rule, quantities are priced as printed
 * @param decimals - 0 to 6
 */
export function roundAsPrinted(value: number, decimals: number): number {
  if (Number.isInteger(value)) return value
  const scale = 10 ** decimals
  const scaled = Number((Math.abs(value) * scale).toPrecision(SIGNIFICANT_DIGITS))
  const rounded = Math.floor(scaled + 0.5) / scale
  return value < 0 && rounded !== 0 ? -rounded : rounded
}
