import type { ApiIssue } from '../../contracts/apiError'
import type { Edge, Level } from '../../contracts/appraisal'
import { findNeighbours, type Neighbour } from '../neighbours'

/**
 * What was typed to go on behind edges: only behind continuous ones, and a panel that is named there must stand on that very edge.
 *
 * Source: project rule, input is refused, never passed over
 * @param path - of the level, as `levels.0`
 */
export function checkBeyond(level: Level, path: string): ApiIssue[] {
  const { panels } = level
  if (!panels.some(({ edges }) => edges.some(({ beyond }) => beyond))) return []
  const neighbours = findNeighbours(level)
  return panels.flatMap(({ edges, outline }, i) =>
    edges.flatMap((edge, j): ApiIssue[] => {
      const served = edges.length === 1 ? outline.map((_, side) => side) : [j]
      const behind = (side: number) => neighbours.filter((each) => each.panel === i && each.edge === side)
      return edgeIssues(edge, level, served.map(behind), `${path}.panels.${i}.edges.${j}.beyond`)
    }),
  )
}

function edgeIssues(
  { beyond, continuity }: Edge,
  { panels }: Level,
  behind: readonly (readonly Neighbour[])[],
  path: string,
): ApiIssue[] {
  if (!beyond) return []
  if (continuity !== 'continuous')
    return [{ path, message: `nothing goes on behind a ${continuity} edge: expected a continuous one, or no entry` }]
  if (!('panel' in beyond)) return []
  const named = panels.findIndex(({ mark }) => mark === beyond.panel)
  if (named >= 0 && behind.every((side) => side.some(({ neighbour }) => neighbour === named))) return []
  const marks = [...new Set(behind.flat().map(({ neighbour }) => panels[neighbour]!.mark))]
  const expected = marks.length > 0 ? `one of the panels that stand on it, ${marks.join(', ')}` : 'a span: no panel stands on it'
  return [{ path: `${path}.panel`, message: `panel ${beyond.panel} does not stand on this edge: expected ${expected}` }]
}
