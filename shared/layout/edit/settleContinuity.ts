import type { Edge, Panel } from '../../contracts/appraisal'
import { edgeRecords } from './edgeRecords'
import { meetingEdges, sharedRatio } from './meetingEdges'

/** An edge counts as joined when neighbours share at least this part of it. */
const JOINED_RATIO = 0.5

/**
 * Brings continuity in line after panels were added, moved, reshaped or removed: an edge that has come to meet a neighbour
 * turns continuous and takes the width and kind of the neighbour's support; a continuous one that has lost its neighbour
 * turns discontinuous. Free edges, and edges whose neighbours did not change, stay as they were typed.
 *
 * @param before - panels before the edit; a panel is known again by its mark while it keeps its number of edges
 * @param after - panels after it
 */
export function settleContinuity(before: readonly Panel[], after: readonly Panel[]): Panel[] {
  const places = new Map(before.map((panel, i) => [panel.mark, i]))
  return after.map((panel, i) => {
    const place = places.get(panel.mark)
    const isKnown = place !== undefined && before[place]!.outline.length === panel.outline.length
    let isChanged = false
    const edges = edgeRecords(panel).map((edge, e) => {
      const wasJoined = isKnown && sharedRatio(before, place, e) >= JOINED_RATIO
      const isJoined = sharedRatio(after, i, e) >= JOINED_RATIO
      if (wasJoined === isJoined || edge.continuity === 'free') return edge
      isChanged = true
      return isJoined ? joined(edge, isKnown ? null : neighbourEdge(after, i, e)) : parted(edge)
    })
    return isChanged ? { ...panel, edges } : panel
  })
}

function joined(edge: Edge, neighbour: Edge | null): Edge {
  const support = neighbour === null || neighbour.continuity === 'free' ? edge : neighbour
  return { supportWidth: support.supportWidth, kind: support.kind, continuity: 'continuous' }
}

function parted(edge: Edge): Edge {
  return edge.continuity === 'continuous' ? { ...edge, continuity: 'discontinuous' } : edge
}

function neighbourEdge(panels: readonly Panel[], panel: number, edge: number): Edge | null {
  const met = meetingEdges(panels, panel, edge)[0]
  return met === undefined ? null : edgeRecords(panels[met.panel]!)[met.edge]!
}
