import type { NeighboursOf } from './levelStrips'
import { type EndOfSpan, forcesKey, type SpanForces } from './spanForces'

/** Hogging moment of each panel over each outline edge, N·mm per metre; edges that are not there count as 0. */
export type EdgeMoments = readonly ReadonlyMap<number, number>[]

/**
 * Greatest moment that the panels behind some edges bring to them, N·mm per metre, 0 without any.
 *
 * Source: project rule, of two unequal moments at one support both sides take the larger (no distribution, on the safe side)
 */
export function momentFromBehind(
  panel: number,
  edges: readonly number[],
  moments: EdgeMoments,
  neighboursOf: NeighboursOf,
): number {
  return neighboursOf[panel]!.reduce(
    (most, { edge, neighbour, neighbourEdge }) =>
      edges.includes(edge) ? Math.max(most, moments[neighbour]?.get(neighbourEdge) ?? 0) : most,
    0,
  )
}

/**
 * Forces of a span whose support moments were raised to those of its neighbours; what is added dies out in a straight line at the
 * far end. The sagging moment is left as it was.
 *
 * Source: project rule, as `momentFromBehind`; carry-over in a straight line by statics
 * @param least - moment to reach at each end, N·mm per metre
 */
export function raisedTo(forces: SpanForces, spanMm: number, least: Readonly<Record<EndOfSpan, number>>): SpanForces {
  const extra = (end: EndOfSpan) => Math.max(0, least[end] - forces.hoggingNmm(end, 0))
  const [start, end] = [extra('start'), extra('end')]
  if (start === 0 && end === 0) return forces
  const added = { start, end }
  const carried = (at: EndOfSpan, from: number) => added[at] * Math.max(0, 1 - from / spanMm)
  return {
    ...forces,
    key: `${forces.key};${forcesKey([start, end])}`,
    ownHoggingNmm: (at) => forces.hoggingNmm(at, 0),
    hoggingNmm: (at, from) => forces.hoggingNmm(at, from) + carried(at, from),
    casesAt: (at, from) => forces.casesAt(at, from).map((each) => ({ ...each, hoggingNmm: each.hoggingNmm + carried(at, from) })),
  }
}
