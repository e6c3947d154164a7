import type { Panel, Ring } from '../../contracts/appraisal'
import type { Point } from '../../geometry/point'
import type { Bounds } from '../../geometry/ring'
import { boundsOf, edgeOfRing } from '../../geometry/ring'
import { DRAWN_TOLERANCE_MM } from '../../geometry/tolerance'

/** Anticlockwise ring of a rectangle from its corner of least x and y. */
export function rectangleRing([x, y]: Point, alongX: number, alongY: number): Ring {
  return [
    [x, y],
    [x + alongX, y],
    [x + alongX, y + alongY],
    [x, y + alongY],
  ]
}

/** True where the outline has four corners and each side runs along x or y: such a panel is edited by its two lengths. */
export function isRectangle({ outline }: Pick<Panel, 'outline'>): boolean {
  if (outline.length !== 4) return false
  return outline.every((_, i) => {
    const [[ax, ay], [bx, by]] = edgeOfRing(outline, i)
    return Math.abs(bx - ax) < DRAWN_TOLERANCE_MM !== Math.abs(by - ay) < DRAWN_TOLERANCE_MM
  })
}

/** Lengths of a ring's box along x and y, mm. */
export function boxLengths(ring: Ring): Point {
  const { minX, minY, maxX, maxY } = boundsOf(ring)
  return [maxX - minX, maxY - minY]
}

/** Box around all outlines of a level; null where it has no panel. */
export function levelBounds(panels: readonly Pick<Panel, 'outline'>[]): Bounds | null {
  const points = panels.flatMap(({ outline }) => outline)
  return points.length === 0 ? null : boundsOf(points)
}
