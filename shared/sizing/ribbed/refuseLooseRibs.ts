import { OutOfScopeError } from '../../outOfScope'
import { isParallel, oppositeEnd } from '../analysis/levelStrips'
import type { EndOfSpan } from '../analysis/spanForces'
import type { LevelSite } from '../panelSite'
import type { RibbedGround } from './ribbedGround'

const ENDS: readonly EndOfSpan[] = ['start', 'end']

/**
 * Refuses ribs that end on a free edge, unless they are cantilevers: all ribs of the panel free at one end, whole, and going on behind the
 * other in a neighbour whose ribs run the same way from support to support.
 *
 * Source: project rule, ribs are held
 * @param grounds - one for each panel of the level
 * @throws OutOfScopeError `levels.I.panels.J.edges`, or `voids` where a void cuts a cantilever
 */
export function refuseLooseRibs(level: LevelSite, grounds: readonly RibbedGround[]): void {
  grounds.forEach((ground, i) => {
    const free = ENDS.find((end) => ground.ends[end].isFree)
    if (!free) return
    const { path, edges } = level.panels[i]!
    const loose = ground.ends[free].edges.filter((edge) => edges[edge]!.continuity === 'free')
    if (loose.length < ground.ends[free].edges.length || !isHeld(level, grounds, i, oppositeEnd[free]))
      throw new OutOfScopeError(
        `${path}.edges`,
        `ribs end on free edge ${loose[0]! + 1}: expected ribs that run from support to support, or a cantilever that goes on behind ` +
          'its support in a panel whose ribs run the same way',
      )
    if (ground.ribs.some(({ start, end }) => start.edge === null || end.edge === null))
      throw new OutOfScopeError(`${path}.voids`, 'expected no void between the ribs of a cantilever')
  })
}

/** Whether the ribs go on behind an end in a panel that carries them. */
function isHeld({ neighboursOf }: LevelSite, grounds: readonly RibbedGround[], panel: number, end: EndOfSpan): boolean {
  const { ends, direction } = grounds[panel]!
  if (!ends[end].isContinuous) return false
  return neighboursOf[panel]!.some(({ edge, neighbour, neighbourEdge }) => {
    const behind = grounds[neighbour]!
    const isBorne = ENDS.every((each) => behind.ends[each].edges.length > 0 && !behind.ends[each].isFree)
    const meets = ENDS.some((each) => behind.ends[each].isContinuous && behind.ends[each].edges.includes(neighbourEdge))
    return ends[end].edges.includes(edge) && isBorne && meets && isParallel(direction, behind.direction)
  })
}
