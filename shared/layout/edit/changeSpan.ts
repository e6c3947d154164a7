import type { Panel, Ring } from '../../contracts/appraisal'
import type { Point } from '../../geometry/point'
import { boundsOf } from '../../geometry/ring'
import { DRAWN_TOLERANCE_MM } from '../../geometry/tolerance'
import type { EditOutcome } from './editOutcome'
import { floorFault } from './floorFault'
import { settleContinuity } from './settleContinuity'

/**
 * Changes a panel's length along x or y by moving its far support line: every vertex of the level on that line or beyond it
 * moves by the difference, so that neighbours stay joined and panels beyond keep their own lengths. Panels on the same
 * support line take the change too (that is what a grid line does), and panels that reach across it are stretched. A void
 * moves whole with the line when it lies beyond it, and stays otherwise.
 *
 * Where the line would pass a corner or another support line on its way in, panels would fold over each other: such a change
 * is refused in words and nothing moves.
 *
 * @param panels - panels of one level, without faults
 * @param index - the panel whose length was typed
 * @param lengthMm - new length of the panel's box along the axis, > 0
 */
export function changeSpan(panels: readonly Panel[], index: number, axis: 'x' | 'y', lengthMm: number): EditOutcome {
  const { minX, minY, maxX, maxY } = boundsOf(panels[index]!.outline)
  const [least, line] = axis === 'x' ? [minX, maxX] : [minY, maxY]
  const shift = lengthMm - (line - least)
  const isBeyond = (point: Point) => point[axis === 'x' ? 0 : 1] >= line - DRAWN_TOLERANCE_MM
  const move = ([x, y]: Point): [number, number] => (axis === 'x' ? [x + shift, y] : [x, y + shift])
  const moveRing = (ring: Ring): Ring => ring.map((point) => (isBeyond(point) ? move(point) : point))
  const moveVoid = (ring: Ring): Ring => (ring.every(isBeyond) ? ring.map(move) : ring)
  const moved = panels.map((panel) => ({
    ...panel,
    outline: moveRing(panel.outline),
    voids: panel.voids.map(moveVoid),
  }))
  const after = boundsOf(moved[index]!.outline)
  const reached = axis === 'x' ? after.maxX - after.minX : after.maxY - after.minY
  const isReached = Math.abs(reached - lengthMm) <= DRAWN_TOLERANCE_MM
  const fault = isReached ? floorFault(moved) : `a corner of ${panels[index]!.mark} stands in its way`
  if (fault === null) return { panels: settleContinuity(panels, moved) }
  const asTyped = `${lengthMm.toLocaleString('en')} would move this support line by ${Math.abs(shift).toLocaleString('en')}`
  return { refused: `${asTyped}: ${fault}. Change the panels one by one, or by their points` }
}

/** Marks of the other panels whose length along the axis a change of span has changed too: to say so. */
export function changedWith(before: readonly Panel[], after: readonly Panel[], index: number, axis: 'x' | 'y'): string[] {
  const length = (panel: Panel) => {
    const { minX, minY, maxX, maxY } = boundsOf(panel.outline)
    return axis === 'x' ? maxX - minX : maxY - minY
  }
  return after
    .filter((panel, i) => i !== index && Math.abs(length(panel) - length(before[i]!)) > DRAWN_TOLERANCE_MM)
    .map(({ mark }) => mark)
}
