import type { Edition } from '#shared/contracts/rateBook'
import { formatAge, formatDay } from '../base/formatMoment'

/**
 * Age from which an edition is called old, in months.
 *
 * Source: common practice, no source
 */
const OLD_MONTHS = 6

function monthsBefore(today: string, months: number): string {
  const day = new Date(`${today}T00:00:00Z`)
  day.setUTCMonth(day.getUTCMonth() - months)
  return day.toISOString().slice(0, 10)
}

type Dated = Pick<Edition, 'state' | 'baseDate' | 'validUntil' | 'stateReason'>

/** Why an edition is not to be relied on without a second look, a sentence each. @param today - ISO date */
export function editionWarnings({ state, baseDate, validUntil, stateReason }: Dated, today: string): string[] {
  const isOld = baseDate < monthsBefore(today, OLD_MONTHS)
  return [
    ...(state === 'withdrawn' ? [`Withdrawn: ${stateReason}`] : []),
    ...(state === 'superseded' ? ['Superseded: a newer edition of this book is published.'] : []),
    ...(state === 'draft' && stateReason !== '' ? [`Returned to its compilers: ${stateReason}`] : []),
    ...(validUntil !== null && validUntil < today ? [`Its prices held until ${formatDay(validUntil)}.`] : []),
    ...(isOld
      ? [`Its prices are ${formatAge(baseDate, new Date(`${today}T12:00:00Z`))}: ask again before they are built on.`]
      : []),
  ]
}
