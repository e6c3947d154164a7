/**
 * Scales of reduction in use, as 1 to so many.
 *
 * Source: ISO 5455:1979, recommended scales of reduction (from memory)
 */
export const REDUCTIONS = [1, 2, 5, 10, 20, 50, 100, 200, 500, 1000, 2000, 5000, 10_000, 20_000, 50_000] as const

/** A drawing at each scale asks for a room; the largest scale at which it has it, as 1 to so many; null: none of them. */
export function largestScale(fits: (reduction: number) => boolean): number | null {
  return REDUCTIONS.find(fits) ?? null
}
