import { bestFit } from './bestFit'
import { type CuttingJob, type Cut, jobLeft, type Pattern, widened } from './cuttingJob'
import { masterProgram, type Relaxed } from './masterProgram'
import { packExactly } from './packExactly'

/** A number of times this little below a whole one is that whole one. */
const WHOLE = 1e-6

/** Ways that the exact search may try on what is left after whole cuts. */
const SEARCH_STEPS = 20_000

/** Pieces up to which what is left is searched exactly. */
const FEW_PIECES = 60

const sumOf = (values: readonly number[]) => values.reduce((sum, value) => sum + value, 0)
const barsIn = (cuts: readonly Cut[]) => cuts.reduce((sum, { times }) => sum + times, 0)

/**
 * A plan in whole bars from the fractional one: patterns are cut as often as their whole part, the program is solved again for what is
 * left, and where no whole part is left one pattern is cut once; few pieces left over are packed by search or best fit.
 *
 * Source: project rule, rounding and residual problems as common to textbooks of cutting stock
 * @param target - bars that need not be bettered
 * @param turn - which of the fractional patterns is cut first, the most whole one being 0: other turns find other plans
 */
export function wholeCuts(job: CuttingJob, relaxed: Relaxed, target: number, turn: number): Cut[] {
  const cuts: Cut[] = []
  const left = [...job.counts]
  let { cuts: fractional, patterns } = relaxed
  for (let round = 0; sumOf(left) > 0; round += 1) {
    const whole = wholePart(fractional)
    const chosen = whole.length > 0 ? whole : onceMore(fractional, round === 0 || cuts.length === 0 ? turn : turn % (round + 1))
    for (const cut of chosen) take(cuts, left, cut)
    if (sumOf(left) === 0) break
    const rest = jobLeft(job, left)
    const fitted = finish(rest, target - barsIn(cuts))
    if (fitted) return [...cuts, ...fitted.map(({ pattern, times }) => ({ pattern: widened(pattern, left), times }))]
    const open = left.map((count) => count > 0)
    const known = patterns.filter((pattern) => pattern.every((count, i) => count <= left[i]!))
    const next = masterProgram(
      rest,
      known.map((pattern) => pattern.filter((_, i) => open[i])),
    )
    const wide = (pattern: Pattern) => widened(pattern, left)
    fractional = next.cuts.map(({ pattern, times }) => ({ pattern: wide(pattern), times }))
    patterns = [...patterns, ...next.patterns.slice(known.length).map(wide)]
  }
  return cuts
}

/** Bars for few pieces left, where they need no more than are to be had; null where that is not found. */
function finish(rest: CuttingJob, bars: number): Cut[] | null {
  const fitted = bestFit(rest)
  if (fitted.length <= bars) return fitted
  if (sumOf(rest.counts) > FEW_PIECES || bars <= 0) return null
  const packing = packExactly(rest, bars, SEARCH_STEPS)
  return packing === null || packing === 'impossible' ? null : packing.bars.map((pattern) => ({ pattern, times: 1 }))
}

const wholePart = (cuts: readonly Cut[]) =>
  cuts.map(({ pattern, times }) => ({ pattern, times: Math.floor(times + WHOLE) })).filter(({ times }) => times > 0)

/** One pattern once: of those cut a part of a time, in order of that part. */
function onceMore(cuts: readonly Cut[], turn: number): Cut[] {
  const ordered = [...cuts].sort((a, b) => b.times - a.times)
  return [{ pattern: ordered[turn % ordered.length]!.pattern, times: 1 }]
}

/** Cuts a pattern as often as what is left allows, and the last time for what is left of it. */
function take(cuts: Cut[], left: number[], { pattern, times }: Cut): void {
  for (let time = 0; time < times; time += 1) {
    const own = pattern.map((count, i) => Math.min(count, left[i]!))
    if (sumOf(own) === 0) return
    own.forEach((count, i) => (left[i]! -= count))
    cuts.push({ pattern: own, times: 1 })
  }
}
