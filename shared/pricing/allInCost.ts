import type { Cost } from '../contracts/appraisal'
import { allInRate } from './allInRate'
import { allocate } from './allocate'
import { Decimal } from './decimal'
import { markupFactor } from './markupFactor'
import { minorUnit } from './minorUnit'
import { printMoney } from './money'

/**
 * The same cost for readers who may not see margins: preliminaries, contingency and tax are folded into amounts and rates, and no
 * markup is left. Amounts add up to the total exactly, by the largest remainder; a rate is the same wherever its item stands, and
 * explains an amount to the digits it is printed with.
 *
 * Source: project rule, readers outside the office see all-in rates
 */
export function allInCost(cost: Cost): Cost {
  const { currency, lines } = cost
  const amounts = lines.map(({ amount }) => new Decimal(amount))
  const isNothing = amounts.every((amount) => amount.isZero())
  const shares = isNothing ? amounts : allocate(new Decimal(cost.total), amounts, minorUnit(currency))
  const factor = markupFactor(cost)
  return {
    ...cost,
    lines: lines.map((line, index) => ({
      ...line,
      rate: allInRate(line.rate, factor, currency),
      amount: printMoney(shares[index]!, currency),
    })),
    markups: [],
  }
}
