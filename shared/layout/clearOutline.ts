import type { Panel, Ring } from '../contracts/appraisal'
import type { OffsetRing } from '../geometry/offsetRing'
import { offsetRing, vanishedEdge } from '../geometry/offsetRing'
import type { Point } from '../geometry/point'
import { isSimple } from '../geometry/ringFault'
import { OutOfScopeError } from '../outOfScope'
import { panelEdges } from './panelEdges'

/** The outline between support faces. */
export interface ClearOutline {
  /** Open, anticlockwise, level coordinates, mm. */
  readonly ring: Ring
  /** For each edge of `ring`, the edge of the panel's outline that it runs along. */
  readonly sources: readonly number[]
  /** For each edge of the panel's outline, the two ends of its support face. */
  readonly faces: OffsetRing['moved']
}

/**
 * Clear outline of a panel: each edge moved in by half its support's width, corners mitred; free edges stay.
 * Where two edges in one line have supports of different widths, the face steps square at the vertex.
 *
 * Source: project rule, panels are drawn on support centre-lines
 * @throws OutOfScopeError `edges.N.supportWidth` when the supports leave an edge no clear length, `outline` when they meet elsewhere
 */
export function clearOutline(panel: Pick<Panel, 'outline' | 'edges'>): ClearOutline {
  const edges = panelEdges(panel)
  const offset = offsetRing(
    panel.outline,
    edges.map(({ supportWidth }) => supportWidth / 2),
  )
  const vanished = vanishedEdge(panel.outline, offset)
  if (vanished !== null) {
    const path = panel.edges.length === 1 ? 'edges.0.supportWidth' : `edges.${vanished}.supportWidth`
    throw new OutOfScopeError(
      path,
      `the supports leave no clear length along edge ${vanished}: expected a longer edge or narrower supports`,
    )
  }
  if (!isSimple(offset.ring))
    throw new OutOfScopeError('outline', 'the supports meet inside the panel: expected room between their faces')
  return { ring: offset.ring.map(([x, y]: Point): [number, number] => [x, y]), sources: offset.sources, faces: offset.moved }
}
