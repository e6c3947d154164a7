import type { Panel } from '../contracts/appraisal'
import { offsetRing } from '../geometry/offsetRing'
import type { Point } from '../geometry/point'
import { edgeOfRing, signedArea } from '../geometry/ring'
import type { ClearOutline } from './clearOutline'
import { panelEdges } from './panelEdges'

/** Strips over supports, mm². */
export interface StripAreas {
  /** Between the outline (support centre-lines) and the clear outline. */
  readonly strips: number
  /** What stands over walls: to the centre-line, and to the outer face of walls that no other panel shares. */
  readonly wallStrips: number
}

/**
 * Plan areas over supports. Corners are divided along the mitre, so each edge has its own strip. The outer half of a wall lies
 * outside the outline: it is part of `wallStrips` but neither of `strips` nor of the gross area. Outside it ends on the
 * centre-line of the next edge, or on the mitre where that is an unshared wall too.
 *
 * Source: project rule, a floor bears over its walls and is measured between beams
 * @param sharedEdges - one for each edge of the outline: true where another panel of the level stands on the same support
 */
export function stripAreas(
  panel: Pick<Panel, 'outline' | 'edges'>,
  clear: ClearOutline,
  sharedEdges: readonly boolean[],
): StripAreas {
  const edges = panelEdges(panel)
  const isWall = edges.map(({ kind, continuity }) => kind === 'wall' && continuity !== 'free')
  const outer = offsetRing(
    panel.outline,
    edges.map(({ supportWidth }, i) => (isWall[i] && !sharedEdges[i] ? -supportWidth / 2 : 0)),
  )
  const gross = signedArea(panel.outline)
  const wallStrips = panel.outline.map((_, i) => {
    if (!isWall[i]) return 0
    const [start, end] = edgeOfRing(panel.outline, i)
    return Math.max(0, stripArea(start, end, clear.faces[i]!) - stripArea(start, end, outer.moved[i]!))
  })
  return { strips: Math.max(0, gross - signedArea(clear.ring)), wallStrips: wallStrips.reduce((sum, each) => sum + each, 0) }
}

/** Area between an edge and where it was moved to, mm²: positive when moved inwards. */
function stripArea(start: Point, end: Point, face: { readonly start: Point; readonly end: Point }): number {
  return signedArea([start, end, face.end, face.start])
}
