import type { Brief, RibbedScheme } from '../../contracts/appraisal'
import type { CodeBasis } from '../codeBasis'
import { givenFor } from '../givenPanel'
import { atPath, type LevelSite, type PanelSite } from '../panelSite'
import { remember } from '../remember'
import { analyseRibs, type RibAnalysis } from './ribAnalysis'
import type { RibBarRules } from './ribBarLines'
import type { RibDesign, RibTask } from './ribDesign'
import { type RibbedPanel, ribbedPanel, shapeKey } from './ribbedPanel'
import { ribSection } from './ribSection'

/** One level of a ribbed scheme while it is sized, with what was worked out once for panels that are alike. */
export interface RibbedJob {
  readonly scheme: RibbedScheme
  readonly brief: Brief
  readonly basis: CodeBasis
  readonly level: LevelSite
  readonly rules: RibBarRules
  readonly shapeFor: ReturnType<typeof remember<RibbedPanel>>
  readonly zoneFor: ReturnType<typeof remember<number>>
  readonly designFor: ReturnType<typeof remember<RibDesign>>
}

/** Panels of a level laid out with a zone each, and their forces. */
export interface LaidLevel {
  readonly zones: readonly number[]
  readonly panels: readonly RibbedPanel[]
  readonly analyses: readonly RibAnalysis[]
}

/**
 * A job with nothing worked out yet.
 *
 * Source: project rule, engine design section 2
 */
export function ribbedJob(level: LevelSite, scheme: RibbedScheme, brief: Brief, basis: CodeBasis): RibbedJob {
  const heightMm = scheme.block.height + scheme.topping
  const rules = { basis, coverMm: brief.cover, trimmerMm: scheme.trimmerWidth, heightMm, stockMm: brief.stockLength }
  return { scheme, brief, basis, level, rules, shapeFor: remember(), zoneFor: remember(), designFor: remember() }
}

/**
 * The level's panels laid out with given zones and analysed together.
 *
 * Source: project rule, engine design sections 2 and 4
 * @param zones - one for each panel, mm
 */
export function laidLevel(job: RibbedJob, zones: readonly number[]): LaidLevel {
  const { level, basis, rules } = job
  const panels = level.panels.map((site, i) => shaped(job, site, zones[i]!))
  return { zones, panels, analyses: analyseRibs(level, panels, rules.heightMm, basis) }
}

function shaped({ scheme, brief, basis, level, shapeFor }: RibbedJob, site: PanelSite, zoneMm: number): RibbedPanel {
  const given = givenFor(scheme.givenPanels, level.mark, site.panel.mark)
  return shapeFor(shapeKey(site, zoneMm, given), () =>
    atPath(site.path, () => ribbedPanel(site, scheme, brief, basis, zoneMm, given)),
  )
}

/**
 * The same for panels of one level that are reinforced alike.
 *
 * Source: project rule, identical panels are sized once
 */
export function reinforcementKey({ key }: RibbedPanel, { forces, spanMm, position }: RibAnalysis): string {
  return [key, forces.key, spanMm.toPrecision(10), position].join(' ')
}

/**
 * What bars and checks of a panel are worked out from, with a zone of its own or another width.
 *
 * Source: project rule
 */
export function taskOf(job: RibbedJob, panel: RibbedPanel, analysis: RibAnalysis, zoneMm = panel.solidZoneMm): RibTask {
  const { scheme, brief, basis, rules } = job
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
