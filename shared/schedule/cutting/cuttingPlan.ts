import { bestFit } from './bestFit'
import { type CuttingJob, type Cut, type Pattern, totalOf } from './cuttingJob'
import { masterProgram } from './masterProgram'
import { packExactly } from './packExactly'
import { wholeCuts } from './wholeCuts'

/** Bars wanted of one length. */
export interface WantedLength {
  readonly lengthMm: number
  readonly count: number
}

/** One way to cut a stock bar, and how many bars are cut so. */
export interface CuttingPattern {
  readonly pieces: readonly WantedLength[]
  readonly times: number
  /** What is left of each bar, saw cuts taken off, mm. */
  readonly offcutMm: number
}

/** How bars of one diameter are cut from stock. */
export interface CuttingPlan {
  readonly stockMm: number
  readonly sawCutMm: number
  readonly patterns: readonly CuttingPattern[]
  /** Stock bars. */
  readonly used: number
  /** Wanted lengths over the stock length, rounded up to whole bars. */
  readonly lengthBound: number
  /** Least bars, fractions allowed, by the linear program. */
  readonly linearBound: number
  readonly pieces: number
  readonly piecesMm: number
  /** Share of the stock that is not in the pieces, 0 to 1. */
  readonly wasteShare: number
  /** How it is known that no plan takes fewer bars: by a bound, or by trying all; null where it is not known. */
  readonly proof: 'bound' | 'search' | null
}

/** Other ways to round the program that are tried where the first is not proven best. */
const TURNS = 12

/** Pieces up to which all plans are tried, and how many ways that may take. */
const SEARCHED_PIECES = 150
const SEARCH_STEPS = 60_000

/** A bound this little above a whole number is that number. */
const SLACK = 1e-6

const NOTHING = {
  patterns: [],
  used: 0,
  lengthBound: 0,
  linearBound: 0,
  pieces: 0,
  piecesMm: 0,
  wasteShare: 0,
  proof: 'bound',
} as const

/**
 * The fewest stock bars that give the wanted lengths, as far as is known, and how each is cut: column generation for the linear program,
 * then whole bars by rounding and search. Equal wants always give the equal plan.
 *
 * Source: Gilmore and Gomory, Operations Research 9 (1961) and 11 (1963)
 * @param wanted - whole mm above 0
 * @param stockMm - whole mm
 * @param sawCutMm - lost at each cut, whole mm; 0 where bars are sheared
 * @throws RangeError for lengths that are not whole, or longer than the stock
 */
export function cuttingPlan(wanted: readonly WantedLength[], stockMm: number, sawCutMm = 0): CuttingPlan {
  const lengths = lengthsOf(wanted, stockMm, sawCutMm)
  if (lengths.length === 0) return { stockMm, sawCutMm, ...NOTHING }
  const step = lengths.reduce((all, { lengthMm }) => commonDivisor(all, lengthMm + sawCutMm), stockMm + sawCutMm)
  const job: CuttingJob = {
    capacity: (stockMm + sawCutMm) / step,
    sizes: lengths.map(({ lengthMm }) => (lengthMm + sawCutMm) / step),
    counts: lengths.map(({ count }) => count),
  }
  const { cuts, bound, proof } = fewestBars(job)
  const piecesMm = lengths.reduce((sum, { lengthMm, count }) => sum + lengthMm * count, 0)
  const used = cuts.length
  return {
    stockMm,
    sawCutMm,
    patterns: patternsOf(cuts, lengths, stockMm, sawCutMm),
    used,
    lengthBound: Math.ceil(piecesMm / stockMm - SLACK),
    linearBound: bound,
    pieces: lengths.reduce((sum, { count }) => sum + count, 0),
    piecesMm,
    wasteShare: 1 - piecesMm / (used * stockMm),
    proof,
  }
}

/** Equal lengths together, the longest first. */
function lengthsOf(wanted: readonly WantedLength[], stockMm: number, sawCutMm: number): WantedLength[] {
  if (![stockMm, sawCutMm].every(Number.isInteger) || stockMm <= 0 || sawCutMm < 0)
    throw new RangeError(`expected whole millimetres of stock and saw cut, got ${stockMm} and ${sawCutMm}`)
  const counts = new Map<number, number>()
  for (const { lengthMm, count } of wanted) {
    if (!Number.isInteger(lengthMm) || lengthMm <= 0 || lengthMm > stockMm)
      throw new RangeError(`expected whole millimetres up to the stock of ${stockMm}, got ${lengthMm}`)
    if (count > 0) counts.set(lengthMm, (counts.get(lengthMm) ?? 0) + count)
  }
  return [...counts].map(([lengthMm, count]) => ({ lengthMm, count })).sort((a, b) => b.lengthMm - a.lengthMm)
}

const commonDivisor = (a: number, b: number): number => (b === 0 ? a : commonDivisor(b, a % b))

/** The plan of fewest bars that was found, one entry a bar, beside the bound of the linear program. */
function fewestBars(job: CuttingJob): { cuts: readonly Cut[]; bound: number; proof: CuttingPlan['proof'] } {
  const relaxed = masterProgram(job)
  const bound = Math.max(relaxed.bound, totalOf(job) / job.capacity)
  const least = Math.ceil(bound - SLACK)
  let best: readonly Cut[] = bestFit(job)
  for (let turn = 0; turn < TURNS && best.length > least; turn += 1) {
    const cuts = wholeCuts(job, relaxed, best.length - 1, turn)
    if (cuts.length < best.length) best = cuts
  }
  const isFew = job.counts.reduce((sum, count) => sum + count, 0) <= SEARCHED_PIECES
  while (best.length > least && isFew) {
    const packing = packExactly(job, best.length - 1, SEARCH_STEPS)
    if (packing === null) break
    if (packing === 'impossible') return { cuts: best, bound, proof: 'search' }
    best = packing.bars.map((pattern) => ({ pattern, times: 1 }))
  }
  return { cuts: best, bound, proof: best.length === least ? 'bound' : null }
}

/** Bars cut alike together, the most frequent first. */
function patternsOf(cuts: readonly Cut[], lengths: readonly WantedLength[], stockMm: number, sawCutMm: number): CuttingPattern[] {
  const found = new Map<string, { pattern: Pattern; times: number }>()
  for (const { pattern, times } of cuts) {
    const key = pattern.join()
    found.set(key, { pattern, times: (found.get(key)?.times ?? 0) + times })
  }
  return [...found.values()]
    .map(({ pattern, times }): CuttingPattern => {
      const pieces = lengths.map(({ lengthMm }, i) => ({ lengthMm, count: pattern[i]! })).filter(({ count }) => count > 0)
      const takenMm = pieces.reduce((sum, { lengthMm, count }) => sum + count * (lengthMm + sawCutMm), 0)
      return { pieces, times, offcutMm: Math.max(0, stockMm - takenMm) }
    })
    .sort((a, b) => b.times - a.times || a.offcutMm - b.offcutMm)
}
