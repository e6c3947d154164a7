import type { Level, Panel } from '../contracts/appraisal'
import type { Point } from '../geometry/point'
import { boundsOf, boundsOverlap, distance, edgeOfRing } from '../geometry/ring'
import { DRAWN_TOLERANCE_MM } from '../geometry/tolerance'

/** Two panels of a level that stand on one support: each pair is listed from both sides. Numbers of panels and edges from 0. */
export interface Neighbour {
  readonly panel: number
  readonly edge: number
  readonly neighbour: number
  readonly neighbourEdge: number
  /** Length of the support line that both have, mm. */
  readonly overlap: number
}

/**
 * Support lines that are shorter than this are no neighbourhood (panels that meet at a corner), mm.
 *
 * Source: project rule, less than the width of a narrow rib
 */
const LEAST_OVERLAP_MM = 50

/**
 * Edges of a level's panels that lie on one support line: in one line to a millimetre, running opposite ways, with more than 50 mm in
 * common. Sorted by panel, edge, neighbour, neighbour's edge.
 */
export function findNeighbours({ panels }: Pick<Level, 'panels'>): Neighbour[] {
  const bounds = panels.map(({ outline }) => boundsOf(outline))
  const order = panels.map((_, i) => i).sort((a, b) => bounds[a]!.minX - bounds[b]!.minX)
  const found: Neighbour[] = []
  order.forEach((first, position) => {
    for (const second of order.slice(position + 1)) {
      if (bounds[second]!.minX > bounds[first]!.maxX + DRAWN_TOLERANCE_MM) break
      if (boundsOverlap(bounds[first]!, bounds[second]!, -2 * DRAWN_TOLERANCE_MM)) found.push(...between(panels, first, second))
    }
  })
  return found.sort(
    (a, b) => a.panel - b.panel || a.edge - b.edge || a.neighbour - b.neighbour || a.neighbourEdge - b.neighbourEdge,
  )
}

/**
 * For each panel of a level, for each edge of its outline: whether other panels stand on the same support along at least half of it.
 */
export function findSharedEdges(level: Pick<Level, 'panels'>): boolean[][] {
  const shared = level.panels.map(({ outline }) => outline.map(() => 0))
  for (const { panel, edge, overlap } of findNeighbours(level)) shared[panel]![edge]! += overlap
  return level.panels.map(({ outline }, i) =>
    outline.map((_, edge) => shared[i]![edge]! >= distance(...edgeOfRing(outline, edge)) / 2),
  )
}

function between(panels: readonly Panel[], first: number, second: number): Neighbour[] {
  const [a, b] = [panels[first]!.outline, panels[second]!.outline]
  return a.flatMap((_, edge) =>
    b.flatMap((_, neighbourEdge): Neighbour[] => {
      const overlap = commonLength(edgeOfRing(a, edge), edgeOfRing(b, neighbourEdge))
      if (overlap <= LEAST_OVERLAP_MM) return []
      return [
        { panel: first, edge, neighbour: second, neighbourEdge, overlap },
        { panel: second, edge: neighbourEdge, neighbour: first, neighbourEdge: edge, overlap },
      ]
    }),
  )
}

/** Length that two edges have in common when they lie in one line and run opposite ways, else 0, mm. */
function commonLength([a, b]: readonly [Point, Point], [c, d]: readonly [Point, Point]): number {
  const length = distance(a, b)
  const [ux, uy] = [(b[0] - a[0]) / length, (b[1] - a[1]) / length]
  const along = ([x, y]: Point) => (x - a[0]) * ux + (y - a[1]) * uy
  const across = ([x, y]: Point) => (y - a[1]) * ux - (x - a[0]) * uy
  const [from, to] = [along(d), along(c)]
  const [start, end] = [Math.max(0, from), Math.min(length, to)]
  if (end - start <= 0) return 0
  const offLine = (at: number) => Math.abs(across(d) + ((across(c) - across(d)) * (at - from)) / (to - from))
  return offLine(start) <= DRAWN_TOLERANCE_MM && offLine(end) <= DRAWN_TOLERANCE_MM ? end - start : 0
}
