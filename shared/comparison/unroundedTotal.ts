import type { Cost, ItemCode } from '../contracts/appraisal'
import { Decimal, sumOf } from '../pricing/decimal'
import { itemisedCost } from '../pricing/itemisedCost'
import { markupFactor } from '../pricing/markupFactor'

export { markupFactor }

/**
 * Total of a bill before any rounding of money: Σ printed quantity × rate × (1 + preliminaries)(1 + contingency)(1 + tax).
 * It is linear in each rate. With `item` and `rate` the bill is reckoned as if that item cost `rate`.
 *
 * Source: project rule, tipping points rest on unrounded totals
 */
export function unroundedTotal(cost: Cost, item?: ItemCode, rate?: Decimal): Decimal {
  const lines = itemisedCost(cost).lines.map((line) =>
    new Decimal(line.quantity).times(line.item === item && rate ? rate : line.rate),
  )
  return sumOf(lines).times(markupFactor(cost))
}
