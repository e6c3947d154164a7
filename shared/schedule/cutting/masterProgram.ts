import type { CuttingJob, Cut, Pattern } from './cuttingJob'
import { dearestPattern } from './dearestPattern'

/** Bars of the linear program: patterns cut a fractional number of times, and the least number of bars that any plan needs. */
export interface Relaxed {
  readonly cuts: readonly Cut[]
  readonly bound: number
  readonly patterns: readonly Pattern[]
}

/** A pattern worth this much more than a bar improves the plan; pivots smaller than this are none. */
const TOLERANCE = 1e-9

/** Demands are moved apart by this, so that the simplex method does not turn in circles. */
const PERTURBATION = 1e-7

/** Pivots after which the search stops with the bound it has: far more than any job here takes. */
const MOST_PIVOTS = 20_000

/** A column of the basis: a pattern, or what is cut too much of one size. */
type Column = { readonly pattern: Pattern } | { readonly surplus: number }

/** Basis of the revised simplex method: its columns, the inverse of their matrix row by row, and how often each is cut. */
interface Basis {
  readonly columns: Column[]
  readonly inverse: Float64Array[]
  readonly values: Float64Array
}

/**
 * The least number of bars, fractions allowed, that gives the wanted pieces: column generation by the revised simplex method. The bound
 * holds whatever the rounding of the arithmetic: worths divided by the dearest pattern are a feasible solution of the dual program.
 *
 * Source: Gilmore and Gomory, Operations Research 9 (1961) and 11 (1963); bound: Farley, Operations Research 38 (1990), from memory
 * @param known - patterns to begin with, tried before new ones are sought
 */
export function masterProgram(job: CuttingJob, known: readonly Pattern[] = []): Relaxed {
  const basis = firstBasis(job)
  const patterns = [...known]
  let bound = 0
  for (let pivots = 0; pivots < MOST_PIVOTS; pivots += 1) {
    const worths = worthsOf(basis)
    const negative = worths.findIndex((worth) => worth < -TOLERANCE)
    const found = negative < 0 ? dearestOf(patterns, worths) : null
    if (negative >= 0) enter(basis, { surplus: negative })
    else if (found) enter(basis, { pattern: found })
    else {
      const { pattern, worth } = dearestPattern(job, worths)
      const value = job.counts.reduce((sum, count, i) => sum + count * Math.max(0, worths[i]!), 0)
      bound = Math.max(bound, value / Math.max(1, worth))
      if (worth <= 1 + TOLERANCE) break
      patterns.push(pattern)
      enter(basis, { pattern })
    }
  }
  return { cuts: cutsOf(basis, job), bound, patterns }
}

/** Every size alone, as often as it fits. */
function firstBasis({ capacity, sizes, counts }: CuttingJob): Basis {
  const fits = sizes.map((size, i) => Math.min(counts[i]!, Math.floor(capacity / size)))
  return {
    columns: sizes.map((_, i) => ({ pattern: fits.map((fit, j) => (i === j ? fit : 0)) })),
    inverse: fits.map((fit, i) => Float64Array.from(fits, (_, j) => (i === j ? 1 / fit : 0))),
    values: Float64Array.from(counts, (count, i) => (count + PERTURBATION * (i + 1)) / fits[i]!),
  }
}

/** What one piece of each size is worth in bars: the duals of the program. */
function worthsOf({ columns, inverse }: Basis): number[] {
  const worths = new Float64Array(columns.length)
  columns.forEach((column, row) => {
    if ('pattern' in column) inverse[row]!.forEach((value, i) => (worths[i]! += value))
  })
  return [...worths]
}

/** The dearest of known patterns, null where none is worth more than a bar. */
function dearestOf(patterns: readonly Pattern[], worths: readonly number[]): Pattern | null {
  let [best, most]: [Pattern | null, number] = [null, 1 + TOLERANCE]
  for (const pattern of patterns) {
    let worth = 0
    for (let i = 0; i < worths.length; i += 1) worth += worths[i]! * pattern[i]!
    if (worth > most) [best, most] = [pattern, worth]
  }
  return best
}

/** Takes a column into the basis in place of the one that runs out first. */
function enter({ columns, inverse, values }: Basis, column: Column): void {
  const direction = inverse.map((row) =>
    'surplus' in column
      ? -row[column.surplus]!
      : column.pattern.reduce((sum, count, i) => sum + (count === 0 ? 0 : row[i]! * count), 0),
  )
  let [leaving, least] = [-1, Infinity]
  direction.forEach((step, row) => {
    const ratio = step > TOLERANCE ? values[row]! / step : Infinity
    if (ratio < least) [leaving, least] = [row, ratio]
  })
  if (leaving < 0) throw new Error('the cutting program has no bound: its arithmetic has failed')
  const pivot = direction[leaving]!
  const pivotRow = inverse[leaving]!
  for (let i = 0; i < pivotRow.length; i += 1) pivotRow[i] = pivotRow[i]! / pivot
  values[leaving] = least
  direction.forEach((step, row) => {
    if (row === leaving || step === 0) return
    const own = inverse[row]!
    for (let i = 0; i < own.length; i += 1) own[i] = own[i]! - step * pivotRow[i]!
    values[row] = Math.max(0, values[row]! - step * least)
  })
  columns[leaving] = column
}

/** How often each pattern of the basis is cut, of the demands as they are. */
function cutsOf({ columns, inverse }: Basis, { counts }: CuttingJob): Cut[] {
  return columns.flatMap((column, row) => {
    const times = counts.reduce((sum, count, i) => sum + inverse[row]![i]! * count, 0)
    return 'pattern' in column && times > TOLERANCE ? [{ pattern: column.pattern, times }] : []
  })
}
