import type { Ring } from '../contracts/appraisal'
import { edgeOfRing } from '../geometry/ring'
import { DRAWN_TOLERANCE_MM } from '../geometry/tolerance'

/** Support lines of a level across one direction. */
export interface PlanGrid {
  /** Positions of lines with a bubble, mm, in order: those that carry an edge, and both ends of the floor. */
  readonly lines: readonly number[]
  /** Every position at which an outline has a corner, mm, in order; the lines are among them. */
  readonly corners: readonly number[]
}

/** Grid of a level along x (upright lines) or y (level lines), from the outlines of its panels; at least one. */
export function planGrid(outlines: readonly Ring[], axis: 'x' | 'y'): PlanGrid {
  const k = axis === 'x' ? 0 : 1
  const corners = distinct(outlines.flatMap((ring) => ring.map((point) => point[k]!)))
  const edges = outlines.flatMap((ring) =>
    ring.flatMap((_, i) => {
      const [a, b] = edgeOfRing(ring, i)
      return Math.abs(a[k]! - b[k]!) < DRAWN_TOLERANCE_MM ? [a[k]!] : []
    }),
  )
  return { corners, lines: distinct([corners[0]!, ...edges, corners.at(-1)!]) }
}

/** Name in the bubble: 1, 2, 3 … for lines across x; a, b … z, aa … for lines across y. */
export function gridName(index: number, axis: 'x' | 'y'): string {
  if (axis === 'x') return String(index + 1)
  const letter = String.fromCharCode(97 + (index % 26))
  return index < 26 ? letter : `${gridName(Math.floor(index / 26) - 1, 'y')}${letter}`
}

function distinct(values: readonly number[]): number[] {
  const sorted = [...values].sort((a, b) => a - b)
  return sorted.filter((value, i) => i === 0 || value - sorted[i - 1]! > DRAWN_TOLERANCE_MM)
}
