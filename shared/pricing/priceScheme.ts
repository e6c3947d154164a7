import type { BillLine, Cost, MarkupLine, Markups, Quantity, Rates } from '../contracts/appraisal'
import { netRules } from '../takeoff/measurementRules'
import { Decimal, sumOf } from './decimal'
import { printMoney, roundMoney } from './money'
import { toQuantity } from './toQuantity'

/** In the order they are charged; each on the sum of all that stands before it. */
const MARKUPS = [
  { name: 'preliminaries', percentOf: (markups: Markups) => markups.preliminariesPercent },
  { name: 'contingency', percentOf: (markups: Markups) => markups.contingencyPercent },
  { name: 'tax', percentOf: (markups: Markups) => markups.taxPercent },
] as const

/**
 * The bill of a scheme. A line is the printed quantity × rate, rounded; preliminaries, contingency and tax follow in this order,
 * each rounded; the total is the sum of what is printed. Items without a rate are named in `unpriced` and cost nothing.
 *
 * Source: project rule, a printed bill adds up
 * @param quantities - of all levels, each item once
 * @param grossAreaM2 - > 0, repeats included: what the cost per m² is reckoned on
 */
export function priceScheme(quantities: readonly Quantity[], rates: Rates, grossAreaM2: number): Cost {
  const { currency } = rates
  const lines = quantities.flatMap((quantity) => billLine(quantity, rates) ?? [])
  const measured = sumOf(lines.map(({ amount }) => new Decimal(amount)))
  const markups = markupLines(measured, rates)
  const total = measured.plus(sumOf(markups.map(({ amount }) => new Decimal(amount))))
  return {
    currency,
    lines,
    markups,
    unpriced: quantities.map(({ item }) => item).filter((item) => rates.items[item] === undefined),
    total: printMoney(total, currency),
    perArea: printMoney(total.div(grossAreaM2), currency),
  }
}

function billLine({ item, unit, net }: Quantity, { items, currency }: Rates): BillLine | null {
  const rate = items[item]
  if (rate === undefined) return null
  const quantity = toQuantity(net, netRules.decimals[unit])
  return { item, quantity, unit, rate, amount: printMoney(new Decimal(quantity).times(rate), currency) }
}

function markupLines(measured: Decimal, { markups, currency }: Rates): MarkupLine[] {
  let running = measured
  return MARKUPS.map(({ name, percentOf }) => {
    const percent = percentOf(markups)
    const amount = roundMoney(running.times(percent).div(100), currency)
    running = running.plus(amount)
    return { name, percent, amount: printMoney(amount, currency) }
  })
}
