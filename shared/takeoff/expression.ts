/**
 * Arithmetic that can be read and reckoned: plain numbers, `+ - * / ( )` and nothing else, no sign before a number.
 * `value` is reckoned from the full figures, `text` prints them; both agree to 1e-9.
 */
export interface Expression {
  readonly text: string
  readonly value: number
  /** What binds the outermost figures: a sum needs brackets before it is multiplied. */
  readonly form: 'number' | 'product' | 'sum'
}

/** Digits printed of a figure: float noise behind them is dropped. */
const PRINTED_DIGITS = 12
/** Decimals that print any figure of at least 1e-6 with these digits. */
const MOST_DECIMALS = 20

/**
 * A figure as it is printed.
 *
 * @throws RangeError when it is negative or not finite: an expression has no signs
 */
export function figure(value: number): Expression {
  if (!Number.isFinite(value) || value < 0) throw new RangeError(`expected a figure of zero or more, got ${value}`)
  const short = Number(value.toPrecision(PRINTED_DIGITS))
  const text = String(short).includes('e') ? short.toFixed(MOST_DECIMALS).replace(/\.?0+$/, '') : String(short)
  return { text, value, form: 'number' }
}

/** Product of one or more expressions. */
export function times(...factors: readonly Expression[]): Expression {
  if (factors.length === 1) return factors[0]!
  const value = factors.reduce((product, factor) => product * factor.value, 1)
  return { text: factors.map(inBrackets).join(' * '), value, form: 'product' }
}

/** Sum of one or more expressions. */
export function plus(...terms: readonly Expression[]): Expression {
  if (terms.length === 1) return terms[0]!
  const value = terms.reduce((sum, term) => sum + term.value, 0)
  return { text: terms.map(({ text }) => text).join(' + '), value, form: 'sum' }
}

/** `whole` less each of `parts`; `whole` itself where there are none. */
export function less(whole: Expression, ...parts: readonly Expression[]): Expression {
  if (parts.length === 0) return whole
  const value = parts.reduce((rest, part) => rest - part.value, whole.value)
  return { text: [whole.text, ...parts.map(inBrackets)].join(' - '), value, form: 'sum' }
}

/** One expression divided by another that is above zero. */
export function dividedBy(dividend: Expression, divisor: Expression): Expression {
  const below = divisor.form === 'number' ? divisor.text : `(${divisor.text})`
  return { text: `${inBrackets(dividend)} / ${below}`, value: dividend.value / divisor.value, form: 'product' }
}

/** A number of kilograms as tonnes. */
export function inTonnes(massKg: Expression): Expression {
  return dividedBy(massKg, figure(1000))
}

/** An expression timesed by repeat counts; a count of one is not written. */
export function timesed(once: Expression, ...repeats: readonly number[]): Expression {
  return times(once, ...repeats.filter((repeat) => repeat !== 1).map(figure))
}

function inBrackets({ text, form }: Expression): string {
  return form === 'sum' ? `(${text})` : text
}
