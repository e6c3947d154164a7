import type { ItemCode } from '../contracts/appraisal'
import type { Cost, TippingPoint } from '../contracts/appraisalResult'
import { Decimal } from '../pricing/decimal'
import { markupFactor, unroundedTotal } from './unroundedTotal'

/** A priced scheme, as far as tipping points need it. */
export interface PricedScheme {
  readonly mark: string
  readonly cost: Cost
}

/** Decimals and size of a rate in the contract. */
const RATE_DECIMALS = 6
const LARGEST_RATE = new Decimal(10).pow(9)

/**
 * The rate of an item at which two schemes cost the same, all else held: r* = r − (C₁ − C₂) / (∂C₁/∂r − ∂C₂/∂r), on unrounded
 * totals with markups in. `value` is null where the rate moves both alike, where r* is not above zero, or where it is beyond any
 * rate that can be typed (10⁹). Where the schemes have rates of their own for it, r is the first's, and both move alike. Below r* the scheme that takes more of the item is the cheaper one.
 *
 * Source: linear equation of the two totals; project rule, sizes and quantities are held fixed
 * @throws RangeError when neither bill prices the item
 */
export function tippingPoint(item: ItemCode, first: PricedScheme, second: PricedScheme): TippingPoint {
  const line = [...first.cost.lines, ...second.cost.lines].find((candidate) => candidate.item === item)
  if (line === undefined) throw new RangeError(`expected a bill with a rate for ${item}`)
  const slope = slopeOf(first.cost, item).minus(slopeOf(second.cost, item))
  const none = { item, rate: line.rate, value: null, cheaperBelow: null }
  if (slope.isZero()) return none
  const difference = unroundedTotal(first.cost).minus(unroundedTotal(second.cost))
  const value = new Decimal(line.rate).minus(difference.div(slope)).toDecimalPlaces(RATE_DECIMALS)
  if (value.lessThanOrEqualTo(0) || value.greaterThanOrEqualTo(LARGEST_RATE)) return none
  return { item, rate: line.rate, value: value.toFixed(), cheaperBelow: slope.isPositive() ? first.mark : second.mark }
}

/** What one more unit of currency on the rate adds to the total: printed quantity × markups. */
function slopeOf(cost: Cost, item: ItemCode): Decimal {
  const quantity = cost.lines.find((line) => line.item === item)?.quantity ?? '0'
  return new Decimal(quantity).times(markupFactor(cost))
}
