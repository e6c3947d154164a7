import type { Panel, Ring } from '../../contracts/appraisal'
import type { Point } from '../../geometry/point'
import { boundsOf } from '../../geometry/ring'
import { nextMark } from './nextMark'
import { levelBounds } from './rectangle'
import { settleContinuity } from './settleContinuity'

/** Moves a ring by x and y, mm. */
export function movedRing(ring: Ring, [dx, dy]: Point): Ring {
  return ring.map(([x, y]) => [x + dx, y + dy])
}

/** Panels with one moved so that its box's corner of least x and y stands at `to`, voids with it; continuity follows. */
export function movePanel(panels: readonly Panel[], index: number, to: Point): Panel[] {
  const panel = panels[index]!
  const { minX, minY } = boundsOf(panel.outline)
  const moved = shifted(panel, [to[0] - minX, to[1] - minY])
  return settleContinuity(
    panels,
    panels.map((each, i) => (i === index ? moved : each)),
  )
}

/** Panels with a copy of one beside it, to the right of the level, under the next mark. */
export function copyPanel(panels: readonly Panel[], index: number): Panel[] {
  const panel = panels[index]!
  const beside = levelBounds(panels)!.maxX - boundsOf(panel.outline).minX
  const mark = nextMark(
    panels.map(({ mark }) => mark),
    'P1',
  )
  const copy = { ...shifted(panel, [beside, 0]), mark }
  return settleContinuity(panels, [...panels, copy])
}

/** Panels without one; edges that met it turn discontinuous. */
export function removePanel(panels: readonly Panel[], index: number): Panel[] {
  return settleContinuity(
    panels,
    panels.filter((_, i) => i !== index),
  )
}

function shifted(panel: Panel, by: Point): Panel {
  return { ...panel, outline: movedRing(panel.outline, by), voids: panel.voids.map((ring) => movedRing(ring, by)) }
}
