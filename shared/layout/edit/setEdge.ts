import type { Edge, Panel } from '../../contracts/appraisal'
import { findNeighbours } from '../neighbours'
import { edgeRecords } from './edgeRecords'
import { withoutBeyond } from './withoutBeyond'

/**
 * Panels with one edge's record changed; where neighbours stand on the same support, theirs change with it, so that both sides
 * of a support line agree; what goes on behind is each panel's own, and goes where an edge is not continuous. A free edge has no support,
 * so its width becomes 0; an edge that stops being free takes `usualWidthMm`.
 *
 * @param change - what was typed: any of width, kind, continuity, and what goes on behind, undefined to leave that to the plan
 * @param usualWidthMm - width for an edge that stops being free without a width of its own
 */
export function setEdge(
  panels: readonly Panel[],
  panel: number,
  edge: number,
  change: Partial<Edge>,
  usualWidthMm: number,
): Panel[] {
  const changed = (before: Edge, isOwn: boolean): Edge => {
    const typed = { ...before, ...change }
    const beyond = isOwn ? typed.beyond : before.beyond
    const after: Edge = beyond && typed.continuity === 'continuous' ? { ...typed, beyond } : withoutBeyond(typed)
    if (after.continuity === 'free') return { ...after, supportWidth: 0 }
    const width = before.continuity === 'free' ? (change.supportWidth ?? usualWidthMm) : after.supportWidth
    return { ...after, supportWidth: width }
  }
  const met = findNeighbours({ panels: [...panels] }).filter((each) => each.panel === panel && each.edge === edge)
  const targets = [{ panel, edge }, ...met.map(({ neighbour, neighbourEdge }) => ({ panel: neighbour, edge: neighbourEdge }))]
  return panels.map((each, p) => {
    const edges = targets.filter((target) => target.panel === p).map((target) => target.edge)
    if (edges.length === 0) return each
    return { ...each, edges: edgeRecords(each).map((record, e) => (edges.includes(e) ? changed(record, p === panel) : record)) }
  })
}
