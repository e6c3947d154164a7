import type { ItemCode } from '../contracts/appraisal'
import type { Comparison, Cost, SchemeResult, TippingPoint } from '../contracts/appraisalResult'
import { allInCost } from '../pricing/allInCost'
import { allInFactor } from '../pricing/allInFactor'
import { allInRate } from '../pricing/allInRate'
import { Decimal } from '../pricing/decimal'
import { itemisedCost } from '../pricing/itemisedCost'
import { compareSchemes } from './compareSchemes'
import { ledger } from './ledger'

/** A tipping point at or above this cannot be printed as a rate. */
const LARGEST_RATE = new Decimal(10).pow(9)

/**
 * `compareSchemes` for readers who may not see margins: the ledger runs over all-in amounts, without markups, to the same
 * difference; rates and tipping points are reckoned on the full figures and then multiplied as the all-in rate of the item is.
 * Null where one of the schemes is not priced.
 *
 * @param first - with markups, as priced; both under the same markups
 */
export function compareAllIn(first: SchemeResult, second: SchemeResult): Comparison | null {
  const comparison = compareSchemes(first, second)
  if (!comparison || !first.cost || !second.cost) return null
  const costs = [first.cost, second.cost]
  return {
    between: comparison.between,
    ledger: ledger(itemisedCost(allInCost(first.cost)), itemisedCost(allInCost(second.cost))),
    tippingPoints: comparison.tippingPoints.map((point) =>
      allInPoint(point, costs.find((cost) => has(cost, point.item)) ?? costs[0]!),
    ),
  }
}

function allInPoint({ item, rate, value, cheaperBelow }: TippingPoint, cost: Cost): TippingPoint {
  const factor = allInFactor(cost)
  const now = allInRate(rate, factor, cost.currency)
  if (value === null || new Decimal(value).times(factor).greaterThanOrEqualTo(LARGEST_RATE)) {
    return { item, rate: now, value: null, cheaperBelow: null }
  }
  return { item, rate: now, value: allInRate(value, factor, cost.currency), cheaperBelow }
}

function has(cost: Cost, item: ItemCode): boolean {
  return itemisedCost(cost).lines.some((line) => line.item === item)
}
