import type { Cost, ItemCode } from '../contracts/appraisal'
import { Decimal, sumOf } from '../pricing/decimal'

/**
 * Total of a bill before any rounding of money: Σ printed quantity × rate × (1 + preliminaries)(1 + contingency)(1 + tax).
 * It is linear in each rate. With `item` and `rate` the bill is reckoned as if that item cost `rate`.
 *
 * Source: project rule, tipping points rest on unrounded totals
 */
export function unroundedTotal(cost: Cost, item?: ItemCode, rate?: Decimal): Decimal {
  const lines = cost.lines.map((line) => new Decimal(line.quantity).times(line.item === item && rate ? rate : line.rate))
  return sumOf(lines).times(markupFactor(cost))
}

/** What all markups together multiply the measured work by: 1 where there are none. */
export function markupFactor({ markups }: Cost): Decimal {
  return markups.reduce((factor, { percent }) => factor.times(new Decimal(percent).div(100).plus(1)), new Decimal(1))
}
