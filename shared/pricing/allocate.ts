import { Decimal, sumOf } from './decimal'

/**
 * A total shared out in proportion to weights, in whole steps, so that the shares add up to the total exactly: each share is
 * rounded down, and the steps left over go one each to the largest remainders (the earlier of equal ones first).
 *
 * Source: method of the largest remainder; project rule, parts add up to the whole
 * @param total - a whole number of steps, ≥ 0
 * @param weights - ≥ 0, at least one > 0
 * @param decimals - of a step: 2 shares out hundredths
 * @throws RangeError when the total is not a whole number of steps or no weight is positive
 */
export function allocate(total: Decimal, weights: readonly Decimal[], decimals: number): Decimal[] {
  const whole = sumOf(weights)
  if (!whole.isPositive() || whole.isZero()) throw new RangeError('expected at least one weight above zero')
  if (total.decimalPlaces() > decimals) throw new RangeError(`expected a total of at most ${decimals} decimals`)
  const exact = weights.map((weight) => total.times(weight).div(whole))
  const shares = exact.map((share) => share.toDecimalPlaces(decimals, Decimal.ROUND_FLOOR))
  const step = new Decimal(10).pow(-decimals)
  const left = total.minus(sumOf(shares)).div(step).toNumber()
  const byRemainder = exact
    .map((share, index) => ({ index, remainder: share.minus(shares[index]!) }))
    .sort((a, b) => b.remainder.comparedTo(a.remainder) || a.index - b.index)
  const favoured = new Set(byRemainder.slice(0, left).map(({ index }) => index))
  return shares.map((share, index) => (favoured.has(index) ? share.plus(step) : share))
}
