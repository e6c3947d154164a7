import type { Point } from '../../geometry/point'
import type { PanelLayout } from '../../layout/panelLayout'
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
 * Source: geometry
 */
export function ribLineEnds(site: PanelSite, { ribLines }: Pick<PanelLayout, 'ribLines'>): RibLineEnds[] {
  return ribLines.map(({ start, end, length }) => {
    const direction: Point = [(end[0] - start[0]) / length, (end[1] - start[1]) / length]
    return { clearMm: length, start: lineEndAt(site, start, direction), end: lineEndAt(site, end, direction) }
  })
}
