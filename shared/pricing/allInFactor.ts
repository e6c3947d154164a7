import type { Cost } from '../contracts/appraisalResult'
import { Decimal, sumOf } from './decimal'
import { itemisedCost } from './itemisedCost'
import { markupFactor, markupSum } from './markupFactor'

/** A rate at or above this cannot be printed. */
const LARGEST_RATE = new Decimal(10).pow(9)

/**
 * What all markups of a scheme together, sums shared out over the measured work, multiply a rate by, before any rounding. Where sums are
 * so large beside the work that a rate could not be printed, they stand in the amounts alone.
 *
 * Source: project rule, sums are folded in as percentages are, so that neither can be worked back
 */
export function allInFactor(cost: Cost): Decimal {
  const sum = markupSum(cost)
  const factor = markupFactor(cost)
  if (sum.isZero()) return factor
  const { lines } = itemisedCost(cost)
  const measured = sumOf(lines.map(({ quantity, rate }) => new Decimal(quantity).times(rate)))
  if (measured.isZero()) return factor
  const allIn = factor.plus(sum.div(measured))
  return lines.some(({ rate }) => allIn.times(rate).greaterThanOrEqualTo(LARGEST_RATE)) ? factor : allIn
}
