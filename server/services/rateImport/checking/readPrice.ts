import { Decimal } from '#shared/pricing/decimal'
import type { Cell } from '../reading/readRow'

/** A number as it was read, or why it is none. */
export type ReadNumber =
  | { readonly kind: 'number'; readonly text: string; readonly isRounded: boolean }
  | { readonly kind: 'refused'; readonly reason: string }

const DECIMALS = 6
const TOO_LARGE = new Decimal(1_000_000_000)
/** Space, no-break spaces, apostrophes. */
const GAPS = /[\s\u00a0\u2007\u2009\u202f'’]/g
const SIGNS = /^(?:\p{Sc}|[A-Z]{3}\b|Fr\.)|(?:\p{Sc}|[A-Z]{3}|(?:,-|\.-|\.—|,—))$/giu
const SEPARATORS = { '.': ',', ',': '.' } as const

const refused = (reason: string): ReadNumber => ({ kind: 'refused', reason })

function fromDecimal(value: Decimal): ReadNumber {
  if (value.isNegative() && !value.isZero()) return refused('the number is negative')
  const rounded = value.toDecimalPlaces(DECIMALS)
  if (rounded.gte(TOO_LARGE)) return refused('expected a number below 1,000,000,000')
  return { kind: 'number', text: rounded.toFixed(), isRounded: !rounded.eq(value) }
}

/** Digits with a plain point, of a typed number without sign, gaps and currency; null where they are not grouped by threes. */
function plainDigits(text: string, mark: '.' | ','): string | null {
  const [whole = '', fraction = '', ...more] = text.split(mark)
  if (more.length > 0 || !/^\d*$/.test(fraction)) return null
  const groups = whole.split(SEPARATORS[mark])
  const isGrouped =
    groups.length === 1 || (/^\d{1,3}$/.test(groups[0]!) && groups.slice(1).every((group) => /^\d{3}$/.test(group)))
  const digits = groups.join('')
  if (!isGrouped || !/^\d*$/.test(digits) || `${digits}${fraction}` === '') return null
  return `${digits === '' ? '0' : digits}${fraction === '' ? '' : `.${fraction}`}`
}

/**
 * A price or an amount of a cell. Numbers of a workbook are taken with the fifteen digits that a spreadsheet shows; typed ones may have a
 * currency, gaps between thousands, and separators that stand where they must.
 * @param mark - decimal mark of typed numbers
 */
export function readPrice(cell: Cell, mark: '.' | ','): ReadNumber {
  if (typeof cell === 'number') return fromDecimal(new Decimal(cell.toPrecision(15)))
  const typed = cell.trim()
  const bare = typed.replace(SIGNS, '').replace(GAPS, '').replace(SIGNS, '')
  const isNegative = /^[-−(]|[-−]$/.test(bare)
  const digits = plainDigits(bare.replace(/^[-−(+]|[-−)]$/g, ''), mark)
  const shown = typed.length > 40 ? `${typed.slice(0, 40)}…` : typed
  if (digits === null || digits.length > 40) return refused(`unreadable number “${shown}”, where the decimal mark is “${mark}”`)
  return fromDecimal(new Decimal(isNegative ? `-${digits}` : digits))
}
