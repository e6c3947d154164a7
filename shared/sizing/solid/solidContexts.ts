import type { Brief, SolidScheme } from '../../contracts/appraisal'
import { floorLoads, REINFORCED_CONCRETE_KN_PER_M3 } from '../actions'
import { type AnalysisRules, analysisRules } from '../analysis/analysisRules'
import type { CodeBasis } from '../codeBasis'
import { givenFor } from '../givenPanel'
import type { LevelSite } from '../panelSite'
import { refuseCoverThroughSection } from '../sectionDepth'
import { CHOSEN_DIAMETERS } from '../tables/bars'
import { leastThickness } from './leastThickness'
import { leastThicknesses } from './leastThicknesses'
import { analyseSlabs } from './slabAnalysis'
import { type SlabContext, topPlaces } from './slabContext'
import { type SlabPlan, slabPlan } from './slabPlan'

/** A level of a solid scheme with the thickness of each panel, mm, and what its bars and checks are worked out from. */
export interface SolidLevel {
  readonly site: LevelSite
  readonly heightsMm: readonly number[]
  readonly contexts: readonly SlabContext[]
}

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
  readonly rules: AnalysisRules
}

/**
 * All levels of a solid scheme analysed, at the given thickness, the least that passes in every panel, or the least of each.
 *
 * Source: project rule, engine design sections 3 and 4
 * @throws OutOfScopeError where free edges leave a panel no two opposite supports, or the cover takes up the depth
 */
export function solidContexts(sites: readonly LevelSite[], scheme: SolidScheme, brief: Brief, basis: CodeBasis): SolidLevel[] {
  const levels = sites.map((site) => ({ site, plans: site.panels.map(slabPlan) }))
  const job: Job = { levels, scheme, brief, basis, rules: analysisRules(basis, brief.redistribution) }
  const heights = heightsOf(job)
  refuseCoverThroughSection(Math.min(...heights.flat()), brief.cover + 2 * CHOSEN_DIAMETERS[0])
  return levels.map((level, i) => ({
    site: level.site,
    heightsMm: heights[i]!,
    contexts: contextsAt(job, level, heights[i]!),
  }))
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

function contextsAt(
  { scheme, brief, basis, rules }: Job,
  { site, plans }: JobLevel,
  heightsMm: readonly number[],
): SlabContext[] {
  const thicknesses = heightsMm.map((heightMm) => {
    const loads = floorLoads((heightMm / 1000) * REINFORCED_CONCRETE_KN_PER_M3, brief)
    return { heightMm, depthMm: heightMm - brief.cover, loads }
  })
  const analyses = analyseSlabs(site, plans, thicknesses, basis, rules)
  return plans.map((plan, i) => {
    const own = givenFor(scheme.givenPanels, site.mark, plan.site.panel.mark)?.bars ?? scheme.bars
    const [analysis, heightMm] = [analyses[i]!, heightsMm[i]!]
    return { basis, brief, given: own === 'computed' ? null : own, plan, analysis, heightMm, places: topPlaces(analysis) }
  })
}
