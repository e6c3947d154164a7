import type { Cost, LedgerLine } from '../contracts/appraisalResult'
import { Decimal } from '../pricing/decimal'
import { printMoney } from '../pricing/money'

/**
 * What makes the difference of two schemes, first − second: a line for each item and markup that costs something in either,
 * the largest difference first, with the running total, which ends at the difference of the totals.
 *
 * Source: project rule, difference ledger
 * @param first - same currency as `second`
 */
export function ledger(first: Cost, second: Cost): LedgerLine[] {
  const ofFirst = amountsOf(first)
  const ofSecond = amountsOf(second)
  const names = [...new Set([...ofFirst.keys(), ...ofSecond.keys()])]
  const print = (amount: Decimal) => printMoney(amount, first.currency)
  let running = new Decimal(0)
  return names
    .map((item) => {
      const [a, b] = [ofFirst.get(item) ?? new Decimal(0), ofSecond.get(item) ?? new Decimal(0)]
      return { item, a, b, difference: a.minus(b) }
    })
    .filter(({ a, b }) => !a.isZero() || !b.isZero())
    .sort((x, y) => y.difference.abs().comparedTo(x.difference.abs()))
    .map(({ item, a, b, difference }) => {
      running = running.plus(difference)
      return { item, first: print(a), second: print(b), difference: print(difference), running: print(running) }
    })
}

/** Amount of each item, then of each markup, in the order of the bill. */
function amountsOf({ lines, markups }: Cost): Map<string, Decimal> {
  return new Map([
    ...lines.map(({ item, amount }) => [item, new Decimal(amount)] as const),
    ...markups.map(({ name, amount }) => [name, new Decimal(amount)] as const),
  ])
}
