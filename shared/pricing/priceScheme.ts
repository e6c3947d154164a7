import type { Rates } from '../contracts/appraisal'
import type { BillLine, Cost, ItemQuantity, Quantity } from '../contracts/appraisalResult'
import type { MeasurementRules } from '../takeoff/measurementRules'
import { comparingRules } from '../takeoff/rules/comparingRules'
import { billLine } from './billLine'
import { Decimal, sumOf } from './decimal'
import { markupLines } from './markupLines'
import { printMoney } from './money'

/** Rates as one scheme is priced by. `weeks`: that the amount a week is charged for, as printed. */
export type SchemeRates = Omit<Rates, 'byScheme'> & { readonly weeks?: string }

/**
 * The bill of a scheme. A line is the printed quantity × rate, rounded; preliminaries, overheads and profit, contingency and tax follow
 * in this order, each rounded; the total is the sum of what is printed. Items without a rate are named in `unpriced` and cost nothing.
 *
 * Source: project rule, a printed bill adds up
 * @param quantities - of all levels, each item once in each of its stages
 * @param grossAreaM2 - > 0, repeats included: what the cost per m² is reckoned on
 * @param scope - lines of what the scheme's same-scope declarations price
 * @param rules - that the quantities are measured by
 */
export function priceScheme(
  quantities: readonly Quantity[],
  rates: SchemeRates,
  grossAreaM2: number,
  scope: readonly BillLine[] = [],
  { decimals }: Pick<MeasurementRules, 'decimals'> = comparingRules,
): Cost {
  const { currency } = rates
  const lines = [...quantities.flatMap((quantity) => billLine(quantity, rates, decimals) ?? []), ...scope]
  const items = quantities.flatMap((quantity) => quantity.analysis ?? [quantity as ItemQuantity]).map(({ item }) => item)
  const measured = sumOf(lines.map(({ amount }) => new Decimal(amount)))
  const markups = markupLines(measured, rates, lines.length > 0)
  const total = measured.plus(sumOf(markups.map(({ amount }) => new Decimal(amount))))
  return {
    currency,
    lines,
    markups,
    unpriced: [...new Set(items.filter((item) => rates.items[item] === undefined))],
    total: printMoney(total, currency),
    perArea: printMoney(total.div(grossAreaM2), currency),
  }
}
