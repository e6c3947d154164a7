import type { Edge, Panel } from '../../contracts/appraisal'
import { findNeighbours, findSharedEdges } from '../neighbours'
import { edgeRecords } from './edgeRecords'
import { withoutBeyond } from './withoutBeyond'

/**
 * Brings continuity in line after panels were added, moved, reshaped or removed: an edge that has come to meet a neighbour
 * along at least half of it turns continuous, and on a new panel takes the width and kind of the neighbour's support; a
 * continuous one that has lost its neighbour turns discontinuous. Free edges, and edges whose neighbours did not change, stay
 * as they were typed.
 *
 * @param before - panels before the edit; a panel is known again by its mark while it keeps its number of edges
 * @param after - panels after it
 */
export function settleContinuity(before: readonly Panel[], after: readonly Panel[]): Panel[] {
  const places = new Map(before.map(({ mark }, i) => [mark, i]))
  const sharedBefore = findSharedEdges({ panels: [...before] })
  const sharedAfter = findSharedEdges({ panels: [...after] })
  const neighbours = findNeighbours({ panels: [...after] })
  const recordOf = (panel: number, edge: number): Edge | null => {
    const met = neighbours.find((each) => each.panel === panel && each.edge === edge)
    return met === undefined ? null : edgeRecords(after[met.neighbour]!)[met.neighbourEdge]!
  }
  return after.map((panel, i) => {
    const place = places.get(panel.mark)
    const isKnown = place !== undefined && before[place]!.outline.length === panel.outline.length
    const records = edgeRecords(panel)
    const edges = records.map((edge, e) => {
      const wasShared = isKnown && sharedBefore[place]![e]!
      const isShared = sharedAfter[i]![e]!
      if (wasShared === isShared || edge.continuity === 'free') return edge
      return isShared ? joined(edge, isKnown ? null : recordOf(i, e)) : parted(edge)
    })
    return edges.some((edge, e) => edge !== records[e]) ? { ...panel, edges } : panel
  })
}

function joined(edge: Edge, neighbour: Edge | null): Edge {
  const support = neighbour === null || neighbour.continuity === 'free' ? edge : neighbour
  return { supportWidth: support.supportWidth, kind: support.kind, continuity: 'continuous' }
}

function parted(edge: Edge): Edge {
  return edge.continuity === 'continuous' ? { ...withoutBeyond(edge), continuity: 'discontinuous' } : edge
}
