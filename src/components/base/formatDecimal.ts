export interface DecimalFormat {
  /** Digits after the point, rounded half away from zero; absent: as given. */
  readonly decimals?: number
  /** Write + before what is positive. */
  readonly isSigned?: boolean
}

const grouped = (digits: string): string => digits.replace(/\B(?=(\d{3})+$)/g, ',')

/** Digits rounded at `decimals`, without a float: '149.625' at 2 is ['149', '63']. */
function rounded(whole: string, fraction: string, decimals: number): [string, string] {
  const kept = fraction.padEnd(decimals, '0').slice(0, decimals)
  const isUp = (fraction[decimals] ?? '0') >= '5'
  const digits = (BigInt(whole + kept) + (isUp ? 1n : 0n)).toString().padStart(decimals + 1, '0')
  return [digits.slice(0, digits.length - decimals), decimals === 0 ? '' : digits.slice(-decimals)]
}

/**
 * Writes a decimal string for the reader: thousands by commas, a true minus, no float on the way.
 * @param text - as '-4104.59'
 */
export function formatDecimal(text: string, { decimals, isSigned = false }: DecimalFormat = {}): string {
  const match = /^(-?)(\d+)(?:\.(\d+))?$/.exec(text)
  if (match === null) return text
  const [, minus, wholeGiven = '0', fractionGiven = ''] = match
  const [whole, fraction] = decimals === undefined ? [wholeGiven, fractionGiven] : rounded(wholeGiven, fractionGiven, decimals)
  const isZero = /^0*$/.test(whole + fraction)
  const sign = isZero ? '' : minus ? '−' : isSigned ? '+' : ''
  return sign + grouped(whole) + (fraction === '' ? '' : `.${fraction}`)
}
