import { frameAt } from '../../geometry/frame'
import type { Point } from '../../geometry/point'
import { edgeOfRing } from '../../geometry/ring'
import { enclosingRectangle } from '../../layout/enclosingRectangle'
import type { PanelAreas } from '../../layout/panelLayout'
import { type PanelField, panelField } from '../../layout/panelField'
import { solidAreas } from '../../layout/solidAreas'
import { edgesLengthMm, endBeyond } from '../analysis/endBeyond'
import type { LineEnd } from '../analysis/levelStrips'
import type { EndOfSpan } from '../analysis/spanForces'
import type { PanelSite } from '../panelSite'
import { remember } from '../remember'

/** One side of the rectangle a solid panel is sized on. */
export interface SlabSide extends LineEnd {
  /** Continuous along some of its edges only; then it counts as discontinuous. */
  readonly isMixed: boolean
}

/** One direction of that rectangle. */
export interface SlabAxis {
  /** Unit vector in level coordinates, and its angle in degrees, 0 ≤ angle < 180. */
  readonly direction: Point
  readonly angle: number
  /** Clear distance between the faces of its ends, mm. */
  readonly clearMm: number
  readonly ends: Readonly<Record<EndOfSpan, SlabSide>>
}

/** A solid panel as a rectangle: what does not change with its thickness. */
export interface SlabPlan {
  readonly site: PanelSite
  readonly areas: PanelAreas
  /** Whether the outline is that rectangle. */
  readonly isRectangle: boolean
  /** Along the longer side of the outline's rectangle, and across it. */
  readonly axes: readonly [SlabAxis, SlabAxis]
  /** The panel turned so that bars along an axis run along x. */
  readonly fieldAlong: (axis: SlabAxis) => PanelField
}

const dot = (a: Point, b: Point) => a[0] * b[0] + a[1] * b[1]

/**
 * A solid panel's rectangle with the edges that bear on each of its sides.
 *
 * Source: project rule, engine design section 1 (least-area enclosing rectangle); an edge belongs to the side it faces most
 */
export function slabPlan(site: PanelSite): SlabPlan {
  const { longDirection, isFilled } = enclosingRectangle(site.panel.outline)
  const along = longDirection % 180
  const across = (along + 90) % 180
  const fields = remember<PanelField>()
  return {
    site,
    areas: solidAreas(site.panel, site.sharedEdges),
    isRectangle: isFilled,
    axes: [slabAxis(site, along), slabAxis(site, across)],
    fieldAlong: ({ angle }) => fields(String(angle), () => panelField({ ...site.panel, ribDirection: angle }, site.clear, 0)),
  }
}

function slabAxis(site: PanelSite, angle: number): SlabAxis {
  const direction = frameAt([0, 0], angle).toLevel([1, 0])
  const reach = site.clear.ring.map((point) => dot(point, direction))
  return {
    direction,
    angle,
    clearMm: Math.max(...reach) - Math.min(...reach),
    ends: { start: side(site, [-direction[0], -direction[1]]), end: side(site, direction) },
  }
}

/** Edges that face a direction more than any other of the four; where none does, the one that faces it most. */
function side(site: PanelSite, outwards: Point): SlabSide {
  const { panel, edges } = site
  const facing = panel.outline.map((_, i) => {
    const [[ax, ay], [bx, by]] = edgeOfRing(panel.outline, i)
    const length = Math.hypot(bx - ax, by - ay)
    return dot([(by - ay) / length, (ax - bx) / length], outwards)
  })
  const turned = Math.SQRT1_2 - 1e-9
  const chosen = facing.flatMap((cosine, i) => (cosine > turned ? [i] : []))
  const numbers = chosen.length > 0 ? chosen : [facing.indexOf(Math.max(...facing))]
  const isAll = numbers.every((i) => edges[i]!.continuity === 'continuous')
  return {
    edges: numbers,
    supportMm: Math.max(...numbers.map((i) => edges[i]!.supportWidth)),
    isContinuous: isAll,
    isFree: numbers.some((i) => edges[i]!.continuity === 'free'),
    supportLengthMm: edgesLengthMm(site, numbers),
    beyond: endBeyond(site, numbers),
    isMixed: !isAll && numbers.some((i) => edges[i]!.continuity === 'continuous'),
  }
}
