const MINUS = '\u2212'

/** Number for a reader: thousands parted by commas, stated decimals, true minus. `5.25, 1` → `5.3`. */
export function figureText(value: number, decimals: number): string {
  const rounded = Number(value.toFixed(decimals))
  const text = Math.abs(rounded).toLocaleString('en-GB', { minimumFractionDigits: decimals, maximumFractionDigits: decimals })
  return rounded < 0 ? MINUS + text : text
}

/** Like `figureText`, with a plus where the value is above zero as printed. */
export function signedText(value: number, decimals: number): string {
  const text = figureText(value, decimals)
  return Number(value.toFixed(decimals)) > 0 ? `+${text}` : text
}

/** Decimal string for a reader: thousands parted by commas, true minus, every digit kept. `-4104.59` → `−4,104.59`. */
export function decimalText(decimal: string): string {
  const [whole = '', fraction] = decimal.replace(/^-/, '').split('.')
  const grouped = whole.replace(/\B(?=(\d{3})+$)/g, ',')
  return (decimal.startsWith('-') ? MINUS : '') + grouped + (fraction === undefined ? '' : `.${fraction}`)
}

/** Like `decimalText`, with a plus where the value is above zero. */
export function signedDecimalText(decimal: string): string {
  return /^-|^0+(\.0+)?$/.test(decimal) ? decimalText(decimal) : `+${decimalText(decimal)}`
}

/** Day for a reader, UTC: `2026-03-14T09:00:00Z` → `14 March 2026`. */
export function dayText(moment: string): string {
  return new Date(moment).toLocaleDateString('en-GB', { day: 'numeric', month: 'long', year: 'numeric', timeZone: 'UTC' })
}

/** `first, second and third`. */
export function listText(words: readonly string[]): string {
  return words.length < 2 ? words.join('') : `${words.slice(0, -1).join(', ')} and ${words[words.length - 1]}`
}
