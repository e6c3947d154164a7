import type { Point } from './point'
import { turn } from './segment'

/**
 * Convex hull of points: open, anticlockwise, no three corners in one line.
 *
 * Source: A. M. Andrew, "Another efficient algorithm for convex hulls in two dimensions", Information Processing Letters 9 (1979)
 */
export function convexHull(points: readonly Point[]): Point[] {
  const sorted = [...points].sort((a, b) => a[0] - b[0] || a[1] - b[1])
  return [...halfHull(sorted), ...halfHull(sorted.reverse())]
}

/** Chain from the first point to the last, that to the last left out. */
function halfHull(sorted: readonly Point[]): Point[] {
  const chain: Point[] = []
  for (const point of sorted) {
    while (chain.length > 1 && turn(chain[chain.length - 2]!, chain[chain.length - 1]!, point) <= 0) chain.pop()
    chain.push(point)
  }
  return chain.slice(0, -1)
}
