import type { Cost } from '../contracts/appraisal'
import { Decimal } from './decimal'

/** What preliminaries, contingency and tax together multiply measured work by, before any rounding: 1 where there are none. */
export function markupFactor({ markups }: Pick<Cost, 'markups'>): Decimal {
  return markups.reduce((factor, { percent }) => factor.times(new Decimal(percent).div(100).plus(1)), new Decimal(1))
}
