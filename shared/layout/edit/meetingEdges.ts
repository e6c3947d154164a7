import type { Panel } from '../../contracts/appraisal'
import type { Point } from '../../geometry/point'
import { distance, edgeOfRing } from '../../geometry/ring'
import { DRAWN_TOLERANCE_MM } from '../../geometry/tolerance'

/** An edge of another panel that lies along the asked one; `from` and `to` are where, mm from the asked edge's first vertex. */
export interface MeetingEdge {
  readonly panel: number
  readonly edge: number
  readonly from: number
  readonly to: number
}

/**
 * Edges of other panels that share a stretch of a panel's edge: on one line, running the other way.
 *
 * @param panels - panels of one level
 * @param panel - index of the panel asked about
 * @param edge - index of its edge
 */
export function meetingEdges(panels: readonly Panel[], panel: number, edge: number): MeetingEdge[] {
  const asked = edgeOfRing(panels[panel]!.outline, edge)
  return panels.flatMap(({ outline }, other) => {
    if (other === panel) return []
    return outline.flatMap((_, i) => {
      const shared = sharedStretch(asked, edgeOfRing(outline, i))
      return shared === null ? [] : [{ panel: other, edge: i, from: shared[0], to: shared[1] }]
    })
  })
}

/** Part of a panel's edge that other panels share, 0 to 1. */
export function sharedRatio(panels: readonly Panel[], panel: number, edge: number): number {
  const length = distance(...edgeOfRing(panels[panel]!.outline, edge))
  const stretches = meetingEdges(panels, panel, edge).map(({ from, to }) => to - from)
  return stretches.reduce((sum, stretch) => sum + stretch, 0) / length
}

function sharedStretch([a, b]: readonly [Point, Point], [c, d]: readonly [Point, Point]): readonly [number, number] | null {
  const length = distance(a, b)
  const along: Point = [(b[0] - a[0]) / length, (b[1] - a[1]) / length]
  const offLine = (p: Point) => Math.abs((p[0] - a[0]) * along[1] - (p[1] - a[1]) * along[0])
  if (offLine(c) > DRAWN_TOLERANCE_MM || offLine(d) > DRAWN_TOLERANCE_MM) return null
  const station = (p: Point) => (p[0] - a[0]) * along[0] + (p[1] - a[1]) * along[1]
  const from = Math.max(0, station(d))
  const to = Math.min(length, station(c))
  return to - from > DRAWN_TOLERANCE_MM ? [from, to] : null
}
