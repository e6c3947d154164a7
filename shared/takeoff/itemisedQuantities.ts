import type { ItemCode } from '../contracts/appraisal'
import type { ItemQuantity, Quantity } from '../contracts/appraisalResult'
import { unitOf } from './measurementRules'
import { roundAsPrinted } from './roundAsPrinted'

const KG_PER_T = 1000
/** Decimals that no quantity of any rules exceeds, bars in kilograms turned to tonnes. */
const MOST_DECIMALS = 6

/**
 * Quantities item by item whatever rules they are billed by: composites as what they are made up of, stages of one item together,
 * bars in tonnes. What is measured with one item apiece is yielded as it stands.
 *
 * @returns each item once, in the order in which it first stands
 */
export function itemisedQuantities(quantities: readonly Quantity[]): ItemQuantity[] {
  const byItem = new Map<ItemCode, ItemQuantity>()
  for (const quantity of quantities.flatMap((each) => each.analysis ?? [each as ItemQuantity])) {
    const same = byItem.get(quantity.item)
    const one = inRateUnit(quantity)
    byItem.set(quantity.item, same === undefined ? one : together(same, one))
  }
  return [...byItem.values()]
}

function inRateUnit(quantity: ItemQuantity): ItemQuantity {
  if (quantity.unit !== 'kg') return quantity
  const parts = quantity.parts.map((part) => ({
    ...part,
    expression: `${part.expression} / ${KG_PER_T}`,
    value: part.value / KG_PER_T,
  }))
  return { ...quantity, unit: unitOf(quantity.item), net: roundAsPrinted(quantity.net / KG_PER_T, MOST_DECIMALS), parts }
}

function together(first: ItemQuantity, second: ItemQuantity): ItemQuantity {
  const net = roundAsPrinted(first.net + second.net, MOST_DECIMALS)
  const both = { item: first.item, unit: first.unit, net, parts: [...first.parts, ...second.parts] }
  if (first.split === undefined || second.split === undefined) return both
  const members = Object.entries(first.split).map(([name, value]) => [
    name,
    value + second.split![name as keyof typeof second.split],
  ])
  return { ...both, split: Object.fromEntries(members) as typeof first.split }
}
