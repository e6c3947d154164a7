import type { Edge, Panel } from '../../contracts/appraisal'
import type { Point } from '../../geometry/point'
import { boundsOf, boundsOverlap } from '../../geometry/ring'
import { DRAWN_TOLERANCE_MM } from '../../geometry/tolerance'
import { edgeRecords } from './edgeRecords'
import { levelBounds, rectangleRing } from './rectangle'
import { settleContinuity } from './settleContinuity'

/** Support width of the first panel of a level, mm, until another is typed. Source: project rule, a usual beam width */
const FIRST_SUPPORT_WIDTH_MM = 250

/**
 * Panels typed one after the other stand in rows of up to this length, mm, or of the level's own length where that is more.
 *
 * Source: project rule, a sheet of panels is read best in rows, and few buildings are longer between joints
 */
const ROW_MM = 36_000

/** A panel typed as two lengths. Lengths in mm, rib direction in degrees from x, 0 ≤ d < 180. */
export interface RectangleInput {
  readonly mark: string
  readonly alongX: number
  readonly alongY: number
  readonly ribDirection: number
  readonly repeat: number
}

/**
 * Panels with a rectangle added: beside the last one, on its lower line, where that place is free and the row not too long;
 * else at the left, above the level. Edges that meet a neighbour are continuous on both sides; the others discontinuous, as wide and of the
 * kind most edges of the level are.
 */
export function addRectangle(panels: readonly Panel[], input: RectangleInput): Panel[] {
  const { mark, repeat, ribDirection } = input
  const outline = rectangleRing(freePlace(panels, input.alongX, input.alongY), input.alongX, input.alongY)
  const added: Panel = { mark, repeat, outline, edges: [usualEdge(panels)], ribDirection, voids: [], corners: 'held' }
  return settleContinuity(panels, [...panels, added])
}

/** The edge record that most supported edges of the level have, taken as discontinuous. */
export function usualEdge(panels: readonly Panel[]): Edge {
  const counts = new Map<string, { edge: Edge; count: number }>()
  for (const edge of panels.flatMap(edgeRecords).filter(({ continuity }) => continuity !== 'free')) {
    const key = `${edge.kind} ${edge.supportWidth}`
    counts.set(key, { edge, count: (counts.get(key)?.count ?? 0) + 1 })
  }
  const [most] = [...counts.values()].sort((a, b) => b.count - a.count)
  return { kind: 'beam', supportWidth: FIRST_SUPPORT_WIDTH_MM, ...most?.edge, continuity: 'discontinuous' }
}

function freePlace(panels: readonly Panel[], alongX: number, alongY: number): Point {
  const last = panels.at(-1)
  const level = levelBounds(panels)
  if (last === undefined || level === null) return [0, 0]
  const { maxX, minY } = boundsOf(last.outline)
  const beside = boundsOf(rectangleRing([maxX, minY], alongX, alongY))
  const isTaken = panels.some(({ outline }) => boundsOverlap(beside, boundsOf(outline), DRAWN_TOLERANCE_MM))
  const isTooLong = beside.maxX - level.minX > Math.max(ROW_MM, level.maxX - level.minX)
  return isTaken || isTooLong ? [level.minX, level.maxY] : [maxX, minY]
}
