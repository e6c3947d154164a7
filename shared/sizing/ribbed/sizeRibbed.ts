import type { Brief, RibbedScheme } from '../../contracts/appraisal'
import type { CodeBasis } from '../codeBasis'
import { atPath, type LevelSite, type PanelSite } from '../panelSite'
import { remember } from '../remember'
import type { SizedPanel } from '../sizedPanel'
import { analyseRibs, type RibAnalysis } from './ribAnalysis'
import type { RibBarRules } from './ribBarLines'
import { chooseBottom, designRibs, type RibDesign, type RibTask, lightestTops, zoneFindings } from './ribDesign'
import { laidOut, type RibbedPanel, ribbedPanel, shapeKey } from './ribbedPanel'
import { ribSection } from './ribSection'
import { leastZoneMm } from './solidZones'
import { sizedRibbedPanel } from './sizedRibbedPanel'

/** One level of a ribbed scheme while it is sized. */
interface Job {
  readonly scheme: RibbedScheme
  readonly brief: Brief
  readonly basis: CodeBasis
  readonly level: LevelSite
  readonly depthMm: number
  readonly rules: RibBarRules
  readonly shapeFor: ReturnType<typeof remember<RibbedPanel>>
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
  const memory = { shapeFor: remember<RibbedPanel>(), zoneFor: remember<number>(), designFor: remember<RibDesign>() }
  const job: Job = { scheme, brief, basis, level, depthMm, rules, ...memory }
  const first = scheme.solidZone === 'least' ? 0 : scheme.solidZone
  let panels = level.panels.map((site) => shaped(job, site, first))
  for (;;) {
    const analyses = analyseRibs(level, panels, depthMm, basis)
    const zones = panels.map((panel, i) => (scheme.solidZone === 'least' ? widened(job, panel, analyses[i]!) : first))
    if (zones.every((zone, i) => zone === panels[i]!.solidZoneMm))
      return panels.map((panel, i) => finished(job, level.panels[i]!, panel, analyses[i]!))
    panels = level.panels.map((site, i) => shaped(job, site, zones[i]!))
  }
}

function shaped({ scheme, brief, basis, shapeFor }: Job, site: PanelSite, zoneMm: number): RibbedPanel {
  return shapeFor(shapeKey(site, zoneMm), () => atPath(site.path, () => ribbedPanel(site, scheme, brief, basis, zoneMm)))
}

/** Width of zone that the panel needs under the loads of its present layout; never less than it has. */
function widened(job: Job, panel: RibbedPanel, analysis: RibAnalysis): number {
  const taskAt = (zoneMm: number) => taskOf(job, panel, analysis, zoneMm)
  const { solidZoneMm, clearMm } = panel
  return job.zoneFor(keyOf(panel, analysis), () => {
    const bottom = chooseBottom(taskAt(solidZoneMm))
    const lightest = lightestTops(taskAt(solidZoneMm))
    return leastZoneMm(solidZoneMm, clearMm, (zoneMm) => zoneFindings(taskAt(zoneMm), bottom, lightest))
  })
}

/** The same for panels of one level that are reinforced alike. */
const keyOf = ({ key }: RibbedPanel, { forces, spanMm, position }: RibAnalysis) =>
  [key, forces.key, spanMm.toPrecision(10), position].join(' ')

function taskOf({ scheme, brief, basis, rules }: Job, panel: RibbedPanel, analysis: RibAnalysis, zoneMm: number): RibTask {
  const context = {
    basis,
    section: ribSection(scheme, brief),
    analysis,
    ends: panel.ends,
    clearMm: panel.clearMm,
    solidZoneMm: zoneMm,
    fireMinutes: brief.fireMinutes,
    carriesPartitions: brief.partitionsLoad > 0,
  }
  return { panel, context, scheme, rules }
}

function finished(job: Job, site: PanelSite, panel: RibbedPanel, analysis: RibAnalysis): SizedPanel {
  const task = taskOf(job, panel, analysis, panel.solidZoneMm)
  const design = job.designFor(keyOf(panel, analysis), () => designRibs(task))
  const layout = site === panel.site ? panel.layout : laidOut(site, job.scheme, job.basis, panel.solidZoneMm)
  return sizedRibbedPanel(task, design, { level: job.level.mark, mark: site.panel.mark }, layout)
}
