import type { ItemCode } from '../contracts/appraisal'
import type { Cost } from '../contracts/appraisalResult'
import { Decimal, sumOf } from '../pricing/decimal'
import { itemisedCost } from '../pricing/itemisedCost'
import { markupFactor, markupSum } from '../pricing/markupFactor'

export { markupFactor }

/**
 * Total of a bill before any rounding of money: Σ printed quantity × rate × the percentages of all markups, and the sums among these
 * with the percentages charged on them. It is affine in each rate. With `item` and `rate` the bill is reckoned as if that item cost `rate`.
 *
 * Source: project rule, tipping points rest on unrounded totals
 */
export function unroundedTotal(cost: Cost, item?: ItemCode, rate?: Decimal): Decimal {
  const lines = itemisedCost(cost).lines.map((line) =>
    new Decimal(line.quantity).times(line.item === item && rate ? rate : line.rate),
  )
  return sumOf(lines).times(markupFactor(cost)).plus(markupSum(cost))
}
