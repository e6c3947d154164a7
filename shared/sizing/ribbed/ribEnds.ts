import type { Point } from '../../geometry/point'
import type { PanelLayout } from '../../layout/panelLayout'
import { OutOfScopeError } from '../../outOfScope'
import { type LineEndOnEdge, lineEndAt } from '../bars/lineEndAt'
import type { PanelSite } from '../panelSite'

/** A line of rib bars with its ends; start and end in rib direction. */
export interface RibLineEnds {
  readonly clearMm: number
  readonly start: LineEndOnEdge
  readonly end: LineEndOnEdge
}

/**
 * Ends of every line of rib bars of a panel.
 *
 * Source: project rule, ribs run between supports
 * @throws OutOfScopeError `edges` where a rib ends on a free edge
 */
export function ribLineEnds(site: PanelSite, { ribLines }: Pick<PanelLayout, 'ribLines'>): RibLineEnds[] {
  const supported = (at: Point, direction: Point): LineEndOnEdge => {
    const found = lineEndAt(site, at, direction)
    if (found.edge !== null && site.edges[found.edge]!.continuity === 'free')
      throw new OutOfScopeError(
        'edges',
        `ribs end on free edge ${found.edge + 1}: expected ribs that run from support to support`,
      )
    return found
  }
  return ribLines.map(({ start, end, length }) => {
    const direction: Point = [(end[0] - start[0]) / length, (end[1] - start[1]) / length]
    return { clearMm: length, start: supported(start, direction), end: supported(end, direction) }
  })
}
