import type { CalculationLine } from './calculation'

/** Text split at a separator where it stands outside parentheses. */
function splitOutside(text: string, separator: string): string[] {
  const parts: string[] = []
  let [depth, from] = [0, 0]
  for (let at = 0; at < text.length; at += 1) {
    if (text[at] === '(') depth += 1
    if (text[at] === ')') depth -= 1
    if (depth === 0 && text.startsWith(separator, at)) {
      parts.push(text.slice(from, at))
      from = at + separator.length
    }
  }
  return [...parts, text.slice(from)]
}

const FUNCTIONS = /\b(?:min|max|e3|e6)\b|(?<=\d)e[36]\b/g

/** Whether a part of an equation has symbols, and is so a formula rather than numbers. */
const hasSymbols = (part: string) => /\p{L}/u.test(part.replace(FUNCTIONS, ''))

/** A result and what is set behind it in parentheses. */
function parted(result: string): { result: string; note: string | null } {
  const found = /^(.*\S)\s+\(([^()]*(?:\([^()]*\)[^()]*)*)\)$/u.exec(result)
  return found ? { result: found[1]!, note: found[2]! } : { result, note: null }
}

function lineOf(statement: string): CalculationLine {
  const parts = splitOutside(statement, ' = ')
  const { result, note } = parted(parts.at(-1)!)
  if (parts.length === 1) return { symbol: null, formula: null, numbers: null, result, note }
  const [symbol, middle] = [parts[0]!, parts.slice(1, -1)]
  const last = middle.at(-1)
  const isFormula = last !== undefined && hasSymbols(last)
  const formulas = isFormula ? middle : middle.slice(0, -1)
  return { symbol, formula: formulas.join(' = ') || null, numbers: last !== undefined && !isFormula ? last : null, result, note }
}

/**
 * The working of a check as lines: what stands before the first colon is its heading, statements are parted by semicolons, and each
 * reads symbol = formula = numbers = result.
 *
 * Source: project rule, one grammar for all workings
 */
export function readWorking(working: string): { readonly heading: string | null; readonly lines: readonly CalculationLine[] } {
  const [first, ...rest] = splitOutside(working, ': ')
  const isHeaded = rest.length > 0 && !first!.includes(' = ') && !first!.includes('; ')
  const body = isHeaded ? rest.join(': ') : working
  return { heading: isHeaded ? first! : null, lines: splitOutside(body, '; ').map(lineOf) }
}
