import type { EditionWithRates } from '#shared/contracts/rateBook'
import { itemInWords } from '../quantity/itemInWords'
import { formatQuantity } from '../base/formatQuantity'
import { changeOf } from './rateScale'

/** The edition in a sentence: what moved since the one before, and what moved most. */
export function editionInWords(edition: EditionWithRates, before: EditionWithRates | null): string {
  const fixed = edition.state === 'published' ? 'A published edition is never edited: a new one takes its place.' : ''
  if (before === null) return `${edition.rates.length} rates, each with a low, a likely and a high price. ${fixed}`
  const moves = edition.rates
    .map(({ item, likely }) => ({ item, share: changeOf(likely, before.rates.find((rate) => rate.item === item)?.likely) }))
    .filter((move): move is { item: typeof move.item; share: number } => move.share !== null && move.share !== 0)
    .sort((a, b) => Math.abs(b.share) - Math.abs(a.share))
  const [most] = moves
  if (most === undefined) return `No rate moved since edition ${before.number}. ${fixed}`
  const percent = formatQuantity(most.share * 100, { decimals: 1, isSigned: true })
  return `${moves.length} of ${edition.rates.length} rates moved since edition ${before.number}, most of all ${itemInWords(most.item).toLowerCase()} by ${percent}%. ${fixed}`
}
