import type { Panel, Ring } from '../../contracts/appraisal'
import type { Point } from '../../geometry/point'
import { boundsOf, distance, edgeOfRing } from '../../geometry/ring'
import { DRAWN_TOLERANCE_MM } from '../../geometry/tolerance'
import { usualEdge } from './addRectangle'
import { edgeRecords } from './edgeRecords'
import type { EditOutcome } from './editOutcome'
import { floorFault } from './floorFault'
import { rectangleRing } from './rectangle'
import { settleContinuity } from './settleContinuity'

/**
 * Gives a panel the outline typed or drawn. An edge that keeps both its points, or as many edges as before, keeps its record;
 * a new one takes the level's usual support. Refused, in words, where the points make no floor.
 */
export function setOutline(panels: readonly Panel[], index: number, outline: Ring): EditOutcome {
  const before = panels[index]!
  const records = edgeRecords(before)
  const edges = outline.map((_, i) => {
    if (outline.length === before.outline.length) return records[i]!
    const kept = before.outline.findIndex((_, e) => isSameEdge(edgeOfRing(before.outline, e), edgeOfRing(outline, i)))
    return records[kept] ?? usualEdge(panels)
  })
  const changed = panels.map((panel, i) => (i === index ? { ...panel, outline, edges } : panel))
  const fault = floorFault(changed)
  return fault === null ? { panels: settleContinuity(panels, changed) } : { refused: fault }
}

/** Adds a panel of any outline, with the level's usual supports. Refused, in words, where it makes no floor. */
export function addPolygon(panels: readonly Panel[], mark: string, outline: Ring, ribDirection: number): EditOutcome {
  const added: Panel = { mark, repeat: 1, outline, edges: [usualEdge(panels)], ribDirection, voids: [], corners: 'held' }
  const fault = floorFault([...panels, added])
  return fault === null ? { panels: settleContinuity(panels, [...panels, added]) } : { refused: fault }
}

/** Gives a panel the voids typed or drawn. Refused, in words, where one is no simple ring, lies outside or over another. */
export function setVoids(panels: readonly Panel[], index: number, voids: readonly Ring[]): EditOutcome {
  const changed = panels.map((panel, i) => (i === index ? { ...panel, voids: [...voids] } : panel))
  const fault = floorFault(changed)
  return fault === null ? { panels: changed } : { refused: fault }
}

/** Rectangular void of a size, its corner of least x and y so far from that of the panel's box, mm. */
export function voidRectangle(panel: Panel, alongX: number, alongY: number, [offsetX, offsetY]: Point): Ring {
  const { minX, minY } = boundsOf(panel.outline)
  return rectangleRing([minX + offsetX, minY + offsetY], alongX, alongY)
}

function isSameEdge([a, b]: readonly [Point, Point], [c, d]: readonly [Point, Point]): boolean {
  return distance(a, c) < DRAWN_TOLERANCE_MM && distance(b, d) < DRAWN_TOLERANCE_MM
}
