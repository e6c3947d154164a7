import { OutOfScopeError } from '../../outOfScope'
import type { FloorLoads } from '../actions'
import { isParallel, type NeighboursOf } from '../analysis/levelStrips'
import type { CodeBasis } from '../codeBasis'
import type { SlabAxis, SlabPlan } from './slabPlan'

/** Thickness of one panel of a level, mm, `depthMm` less the cover, and the loads that go with it. */
export interface SlabThickness {
  readonly heightMm: number
  readonly depthMm: number
  readonly loads: FloorLoads
}

/** A panel's two directions, the one it spans first, with their effective spans. */
export interface Spanning {
  readonly plan: SlabPlan
  readonly first: SlabAxis
  readonly second: SlabAxis
  readonly firstMm: number
  readonly secondMm: number
  readonly isTwoWay: boolean
  /** Held at one end of `first` only. */
  readonly isCantilever: boolean
  readonly loads: FloorLoads
}

/** Effective spans closer than this are equal, mm. */
const EQUAL_SPANS_MM = 0.01

const isFree = ({ ends }: SlabAxis) => ends.start.isFree || ends.end.isFree

/**
 * Number of continuous ends of an axis.
 *
 * Source: project rule
 */
export const continuousEnds = ({ ends }: SlabAxis) => Number(ends.start.isContinuous) + Number(ends.end.isContinuous)

/** Whether one end of an axis is continuous, the other free, and both sides across it free. */
function isHeldAlone({ ends: { start, end } }: SlabAxis, { ends: sides }: SlabAxis): boolean {
  const isHeld = (start.isFree && end.isContinuous) || (end.isFree && start.isContinuous)
  return isHeld && sides.start.isFree && sides.end.isFree
}

/**
 * Which way a panel spans at a given thickness: one way past an aspect of 2, or between opposite supports where an edge is free; as a
 * cantilever where all edges but one are free.
 *
 * Source: BS 8110-1:1997, 3.5.3 and EN 1992-1-1:2004, 5.3.1(5) (engine design section 3); equal spans: the more continuous one first
 * @throws OutOfScopeError `edges` where free edges leave no two opposite supports, nor a cantilever
 */
export function spanning(plan: SlabPlan, { heightMm, depthMm, loads }: SlabThickness, basis: CodeBasis): Spanning {
  const [a, b] = plan.axes
  const spanOf = ({ clearMm, ends }: SlabAxis) => basis.effectiveSpanMm(clearMm, heightMm, depthMm, [ends.start, ends.end])
  const [aMm, bMm] = [spanOf(a), spanOf(b)]
  const isCantilever = isFree(a) && isFree(b)
  if (isCantilever && !isHeldAlone(a, b) && !isHeldAlone(b, a)) throw unheld(plan)
  const isEqual = Math.abs(aMm - bMm) < EQUAL_SPANS_MM
  const isShorter = isEqual ? continuousEnds(a) > continuousEnds(b) : aMm < bMm
  const aFirst = isCantilever ? isHeldAlone(a, b) : isFree(b) || (!isFree(a) && isShorter)
  const [first, second, firstMm, secondMm] = aFirst ? [a, b, aMm, bMm] : [b, a, bMm, aMm]
  return { plan, first, second, firstMm, secondMm, isTwoWay: !isFree(second) && secondMm / firstMm <= 2, isCantilever, loads }
}

function unheld({ site }: SlabPlan): OutOfScopeError {
  return new OutOfScopeError(
    `${site.path}.edges`,
    'expected two opposite supported edges, none of them free, for a solid panel, or a free one whose opposite edge goes on in a panel ' +
      'that carries the same way',
  )
}

/**
 * Refuses cantilevers that do not go on behind their support in a panel that carries the same way and is none itself.
 *
 * Source: project rule, a cantilever is held
 * @param spannings - one for each panel of the level
 * @throws OutOfScopeError `levels.I.panels.J.edges`
 */
export function refuseUnheld(spannings: readonly Spanning[], neighboursOf: NeighboursOf): void {
  spannings.forEach(({ plan, first, isCantilever }, i) => {
    if (!isCantilever) return
    const held = first.ends.start.isFree ? first.ends.end : first.ends.start
    const isHeld = neighboursOf[i]!.some(
      ({ edge, neighbour, neighbourEdge }) => held.edges.includes(edge) && carriesOn(spannings[neighbour]!, first, neighbourEdge),
    )
    if (!isHeld) throw unheld(plan)
  })
}

/** Whether a panel carries along an axis and is continuous over one of its edges there. */
function carriesOn({ first, second, isTwoWay, isCantilever }: Spanning, { direction }: SlabAxis, edge: number): boolean {
  const along = (isTwoWay ? [first, second] : [first]).filter((axis) => isParallel(axis.direction, direction))
  const ends = along.flatMap((axis) => [axis.ends.start, axis.ends.end])
  return !isCantilever && ends.some(({ isContinuous, edges }) => isContinuous && edges.includes(edge))
}
