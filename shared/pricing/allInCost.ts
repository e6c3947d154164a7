import type { Cost, ItemLine } from '../contracts/appraisalResult'
import { allInFactor } from './allInFactor'
import { allInRate } from './allInRate'
import { allocate } from './allocate'
import { Decimal, sumOf } from './decimal'
import { minorUnit } from './minorUnit'
import { printMoney } from './money'

/**
 * The same cost for readers who may not see margins: all markups, sums among them, are folded into amounts and rates, and none is
 * left. Amounts add up to the total exactly, by the largest remainder; a rate is the same wherever its item stands, and
 * explains an amount to the digits it is printed with. A composite is the sum of the lines it is made up of.
 *
 * Source: project rule, readers outside the office see all-in rates
 */
export function allInCost(cost: Cost): Cost {
  const { currency, lines } = cost
  const amounts = lines.flatMap(({ amount, analysis }) => (analysis ?? [{ amount }]).map((each) => new Decimal(each.amount)))
  const factor = allInFactor(cost)
  const shares = sharesOf(new Decimal(cost.total), amounts, minorUnit(currency))
  let at = 0
  const next = () => shares[at++]!
  const allIn = (line: ItemLine, share: Decimal): ItemLine => ({
    ...line,
    rate: allInRate(line.rate, factor, currency),
    amount: printMoney(share, currency),
  })
  return {
    ...cost,
    lines: lines.map(({ analysis, ...line }) => {
      if (analysis === undefined) return allIn(line, next())
      const parts = analysis.map((part) => ({ part, share: next() }))
      const whole = allIn(line, sumOf(parts.map(({ share }) => share)))
      return { ...whole, analysis: parts.map(({ part, share }) => allIn(part, share)) }
    }),
    markups: [],
  }
}

/** In proportion to the amounts; where all of them are nothing, sums of preliminaries are shared out evenly. */
function sharesOf(total: Decimal, amounts: Decimal[], decimals: number): Decimal[] {
  if (total.isZero() || amounts.length === 0) return amounts
  const isNothing = amounts.every((amount) => amount.isZero())
  return allocate(total, isNothing ? amounts.map(() => new Decimal(1)) : amounts, decimals)
}
