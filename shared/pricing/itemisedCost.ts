import type { Cost, ItemLine } from '../contracts/appraisalResult'
import { Decimal } from './decimal'
import { printMoney } from './money'

const KG_PER_T = 1000
const THOUSANDTHS = 3

/**
 * The same cost line by item, whatever rules it is billed by: composites as the lines they add up, stages of one item together, bars
 * in tonnes, so that two schemes can be set against each other and a rate of the book moved. Totals and markups are the same.
 *
 * @returns each item once, in the order in which it first stands; the cost itself where it is itemised already
 */
export function itemisedCost(cost: Cost): Cost {
  const isItemised =
    cost.lines.every(({ analysis, unit }) => analysis === undefined && unit !== 'kg') &&
    new Set(cost.lines.map(({ item }) => item)).size === cost.lines.length
  if (isItemised) return cost
  const byItem = new Map<string, ItemLine>()
  for (const line of cost.lines.flatMap((each) => each.analysis ?? [each])) {
    const same = byItem.get(line.item)
    const one = inRateUnit(line)
    byItem.set(line.item, same === undefined ? one : together(same, one, cost.currency))
  }
  return { ...cost, lines: [...byItem.values()] }
}

function inRateUnit({ item, unit, quantity, rate, amount }: ItemLine): ItemLine {
  if (unit !== 'kg') return { item, unit, quantity, rate, amount }
  const kg = new Decimal(quantity)
  const tonnes = kg.div(KG_PER_T).toFixed(kg.decimalPlaces() + THOUSANDTHS)
  return { item, unit: 't', quantity: tonnes, rate: new Decimal(rate).times(KG_PER_T).toFixed(), amount }
}

function together(first: ItemLine, second: ItemLine, currency: string): ItemLine {
  const [a, b] = [new Decimal(first.quantity), new Decimal(second.quantity)]
  const quantity = a.plus(b).toFixed(Math.max(a.decimalPlaces(), b.decimalPlaces()))
  return { ...first, quantity, amount: printMoney(new Decimal(first.amount).plus(second.amount), currency) }
}
