import type { Brief, RibbedScheme } from '../../contracts/appraisal'
import type { EndOfSpan } from '../analysis/spanForces'
import { barRuns } from '../barRuns'
import { areaOf } from '../barSet'
import type { CodeBasis } from '../codeBasis'
import { figure } from '../figure'
import { checkRow } from '../finding'
import { atPath, type LevelSite } from '../panelSite'
import type { BarRun, SizedPanel } from '../sizedPanel'
import { remember } from '../remember'
import { midspanBending } from './bottomFindings'
import { analyseRibs, type RibAnalysis } from './ribAnalysis'
import { bottomLines, type RibBarRules, topLines } from './ribBarLines'
import { type RibContext, perRib } from './ribContext'
import { chooseBottom, designRibs, type RibDesign, type RibTask, zoneFindings } from './ribDesign'
import { ribFlags } from './ribFlags'
import { type RibbedPanel, ribbedPanel } from './ribbedPanel'
import { ribSection } from './ribSection'
import { shapeFindings } from './shapeFindings'
import { leastZoneMm } from './solidZones'
import { supportBending } from './topFindings'

const ENDS: readonly EndOfSpan[] = ['start', 'end']

/** One level of a ribbed scheme while it is sized. */
interface Job {
  readonly scheme: RibbedScheme
  readonly brief: Brief
  readonly basis: CodeBasis
  readonly level: LevelSite
  readonly depthMm: number
  readonly rules: RibBarRules
  readonly zoneFor: ReturnType<typeof remember<number>>
  readonly designFor: ReturnType<typeof remember<RibDesign>>
}

/**
 * The panels of a level built ribbed: laid out, analysed one way along the ribs, reinforced and checked. A solid zone left to the
 * engine is widened panel by panel until shear, and bending of the rib beside it, pass.
 *
 * Signs: moments and forces are magnitudes, sagging and hogging apart. Lengths mm, forces N, moments N·mm, per metre of width until
 * `perRib` makes them those of one rib.
 *
 * Source: project rule, engine design sections 2 and 4
 * @throws OutOfScopeError where ribs do not run from support to support, or no block fits
 */
export function sizeRibbed(level: LevelSite, scheme: RibbedScheme, brief: Brief, basis: CodeBasis): SizedPanel[] {
  const depthMm = scheme.block.height + scheme.topping
  const rules = { basis, coverMm: brief.cover, trimmerMm: scheme.trimmerWidth, heightMm: depthMm }
  const job: Job = { scheme, brief, basis, level, depthMm, rules, zoneFor: remember(), designFor: remember() }
  const isLeast = scheme.solidZone === 'least'
  const first = scheme.solidZone === 'least' ? 0 : scheme.solidZone
  let panels = level.panels.map((site) => laidOut(job, site, first))
  for (;;) {
    const analyses = analyseRibs(level, panels, depthMm, basis)
    const zones = panels.map((panel, i) => (isLeast ? widened(job, panel, analyses[i]!) : first))
    if (zones.every((zone, i) => zone === panels[i]!.layout.solidZone))
      return panels.map((panel, i) => sizedPanel(job, panel, analyses[i]!))
    panels = panels.map((panel, i) => (zones[i] === panel.layout.solidZone ? panel : laidOut(job, panel.site, zones[i]!)))
  }
}

function laidOut({ scheme, brief, basis }: Job, site: LevelSite['panels'][number], zoneMm: number): RibbedPanel {
  return atPath(site.path, () => ribbedPanel(site, scheme, brief, basis, zoneMm))
}

function contextOf({ scheme, brief, basis }: Job, { ends, clearMm }: RibbedPanel, analysis: RibAnalysis, zoneMm: number): RibContext {
  return {
    basis,
    section: ribSection(scheme, brief),
    analysis,
    ends,
    clearMm,
    solidZoneMm: zoneMm,
    fireMinutes: brief.fireMinutes,
    carriesPartitions: brief.partitionsLoad > 0,
  }
}

/** Width of zone that the panel needs under the loads of its present layout; never less than it has. */
function widened(job: Job, panel: RibbedPanel, analysis: RibAnalysis): number {
  const taskAt = (zoneMm: number) => taskOf(job, panel, analysis, zoneMm)
  return job.zoneFor(keyOf(panel, analysis), () => {
    const bottom = chooseBottom(taskAt(panel.layout.solidZone))
    return leastZoneMm(panel.layout.solidZone, panel.clearMm, (zoneMm) => zoneFindings(taskAt(zoneMm), bottom))
  })
}

/** The same for panels of one level that are reinforced alike. */
function keyOf({ ribs, ends, layout }: RibbedPanel, { forces, spanMm, position, faceMm }: RibAnalysis): string {
  const lines = ribs.flatMap(({ clearMm, start, end }) => [figure(clearMm, 6), start.edge, start.supportMm, end.edge, end.supportMm])
  return JSON.stringify([forces.key, spanMm.toPrecision(10), position, faceMm, ends, layout.solidZone, lines])
}

function taskOf(job: Job, panel: RibbedPanel, analysis: RibAnalysis, zoneMm: number): RibTask {
  const { scheme, rules } = job
  return { panel, context: contextOf(job, panel, analysis, zoneMm), scheme, rules, isZoneGiven: scheme.solidZone !== 'least' }
}

function sizedPanel(job: Job, panel: RibbedPanel, analysis: RibAnalysis): SizedPanel {
  const { scheme, brief, basis, level, depthMm } = job
  const { layout, site } = panel
  const task = taskOf(job, panel, analysis, layout.solidZone)
  const { context } = task
  const design = job.designFor(keyOf(panel, analysis), () => designRibs(task))
  const findings = [...shapeFindings(basis, context.section, analysis, brief.fireMinutes), ...design.findings]
  const isWidened = scheme.solidZone === 'least' && layout.solidZone > 0
  const flagInput = { panel, scheme, section: context.section, analysis, basis, fireMinutes: brief.fireMinutes, isWidened }
  return {
    level: level.mark,
    mark: site.panel.mark,
    depth: depthMm,
    areas: layout.areas,
    layout,
    checks: findings.map((finding) => checkRow(finding, level.mark, site.panel.mark)),
    moments: momentsOf(context),
    steel: steelOf(context, design),
    bars: runsOf(job, panel, analysis, design),
    flags: ribFlags(flagInput),
  }
}

function momentsOf(context: RibContext): SizedPanel['moments'] {
  const { forces } = context.analysis
  const supports = ENDS.map((end) => (context.ends[end].isContinuous ? forces.hoggingNmm(end, 0) : 0))
  return { midspan: perRib(context, forces.saggingNmm) / 1e6, support: perRib(context, Math.max(...supports)) / 1e6 }
}

/** Steel at midspan, and at the continuous end that asks most; zeros without one. */
function steelOf(context: RibContext, { bottom, tops }: RibDesign): SizedPanel['steel'] {
  const supports = ENDS.filter((end) => context.ends[end].isContinuous).map((end) => ({
    required: supportBending(context, end, tops[end]).requiredMm2,
    provided: areaOf(tops[end]),
  }))
  const worst = supports.reduce((most, each) => (each.required > most.required ? each : most), supports[0] ?? { required: 0, provided: 0 })
  return {
    midspanRequired: midspanBending(context, bottom).flexure.requiredMm2,
    midspanProvided: areaOf(bottom),
    supportRequired: worst.required,
    supportProvided: worst.provided,
  }
}

function runsOf({ rules }: Job, panel: RibbedPanel, { spanMm }: RibAnalysis, { bottom, tops }: RibDesign): BarRun[] {
  const added = spanMm - panel.clearMm
  return [
    ...bottom.flatMap(({ diameter, count }) => barRuns(bottomLines(panel, diameter, count, rules))),
    ...ENDS.flatMap((end) =>
      tops[end].flatMap(({ diameter, count }) => topLines(panel, end, diameter, count, added, rules).flatMap(barRuns)),
    ),
  ]
}
