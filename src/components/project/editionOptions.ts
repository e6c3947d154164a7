import type { Edition, RateBook } from '#shared/contracts/rateBook'
import { formatAge, formatDay } from '../base/formatMoment'

/** Editions of all books to choose from, each with its age; drafts and withdrawn ones are no price to rely on. */
export function editionOptions(books: readonly RateBook[], chosenId: string | null, now: Date) {
  return books
    .flatMap(({ editions }) => editions)
    .filter(({ id, state }) => id === chosenId || state === 'published' || state === 'superseded')
    .map((edition) => ({ value: edition.id, label: editionName(edition), note: editionNote(edition, now) }))
}

/** 'Eastmere, edition 4'. */
export function editionName({ region, number }: Pick<Edition, 'region' | 'number'>): string {
  return `${region}, edition ${number}`
}

/** '1 March 2026, 9 months old, superseded': how far a price can be relied on. */
export function editionNote({ baseDate, state, validUntil }: Edition, now: Date): string {
  const hasRunOut = validUntil !== null && new Date(validUntil).getTime() + 86_400_000 <= now.getTime()
  return [
    formatDay(baseDate),
    formatAge(baseDate, now),
    ...(state === 'published' ? [] : [state]),
    ...(hasRunOut ? ['run out'] : []),
  ].join(', ')
}
