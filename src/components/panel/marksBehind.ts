import type { Panel } from '#shared/contracts/appraisal'
import { edgeRecords } from '#shared/layout/edit/edgeRecords'
import { findNeighbours } from '#shared/layout/neighbours'

/** For each edge of a panel the marks of the panels that stand on it, the one with most of it first. */
export function marksBehind(panels: readonly Panel[], index: number): string[][] {
  const panel = panels[index]
  if (!panel) return []
  const met = findNeighbours({ panels: [...panels] }).filter((each) => each.panel === index)
  return edgeRecords(panel).map((_, edge) => {
    const onEdge = met.filter((each) => each.edge === edge).sort((a, b) => b.overlap - a.overlap)
    return [...new Set(onEdge.map(({ neighbour }) => panels[neighbour]!.mark))]
  })
}
