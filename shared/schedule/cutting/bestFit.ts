import type { CuttingJob, Cut } from './cuttingJob'

/**
 * Bars filled piece by piece, the longest first, each into the fullest bar that takes it.
 *
 * Source: best fit decreasing, common to textbooks of packing
 */
export function bestFit({ capacity, sizes, counts }: CuttingJob): Cut[] {
  const bars: { pattern: number[]; room: number }[] = []
  sizes.forEach((size, i) => {
    for (let piece = 0; piece < counts[i]!; piece += 1) {
      let best: (typeof bars)[number] | null = null
      for (const bar of bars) if (bar.room >= size && (!best || bar.room < best.room)) best = bar
      if (!best) {
        best = { pattern: new Array<number>(sizes.length).fill(0), room: capacity }
        bars.push(best)
      }
      best.pattern[i]! += 1
      best.room -= size
    }
  })
  return bars.map(({ pattern }) => ({ pattern, times: 1 }))
}
