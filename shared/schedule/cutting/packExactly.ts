import { type CuttingJob, type Pattern, totalOf } from './cuttingJob'

/** Bars that hold all pieces, or proof that so few bars cannot; null where the search was given up. */
export type Packing = { readonly bars: readonly Pattern[] } | 'impossible' | null

interface Search {
  readonly job: CuttingJob
  readonly failed: Set<string>
  steps: number
}

/**
 * Whether a number of bars holds all pieces: bar by bar, each with the longest piece left and every way to fill it up that leaves no room
 * for another, the fullest first; waste beyond what all bars together may have ends a branch.
 *
 * Source: project rule, bin completion as common to textbooks of packing
 * @param bars - to try
 * @param mostSteps - ways tried before the search is given up
 */
export function packExactly(job: CuttingJob, bars: number, mostSteps: number): Packing {
  const spare = bars * job.capacity - totalOf(job)
  if (spare < 0) return 'impossible'
  const search: Search = { job, failed: new Set(), steps: mostSteps }
  const found = fill(search, [...job.counts], spare)
  if (found) return { bars: found }
  return search.steps > 0 ? 'impossible' : null
}

function fill(search: Search, left: number[], spare: number): Pattern[] | null {
  const longest = left.findIndex((count) => count > 0)
  if (longest < 0) return []
  const key = left.join()
  if (search.failed.has(key)) return null
  for (const { pattern, waste } of fillings(search.job, left, longest, spare)) {
    search.steps -= 1
    if (search.steps <= 0) return null
    const rest = fill(
      search,
      left.map((count, i) => count - pattern[i]!),
      spare - waste,
    )
    if (rest) return [pattern, ...rest]
  }
  if (search.steps > 0) search.failed.add(key)
  return null
}

/** Fillings of one bar that are listed at most: where there are more, the search is over anyway. */
const MOST_FILLINGS = 5000

/** Every full pattern with the longest piece, of no more waste than is to spare, the fullest first. */
function fillings({ capacity, sizes }: CuttingJob, left: readonly number[], longest: number, spare: number) {
  const found: { pattern: number[]; waste: number }[] = []
  const pattern = new Array<number>(sizes.length).fill(0)
  pattern[longest] = 1
  function extend(from: number, room: number): void {
    if (found.length >= MOST_FILLINGS) return
    let at = from
    while (at < sizes.length && (sizes[at]! > room || pattern[at]! >= left[at]!)) at += 1
    if (at === sizes.length) {
      if (room <= spare && isFull(pattern, left, sizes, room)) found.push({ pattern: [...pattern], waste: room })
      return
    }
    const most = Math.min(left[at]! - pattern[at]!, Math.floor(room / sizes[at]!))
    for (let copies = most; copies >= 0; copies -= 1) {
      pattern[at] = pattern[at]! + copies
      extend(at + 1, room - copies * sizes[at]!)
      pattern[at] = pattern[at]! - copies
    }
  }
  extend(longest, capacity - sizes[longest]!)
  return found.sort((a, b) => a.waste - b.waste)
}

function isFull(pattern: readonly number[], left: readonly number[], sizes: readonly number[], room: number): boolean {
  return sizes.every((size, i) => size > room || pattern[i]! >= left[i]!)
}
