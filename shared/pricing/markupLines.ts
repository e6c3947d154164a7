import type { MarkupLine, MarkupName } from '../contracts/appraisalResult'
import { Decimal } from './decimal'
import { printMoney, roundMoney } from './money'
import type { SchemeRates } from './priceScheme'

/**
 * Markups in the order they are charged: preliminaries as a percentage of the measured work, as a sum and by the week; overheads and
 * profit, contingency and tax, each a percentage of the sum of all that stands before it. Each is rounded. Sums and overheads that are
 * nothing have no line; nor have sums where nothing is priced.
 *
 * Source: project rule, a printed bill adds up; order by common practice, no source
 * @param measured - sum of the bill's lines
 */
export function markupLines(measured: Decimal, rates: SchemeRates, isPriced: boolean): MarkupLine[] {
  const { markups, currency } = rates
  const lines: MarkupLine[] = []
  let running = measured
  const add = (amount: Decimal, line: Omit<MarkupLine, 'amount'>) => {
    const rounded = roundMoney(amount, currency)
    running = running.plus(rounded)
    lines.push({ ...line, amount: printMoney(rounded, currency) })
  }
  const addPercent = (name: MarkupName, percent: string) => add(running.times(percent).div(100), { name, percent })
  addPercent('preliminaries', markups.preliminariesPercent)
  const { preliminariesFixed: fixed, preliminariesPerWeek: perWeek, overheadsAndProfitPercent: overheads } = markups
  if (isPriced && isSome(fixed)) add(new Decimal(fixed), { name: 'preliminariesFixed', percent: '0' })
  if (isPriced && isSome(perWeek)) {
    const weeks = rates.weeks ?? '0'
    add(new Decimal(perWeek).times(weeks), { name: 'preliminariesPerWeek', percent: '0', perWeek, weeks })
  }
  if (isSome(overheads)) addPercent('overheadsAndProfit', overheads)
  addPercent('contingency', markups.contingencyPercent)
  addPercent('tax', markups.taxPercent)
  return lines
}

const isSome = (amount: string) => !new Decimal(amount).isZero()
