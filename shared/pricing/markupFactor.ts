import type { Cost, MarkupLine } from '../contracts/appraisalResult'
import { Decimal } from './decimal'

/** What percentages of preliminaries, overheads, contingency and tax together multiply measured work by, unrounded: 1 for none. */
export function markupFactor({ markups }: Pick<Cost, 'markups'>): Decimal {
  return markups.reduce((factor, { percent }) => factor.times(new Decimal(percent).div(100).plus(1)), new Decimal(1))
}

/** What sums of preliminaries add to the total, with the percentages that are charged on them, before any rounding: 0 for none. */
export function markupSum({ markups }: Pick<Cost, 'markups'>): Decimal {
  return markups.reduce(
    (sum, line) => sum.plus(sumOfLine(line)).times(new Decimal(line.percent).div(100).plus(1)),
    new Decimal(0),
  )
}

/** The sum that a markup line is, before rounding; 0 for a percentage. */
function sumOfLine({ name, amount, perWeek, weeks }: MarkupLine): Decimal {
  if (name === 'preliminariesFixed') return new Decimal(amount)
  return perWeek === undefined || weeks === undefined ? new Decimal(0) : new Decimal(perWeek).times(weeks)
}
