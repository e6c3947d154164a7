import type { BillLine, Cost } from '../contracts/appraisal'
import { allocate } from './allocate'
import { Decimal } from './decimal'
import { minorUnit } from './minorUnit'
import { printMoney } from './money'

/** A rate is printed with at least this many significant digits. */
const RATE_DIGITS = 4
/** Most decimals of a rate in the contract. */
const MOST_RATE_DECIMALS = 6

/**
 * The same cost for readers who may not see margins: preliminaries, contingency and tax are folded into the amounts and rates
 * and no markup is left. Amounts add up to the total exactly; a rate is amount ÷ quantity, printed to the minor unit or to four
 * significant digits, whichever is finer, and so explains its amount to that precision only.
 *
 * Source: project rule, readers outside the office see all-in rates
 */
export function allInCost(cost: Cost): Cost {
  const total = new Decimal(cost.total)
  const amounts = cost.lines.map(({ amount }) => new Decimal(amount))
  if (amounts.every((amount) => amount.isZero())) return { ...cost, markups: [] }
  const shares = allocate(total, amounts, minorUnit(cost.currency))
  return { ...cost, lines: cost.lines.map((line, index) => allInLine(line, shares[index]!, cost.currency)), markups: [] }
}

function allInLine(line: BillLine, amount: Decimal, currency: string): BillLine {
  const quantity = new Decimal(line.quantity)
  const rate = quantity.isZero() ? new Decimal(line.rate) : amount.div(quantity)
  return { ...line, rate: printRate(rate, currency), amount: printMoney(amount, currency) }
}

function printRate(rate: Decimal, currency: string): string {
  const decimals = rate.isZero() ? 0 : RATE_DIGITS - 1 - rate.e
  return rate.toFixed(Math.min(MOST_RATE_DECIMALS, Math.max(minorUnit(currency), decimals)))
}
