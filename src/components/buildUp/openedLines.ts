import type { OpenedBuildUp, OpenedLine } from '#shared/contracts/openedRate'
import { formatDay } from '../base/formatMoment'
import { priceAgeInWords } from '../resource/priceAgeInWords'

type Behind = Pick<OpenedBuildUp, 'resources' | 'chosen'>

const withDay = (source: string, day: string | null): string =>
  [source === '' ? 'source not given' : source, day === null ? 'no date' : formatDay(day)].join(', ')

/** Where the prices of a line come from, and what should be looked at: an old price, a quotation that has run out. */
function behindLine({ source, inputs }: OpenedLine, { resources, chosen }: Behind, today: string) {
  const prices = inputs.flatMap((code) => resources.find((resource) => resource.code === code) ?? [])
  const isAlone = prices.length === 1
  const notes = prices.map((price) => `${isAlone ? 'Price' : price.description}: ${withDay(price.source, price.sourceDate)}`)
  const flags = prices.flatMap((price) => {
    const validUntil = chosen.find(({ resource }) => resource === price.code)?.validUntil ?? null
    const age = priceAgeInWords({ sourceDate: price.sourceDate, validUntil }, today)
    return age === null ? [] : [isAlone ? `Ask again: ${age}` : `Ask again for ${price.description}: ${age}`]
  })
  return { notes: source === '' ? notes : [`Amount: ${source}`, ...notes], flags }
}

/** Lines of an opened rate with what stands behind them. @param today - ISO date */
export const openedLines = ({ lines, ...behind }: OpenedBuildUp, today: string) =>
  lines.map((line) => ({ ...line, ...behindLine(line, behind, today) }))
