/** A cell's text read as a number, or why it is none. */
export type ReadNumber = { readonly value: number } | { readonly reason: string; readonly repair?: string }

/** 6600, 6,600 or 6 600, a decimal point allowed; thousands in threes. */
const NUMBER = /^-?(\d+|\d{1,3}(?:[,\u0020\u00a0\u202f]\d{3})+)(\.\d+)?$/
/** Metres by their look: one or two digits, a point or comma, decimals. */
const METRES = /^(\d{1,2})[.,](\d{1,3})$/

/** Sides of panels that are met in practice, mm. Source: common practice, no source */
const USUAL_LEAST_MM = 1000
const USUAL_MOST_MM = 15_000

/**
 * Millimetres typed in a cell, never guessed: `6600`, `6,600` and `6 600` are read; anything else is answered with what was
 * expected, and with the likely meaning where it looks like metres or like a digit lost or doubled.
 *
 * @param what - the thing measured, to begin the reason with: 'along x'
 * @param canBeZero - true for widths and offsets, false for sides
 */
export function readLength(text: string, what: string, canBeZero = false): ReadNumber {
  const typed = text.trim()
  if (typed === '') return { reason: `${what} is missing: expected millimetres, as 6,600` }
  if (!NUMBER.test(typed)) {
    const repair = metresAsMm(typed)
    return { reason: `${what} is no number: expected millimetres, as 6,600`, ...(repair === undefined ? {} : { repair }) }
  }
  const value = Number(typed.replace(/[,\u0020\u00a0\u202f]/g, ''))
  if (value < 0 || (value === 0 && !canBeZero)) return { reason: `${what} must be ${canBeZero ? 'at least' : 'more than'} 0 mm` }
  if (value > 1_000_000) return { reason: `${what} must be at most 1,000,000 mm` }
  return { value }
}

/** The length that was probably meant by one out of the usual, mm; null where none suggests itself. */
export function likelyLength(lengthMm: number): number | null {
  const isUsual = (length: number) => length >= USUAL_LEAST_MM && length <= USUAL_MOST_MM
  if (isUsual(lengthMm)) return null
  return [lengthMm * 10, lengthMm * 1000, lengthMm / 10].find(isUsual) ?? null
}

/** A whole number of at least 1 and at most `most`, as repeats are. */
export function readCount(text: string, what: string, most: number): ReadNumber {
  const typed = text.trim()
  const value = Number(typed)
  if (!/^\d+$/.test(typed) || value < 1 || value > most)
    return { reason: `${what}: expected a whole number from 1 to ${most.toLocaleString('en')}` }
  return { value }
}

function metresAsMm(typed: string): string | undefined {
  const metres = METRES.exec(typed)
  if (metres === null) return undefined
  return `Was it ${Math.round(Number(`${metres[1]}.${metres[2]}`) * 1000).toLocaleString('en')}?`
}
