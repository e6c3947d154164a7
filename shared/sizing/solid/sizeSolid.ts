import type { Brief, SolidScheme } from '../../contracts/appraisal'
import { floorLoads, REINFORCED_CONCRETE_KN_PER_M3 } from '../actions'
import type { BarLines } from '../bars/barLines'
import { barRuns } from '../bars/barRuns'
import { overSupports } from '../bars/overSupports'
import type { CodeBasis } from '../codeBasis'
import { checkRow } from '../finding'
import { givenFor } from '../givenPanel'
import type { LevelSite } from '../panelSite'
import { remember } from '../remember'
import { refuseCoverThroughSection } from '../sectionDepth'
import type { SizedPanel } from '../sizedPanel'
import { CHOSEN_DIAMETERS } from '../tables/bars'
import { chooseSlabBars, type SlabBars } from './bars/chooseSlabBars'
import { analyseSlabs } from './slabAnalysis'
import { soffitSteps } from './soffitSteps'
import { slabBarLines } from './bars/slabBarLines'
import { sizeFindings } from './layerFindings'
import { leastThickness } from './leastThickness'
import { leastThicknesses } from './leastThicknesses'
import { isHogging, type SlabContext, slabKey } from './slabContext'
import { slabFlags } from './slabFlags'
import { layerAreaMm2 } from './bars/slabLayer'
import { type SlabPlan, slabPlan } from './slabPlan'

type BarsFor = ReturnType<typeof remember<SlabBars>>

interface JobLevel {
  readonly site: LevelSite
  readonly plans: readonly SlabPlan[]
}

/** All levels of a solid scheme while it is sized. */
interface Job {
  readonly levels: readonly JobLevel[]
  readonly scheme: SolidScheme
  readonly brief: Brief
  readonly basis: CodeBasis
}

/**
 * The panels of all levels built solid, at the given thickness, the least that passes in every panel, or the least of each.
 *
 * Signs: moments and forces are magnitudes, sagging and hogging apart. Lengths mm, forces N, moments N·mm, per metre of width. `short`
 * is the direction spanned first, whose bars lie nearest the faces; `long` the other.
 *
 * Source: project rule, engine design sections 3 and 4
 * @throws OutOfScopeError where free edges leave a panel no two opposite supports, or the cover takes up the depth
 */
export function sizeSolid(sites: readonly LevelSite[], scheme: SolidScheme, brief: Brief, basis: CodeBasis): SizedPanel[] {
  const levels = sites.map((site) => ({ site, plans: site.panels.map(slabPlan) }))
  const job: Job = { levels, scheme, brief, basis }
  const heights = heightsOf(job)
  refuseCoverThroughSection(Math.min(...heights.flat()), brief.cover + 2 * CHOSEN_DIAMETERS[0])
  const barsFor: BarsFor = remember()
  return levels.flatMap((level, i) => {
    const contexts = contextsAt(job, level, heights[i]!)
    const bars = contexts.map((context) => barsFor(slabKey(context), () => chooseSlabBars(context)))
    const lines = overSupports(
      level.site,
      contexts.map((context, j) => slabBarLines(context, bars[j]!)),
    )
    return contexts.map((context, j) => {
      const steps = soffitSteps(level.site, heights[i]!, j)
      return sizedPanel(context, level.site.mark, { chosen: bars[j]!, lines: lines[j]! }, steps)
    })
  })
}

/** Thickness of every panel, level by level: given, one least for all, or the least of each. */
function heightsOf(job: Job): number[][] {
  const { levels, scheme } = job
  const { thickness, thicknessPer } = scheme
  if (thickness === 'least' && thicknessPer === 'panel')
    return levels.map((level) => leastThicknesses(level.plans.length, (heights) => contextsAt(job, level, heights)))
  const evenly = (heightMm: number) => levels.map(({ plans }) => plans.map(() => heightMm))
  if (thickness !== 'least') return evenly(thickness)
  const all = (heightMm: number) =>
    levels.flatMap((level) => contextsAt(job, level, new Array<number>(level.plans.length).fill(heightMm)))
  return evenly(leastThickness(all))
}

function contextsAt({ scheme, brief, basis }: Job, { site, plans }: JobLevel, heightsMm: readonly number[]): SlabContext[] {
  const thicknesses = heightsMm.map((heightMm) => {
    const loads = floorLoads((heightMm / 1000) * REINFORCED_CONCRETE_KN_PER_M3, brief)
    return { heightMm, depthMm: heightMm - brief.cover, loads }
  })
  const analyses = analyseSlabs(site, plans, thicknesses, basis)
  return plans.map((plan, i) => {
    const own = givenFor(scheme.givenPanels, site.mark, plan.site.panel.mark)?.bars ?? scheme.bars
    return { basis, brief, given: own === 'computed' ? null : own, plan, analysis: analyses[i]!, heightMm: heightsMm[i]! }
  })
}

/** Bars of a panel as chosen, and as they are to be scheduled. */
interface PanelBars {
  readonly chosen: SlabBars
  readonly lines: readonly BarLines[]
}

function sizedPanel(context: SlabContext, level: string, { chosen, lines }: PanelBars, steps: readonly string[]): SizedPanel {
  const { plan, heightMm } = context
  const { mark } = plan.site.panel
  const findings = [...chosen.findings, ...sizeFindings(context)]
  return {
    level,
    mark,
    depth: heightMm,
    areas: plan.areas,
    layout: null,
    checks: findings.map((finding) => checkRow(finding, level, mark)),
    places: findings.map(({ place }) => place()),
    moments: momentsOf(context),
    steel: steelOf(chosen),
    bars: lines.flatMap(barRuns),
    flags: [...slabFlags(context, findings), ...steps],
  }
}

function momentsOf({ analysis: { short, long } }: SlabContext): SizedPanel['moments'] {
  const support = ({ ends }: typeof short) => Math.max(ends.start.hoggingNmm, ends.end.hoggingNmm) / 1e6
  const moments = { midspan: short.saggingNmm / 1e6, support: support(short) }
  return long ? { ...moments, midspanLong: long.saggingNmm / 1e6, supportLong: support(long) } : moments
}

/** Steel of the short direction: at midspan, and at the continuous end that asks most; zeros without one. */
function steelOf({ bottom, tops, midspan }: SlabBars): SizedPanel['steel'] {
  const supports = tops
    .filter(({ place }) => place.direction === 'short' && isHogging(place))
    .map(({ flexure, layers }) => ({ required: flexure.requiredMm2, provided: layers ? layerAreaMm2(layers.middle) : 0 }))
  const worst = supports.reduce(
    (most, each) => (each.required > most.required ? each : most),
    supports[0] ?? { required: 0, provided: 0 },
  )
  return {
    midspanRequired: midspan.requiredMm2,
    midspanProvided: layerAreaMm2(bottom.short.middle),
    supportRequired: worst.required,
    supportProvided: worst.provided,
  }
}
