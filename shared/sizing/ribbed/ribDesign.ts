import type { RibbedScheme } from '../../contracts/appraisal'
import type { EndOfSpan } from '../analysis/spanForces'
import { totalLengthMm } from '../bars/barRuns'
import { areaOf, type BarSet } from '../bars/barSet'
import { type Candidate, chooseLeastMass } from '../bars/chooseLeastMass'
import { type Finding, isMet } from '../finding'
import type { remember } from '../remember'
import { CHOSEN_DIAMETERS } from '../tables/bars'
import { bottomFindings } from './checks/bottomFindings'
import { bottomLines, type RibBarRules, topLines } from './ribBarLines'
import { ribBarOrder, type WeighedSet } from './ribBarOrder'
import type { RibContext } from './ribContext'
import type { RibbedPanel } from './ribbedPanel'
import { ribShearFinding, shearFindings } from './checks/ribShear'
import { ribBending, simpleEdgeFinding, topFindings } from './checks/topFindings'

/** The bars of a panel's ribs, and what the checks find. */
export interface RibDesign {
  readonly bottom: BarSet
  readonly tops: Readonly<Record<EndOfSpan, BarSet>>
  readonly findings: readonly Finding[]
}

const ENDS: readonly EndOfSpan[] = ['start', 'end']

/** Sets whose bars lie deepest in the rib, and least deep. */
const DEEPEST: BarSet = [{ diameter: CHOSEN_DIAMETERS[0], count: 1 }]
const SHALLOWEST: BarSet = [{ diameter: CHOSEN_DIAMETERS[CHOSEN_DIAMETERS.length - 1]!, count: 1 }]

type FindingsOf = (set: BarSet) => readonly Finding[]

/** A share that floating point may miss a bound by. */
const BOUND_SHARE = 1 - 1e-6

/**
 * Steel that every set must have, mm²: what is required goes one way with the depth of the bars, so the lesser of what the least and the
 * most deep ones ask for. Sets with less fail without being looked at.
 */
function leastAreaMm2(findingsOf: FindingsOf): number {
  const required = (set: BarSet) =>
    findingsOf(set)
      .filter(({ name, unit }) => unit === 'mm²' && name !== 'steel.most')
      .map(({ demand }) => demand)
  const shallow = required(SHALLOWEST)
  return BOUND_SHARE * Math.max(0, ...required(DEEPEST).map((demand, i) => Math.min(demand, shallow[i]!)))
}

function choose(order: readonly WeighedSet[], findingsOf: FindingsOf): BarSet {
  const leastMm2 = leastAreaMm2(findingsOf)
  const candidates = order.map(({ set, areaMm2, massKg }): Candidate<BarSet> => ({
    option: set,
    massKg,
    findings: () => findingsOf(set),
    isHopeless: areaMm2 < leastMm2,
  }))
  return chooseLeastMass(candidates).option
}

/** What the bars of one panel are chosen by. */
export interface RibTask {
  readonly panel: RibbedPanel
  readonly context: RibContext
  readonly scheme: RibbedScheme
  readonly rules: RibBarRules
  /** Orders of bars by mass, remembered by the panel's ribs and what else their lengths depend on. */
  readonly orderFor: ReturnType<typeof remember<readonly WeighedSet[]>>
}

/**
 * Bottom bars of a panel's ribs: the given ones, or those of least mass. Bars are not added for shear: a solid zone is widened for it.
 *
 * Source: project rule, engine design section 4
 */
export function chooseBottom({ panel, context, rules, orderFor }: RibTask): BarSet {
  const { ribBars } = panel.bars
  if (ribBars !== 'computed') return ribBars
  const order = orderFor(`${panel.shapeKey} bottom`, () =>
    ribBarOrder((diameter) => totalLengthMm(bottomLines(panel, diameter, 1, rules))),
  )
  return choose(order, (set) => bottomFindings(context, set))
}

/**
 * Top bars at one end of a panel's ribs: over a continuous end the given ones or those of least mass, at a simple end the basis' share, at
 * a free end none.
 *
 * Source: project rule, engine design section 4
 */
export function chooseTop({ panel, context, rules, orderFor }: RibTask, end: EndOfSpan): BarSet {
  const { isContinuous, isFree } = panel.ends[end]
  const { topBars } = panel.bars
  if (isFree) return []
  if (isContinuous && topBars !== 'computed') return topBars
  const { spanMm, position, overhangMm } = context.analysis
  const order = orderFor(`${panel.shapeKey} ${end} ${spanMm} ${position} ${overhangMm[end]}`, () =>
    ribBarOrder((diameter) =>
      topLines(panel, end, diameter, 1, context, rules).reduce((sum, lines) => sum + totalLengthMm(lines), 0),
    ),
  )
  return choose(order, (set) => (isContinuous ? topFindings(context, end, set) : [simpleEdgeFinding(context, end, set)]))
}

/**
 * Bars of a panel's ribs and every finding about them.
 *
 * Source: project rule, engine design section 4
 */
export function designRibs(task: RibTask): RibDesign {
  const { context, panel } = task
  const bottom = chooseBottom(task)
  const tops = { start: chooseTop(task, 'start'), end: chooseTop(task, 'end') }
  const topOf = (end: EndOfSpan) =>
    panel.ends[end].isContinuous ? topFindings(context, end, tops[end]) : [simpleEdgeFinding(context, end, tops[end])]
  const borne = ENDS.filter((end) => panel.ends[end].edges.length > 0 && !panel.ends[end].isFree)
  return {
    bottom,
    tops,
    findings: [
      ...bottomFindings(context, bottom),
      ...borne.flatMap(topOf),
      ...borne.flatMap((end) => shearFindings(context, end, { bottom, top: tops[end] })),
    ],
  }
}

/**
 * Top bars of a panel whose solid zone reaches past all hogging: the lightest any zone can have.
 *
 * Source: project rule, a wider zone never asks for more top bars
 */
export function lightestTops(task: RibTask): Readonly<Record<EndOfSpan, BarSet>> {
  const whole = { ...task, context: { ...task.context, solidZoneMm: task.context.clearMm / 2 } }
  return { start: chooseTop(whole, 'start'), end: chooseTop(whole, 'end') }
}

/**
 * Whether what the width of the solid zone decides is met with the lightest top bars: shear of the rib where the zone ends, and its bending there. That
 * the lightest bars must do keeps more load from ending in less steel through a wider zone.
 *
 * Source: project rule, engine design sections 4 (`"least"` lets shear widen the zone) and 8 (monotone)
 */
export function isZoneWideEnough(
  { context, panel }: RibTask,
  bottom: BarSet,
  tops: Readonly<Record<EndOfSpan, BarSet>>,
): boolean {
  return ENDS.every((end) => {
    const { isFree, isContinuous } = panel.ends[end]
    if (isFree) return true
    const top = tops[end]
    const shear = ribShearFinding(context, end, { bottom, top })
    if (!isMet(shear.demand, shear.capacity)) return false
    if (!isContinuous) return true
    const { k, greatestK, requiredMm2 } = ribBending(context, end, top)
    return isMet(k, greatestK) && (panel.bars.topBars !== 'computed' || isMet(requiredMm2, areaOf(top)))
  })
}
