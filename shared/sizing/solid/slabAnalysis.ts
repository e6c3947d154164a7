import { type FloorLoads, ultimateLoad } from '../actions'
import type { AnalysisRules } from '../analysis/analysisRules'
import { bayAreas, type NeighboursOf, overhangBehind, type SpanLine, type SpanLines, stripOf } from '../analysis/levelStrips'
import { type EdgeMoments, momentFromBehind } from '../analysis/sharedSupports'
import { type EndOfSpan, liftedEnds, type SpanForces } from '../analysis/spanForces'
import type { Strip } from '../analysis/strip'
import type { StripAnalysis } from '../analysis/stripFlags'
import { positionIn, stripForces } from '../analysis/stripForces'
import { liftedTwoWayForces } from '../analysis/liftedTwoWayForces'
import { twoWayForces } from '../analysis/twoWayForces'
import type { CodeBasis, SpanPosition } from '../codeBasis'
import type { LevelSite } from '../panelSite'
import { COEFFICIENT_REDISTRIBUTION } from '../tables/oneWayCoefficients'
import type { TwoWayCase } from '../tables/twoWayCase'
import type { SlabAxis, SlabPlan } from './slabPlan'
import { continuousEnds, refuseUnheld, type SlabThickness, type Spanning, spanning } from './slabSpanning'

/** Force at one end of a span: moment, N·mm per metre, and shear, N per metre; length of a cantilever that goes on behind it, mm, or 0. */
export interface EndForces {
  readonly hoggingNmm: number
  /** Before it was raised to that of the floor behind, where it was. */
  readonly ownNmm: number
  readonly shearN: number
  readonly overhangMm: number
}

/** As the panel alone has them. */
const endForces = (hoggingNmm: number, shearN: number): EndForces => ({ hoggingNmm, ownNmm: hoggingNmm, shearN, overhangMm: 0 })

/** One direction of a slab that carries load. */
export interface SlabSpan {
  readonly axis: SlabAxis
  readonly spanMm: number
  readonly position: SpanPosition
  readonly redistributedShare: number
  readonly saggingNmm: number
  readonly ends: Readonly<Record<EndOfSpan, EndForces>>
}

/** How a solid panel carries. `other` is the direction across `short`; it carries (`long`) in two-way panels only. */
export interface SlabAnalysis {
  readonly short: SlabSpan
  readonly long: SlabSpan | null
  readonly other: SlabAxis
  readonly aspect: number
  readonly method: 'coefficients' | 'elastic' | 'twoWay'
  /** Null one way, and of a two-way panel whose corners may lift. */
  readonly panelCase: TwoWayCase | null
  readonly loads: FloorLoads
  /** The strip it was analysed in; null where it spans two ways. */
  readonly strip: Strip | null
  /** How it was analysed there. */
  readonly stripAnalysis: StripAnalysis | null
}

/**
 * Effective spans and forces of every solid panel of a level, each at its thickness: two-way by coefficients, one-way along its strip, all
 * spans equally stiff. Of unequal moments at a shared support both sides take the larger.
 *
 * Source: engine design sections 3 and 4; BS 8110-1:1997, Tables 3.12 to 3.15; elastic analysis elsewhere
 * @param thicknesses - one for each panel
 * @throws OutOfScopeError `levels.I.panels.J.edges` where free edges leave no two opposite supports, nor a cantilever that is held
 */
export function analyseSlabs(
  { neighboursOf }: LevelSite,
  plans: readonly SlabPlan[],
  thicknesses: readonly SlabThickness[],
  basis: CodeBasis,
  rules: AnalysisRules,
): SlabAnalysis[] {
  const spannings = plans.map((plan, i) => spanning(plan, thicknesses[i]!, basis))
  refuseUnheld(spannings, neighboursOf)
  const lines = spannings.map(spanLine)
  const bays = bayAreas(lines, neighboursOf)
  const withBays = lines.map((line, i) => line && { ...line, span: { ...line.span, bayMm2: bays[i]! } })
  const raw = spannings.map((each, i) =>
    each.isTwoWay
      ? twoWay(each, ultimateLoad(each.loads, rules.factors))
      : oneWay(each, stripOf(i, withBays, neighboursOf), rules),
  )
  const beside = { moments: raw.map(edgeMoments), lines, neighboursOf }
  return raw.map((analysis, i) => ({
    ...analysis,
    short: besideOthers(analysis.short, i, beside),
    long: analysis.long && besideOthers(analysis.long, i, beside),
  }))
}

function spanLine({ plan, first, firstMm, isTwoWay, isCantilever, loads }: Spanning): SpanLine | null {
  if (isTwoWay) return null
  return {
    mark: plan.site.panel.mark,
    direction: first.direction,
    ends: first.ends,
    span: { spanMm: firstMm, loads, bayMm2: plan.areas.gross, isCantilever },
  }
}

function oneWay({ first, second, firstMm, secondMm, loads }: Spanning, strip: Strip, rules: AnalysisRules): SlabAnalysis {
  const forces = stripForces(strip, rules)
  const at = (end: EndOfSpan) => endForces(forces.hoggingNmm(end, 0), forces.shearN(end, 0))
  return {
    short: {
      axis: first,
      spanMm: firstMm,
      position: positionIn(strip),
      redistributedShare: forces.redistributedShare,
      saggingNmm: forces.saggingNmm,
      ends: { start: at('start'), end: at('end') },
    },
    long: null,
    other: second,
    aspect: secondMm / firstMm,
    method: forces.method,
    panelCase: null,
    loads,
    strip,
    stripAnalysis: stripAnalysis(first, strip, forces, rules),
  }
}

function stripAnalysis({ ends }: SlabAxis, strip: Strip, forces: SpanForces, rules: AnalysisRules): StripAnalysis {
  const position = positionIn(strip)
  const isContinuous = { start: ends.start.isContinuous, end: ends.end.isContinuous }
  const lifted = position === 'cantilever' ? [] : liftedEnds(forces, isContinuous)
  return {
    strip,
    position,
    method: forces.method,
    redistributedShare: forces.redistributedShare,
    askedShare: rules.redistributedShare,
    liftedEdges: lifted.flatMap((end) => ends[end].edges),
  }
}

const POSITIONS: readonly SpanPosition[] = ['simple', 'end', 'interior']

function twoWay({ plan, first, second, firstMm, secondMm, loads }: Spanning, load: number): SlabAnalysis {
  const continuity = ({ ends }: SlabAxis) => [ends.start.isContinuous, ends.end.isContinuous] as const
  const panel = { load, shortMm: firstMm, longMm: secondMm }
  const mayLift = plan.site.panel.corners === 'mayLift' && continuousEnds(first) + continuousEnds(second) === 0
  const forces = mayLift
    ? liftedTwoWayForces(panel)
    : twoWayForces({ ...panel, shortEnds: continuity(first), longEnds: continuity(second) })
  const direction = (axis: SlabAxis, spanMm: number, { saggingNmm, hoggingNmm, shearN }: typeof forces.short): SlabSpan => ({
    axis,
    spanMm,
    position: POSITIONS[continuousEnds(axis)]!,
    redistributedShare: COEFFICIENT_REDISTRIBUTION,
    saggingNmm,
    ends: {
      start: endForces(hoggingNmm[0], shearN[0]),
      end: endForces(hoggingNmm[1], shearN[1]),
    },
  })
  return {
    short: direction(first, firstMm, forces.short),
    long: direction(second, secondMm, forces.long),
    other: second,
    aspect: forces.aspect,
    method: 'twoWay',
    panelCase: forces.panelCase,
    loads,
    strip: null,
    stripAnalysis: null,
  }
}

function edgeMoments({ short, long }: SlabAnalysis): Map<number, number> {
  const of = ({ axis, ends }: SlabSpan) =>
    (['start', 'end'] as const).flatMap((end) => axis.ends[end].edges.map((edge) => [edge, ends[end].hoggingNmm] as const))
  return new Map([...of(short), ...(long ? of(long) : [])])
}

/** What the other panels of a level bring to a panel's supports. */
interface Beside {
  readonly moments: EdgeMoments
  readonly lines: SpanLines
  readonly neighboursOf: NeighboursOf
}

/** A span with its support moments raised to those from behind, and the cantilevers that go on there. */
function besideOthers(span: SlabSpan, panel: number, { moments, lines, neighboursOf }: Beside): SlabSpan {
  const at = (end: EndOfSpan): EndForces => {
    const side = span.axis.ends[end]
    if (!side.isContinuous) return span.ends[end]
    const behind = momentFromBehind(panel, side.edges, moments, neighboursOf)
    const overhangMm = overhangBehind(panel, side.edges, lines, neighboursOf)
    return { ...span.ends[end], hoggingNmm: Math.max(span.ends[end].hoggingNmm, behind), overhangMm }
  }
  return { ...span, ends: { start: at('start'), end: at('end') } }
}
