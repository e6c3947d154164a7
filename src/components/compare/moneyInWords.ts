import { minorUnit } from '#shared/pricing/minorUnit'
import { formatDecimal } from '../base/formatDecimal'

const symbols = new Map<string, string>()

function symbolOf(currency: string): string {
  const known = symbols.get(currency)
  if (known !== undefined) return known
  const parts = new Intl.NumberFormat('en-US', { style: 'currency', currency, currencyDisplay: 'narrowSymbol' }).formatToParts(0)
  const symbol = parts.find(({ type }) => type === 'currency')?.value ?? currency
  const spaced = /[A-Za-z]$/.test(symbol) ? `${symbol} ` : symbol
  symbols.set(currency, spaced)
  return spaced
}

/** An amount inside a sentence, without its sign: $4,105; small amounts keep their decimals. */
export function moneyInWords(amount: string, currency: string): string {
  const size = amount.replace(/^-/, '')
  const isLarge = (size.split('.')[0] ?? '').length >= 3
  return symbolOf(currency) + formatDecimal(size, { decimals: isLarge ? 0 : minorUnit(currency) })
}
