import type { Edge, Level, Panel } from '../contracts/appraisal'
import { type ClearOutline, clearOutline } from '../layout/clearOutline'
import { type Neighbour, findNeighbours, findSharedEdges } from '../layout/neighbours'
import { panelEdges } from '../layout/panelEdges'
import { OutOfScopeError } from '../outOfScope'

/** A panel where it stands: its edges one each, clear outline and the path of its input. */
export interface PanelSite {
  readonly panel: Panel
  readonly path: string
  readonly edges: readonly Edge[]
  readonly clear: ClearOutline
  /** Edges whose support another panel of the level stands on too. */
  readonly sharedEdges: readonly boolean[]
}

/** A level with what its panels share. */
export interface LevelSite {
  readonly mark: string
  readonly panels: readonly PanelSite[]
  readonly neighbours: readonly Neighbour[]
  /** The same, panel by panel. */
  readonly neighboursOf: readonly (readonly Neighbour[])[]
}

/**
 * What `work` returns; an error of scope it throws is told with the panel's path in front.
 *
 * Source: project rule, errors name the field
 */
export function atPath<Result>(path: string, work: () => Result): Result {
  try {
    return work()
  } catch (error) {
    if (!(error instanceof OutOfScopeError) || /^(levels|brief|schemes)\b/.test(error.path)) throw error
    throw new OutOfScopeError(`${path}.${error.path}`, error.expected)
  }
}

/**
 * The levels of a file with outlines, neighbours and paths worked out once.
 *
 * Source: project rule, engine design section 1
 * @throws OutOfScopeError when supports leave a panel no clear outline
 */
export function levelSites(levels: readonly Level[]): LevelSite[] {
  return levels.map((level, i) => {
    const shared = findSharedEdges(level)
    const panels = level.panels.map((panel, j): PanelSite => {
      const path = `levels.${i}.panels.${j}`
      return atPath(path, () => ({
        panel,
        path,
        edges: panelEdges(panel),
        clear: clearOutline(panel),
        sharedEdges: shared[j]!,
      }))
    })
    const neighbours = findNeighbours(level)
    const neighboursOf = panels.map((_, j) => neighbours.filter((each) => each.panel === j))
    return { mark: level.mark, panels, neighbours, neighboursOf }
  })
}
