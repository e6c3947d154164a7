import type { CuttingJob, Pattern } from './cuttingJob'

/**
 * The pattern of greatest worth, no size in it more often than it is wanted: a bounded knapsack, by dynamic programming over sizes and
 * steps.
 *
 * Source: Gilmore and Gomory, A linear programming approach to the cutting-stock problem, Operations Research 9 (1961), the auxiliary
 * problem; the method is common to textbooks
 * @param worths - of one piece of each size; those at or below 0 are left out
 */
export function dearestPattern(
  { capacity, sizes, counts }: CuttingJob,
  worths: readonly number[],
): { pattern: Pattern; worth: number } {
  let best = new Float64Array(capacity + 1)
  const taken = sizes.map((size, i) => {
    const copies = new Uint16Array(capacity + 1)
    const worth = worths[i]!
    if (worth <= 0) return copies
    const before = best
    best = before.slice()
    for (let step = size; step <= capacity; step += 1) {
      const most = Math.min(counts[i]!, Math.floor(step / size))
      for (let copy = 1; copy <= most; copy += 1) {
        const value = before[step - copy * size]! + copy * worth
        if (value > best[step]!) {
          best[step] = value
          copies[step] = copy
        }
      }
    }
    return copies
  })
  const pattern = new Array<number>(sizes.length).fill(0)
  let step = capacity
  for (let i = sizes.length - 1; i >= 0; i -= 1) {
    pattern[i] = taken[i]![step]!
    step -= pattern[i]! * sizes[i]!
  }
  return { pattern, worth: best[capacity]! }
}
