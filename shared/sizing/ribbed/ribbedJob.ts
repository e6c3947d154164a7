import type { Brief, RibbedScheme } from '../../contracts/appraisal'
import { alignedRows } from '../../layout/alignedRows'
import { type AnalysisRules, analysisRules } from '../analysis/analysisRules'
import type { CodeBasis } from '../codeBasis'
import { givenFor } from '../givenPanel'
import { atPath, type LevelSite } from '../panelSite'
import { remember } from '../remember'
import { analyseRibs, type RibAnalysis } from './ribAnalysis'
import type { RibBarRules } from './ribBarLines'
import type { RibDesign, RibTask } from './ribDesign'
import { refuseLooseRibs } from './refuseLooseRibs'
import { type RibbedGround, ribbedGround } from './ribbedGround'
import { type RibbedPanel, ribbedPanel, type RibbedShape, shapeKey } from './ribbedPanel'
import { ribSection } from './ribSection'

/** One level of a ribbed scheme while it is sized, with what was worked out once for panels that are alike. */
export interface RibbedJob {
  readonly scheme: RibbedScheme
  readonly brief: Brief
  readonly basis: CodeBasis
  readonly level: LevelSite
  readonly rules: RibBarRules
  readonly analysis: AnalysisRules
  /** One for each panel of the level. */
  readonly shapes: readonly RibbedShape[]
  /** One for each panel of the level. */
  readonly grounds: readonly RibbedGround[]
  readonly shapeFor: ReturnType<typeof remember<RibbedPanel>>
  readonly zoneFor: ReturnType<typeof remember<number>>
  readonly designFor: ReturnType<typeof remember<RibDesign>>
  readonly orderFor: RibTask['orderFor']
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
 * @throws OutOfScopeError where no row of blocks fits or ribs are not held
 */
export function ribbedJob(level: LevelSite, scheme: RibbedScheme, brief: Brief, basis: CodeBasis): RibbedJob {
  const heightMm = scheme.block.height + scheme.topping
  const rules = { basis, coverMm: brief.cover, trimmerMm: scheme.trimmerWidth, heightMm, stockMm: brief.stockLength }
  const aligned = scheme.alignRows ? alignedRows(level.panels, level.neighbours, scheme) : []
  const shapes = level.panels.map((site, i): RibbedShape => {
    const given = givenFor(scheme.givenPanels, level.mark, site.panel.mark)
    const rows = aligned[i] ?? null
    return { site, given, rows, key: shapeKey(site, rows, given) }
  })
  const groundFor = remember<RibbedGround>()
  const grounds = shapes.map(({ site, rows, key }) =>
    groundFor(key, () => atPath(site.path, () => ribbedGround(site, scheme, rows))),
  )
  refuseLooseRibs(level, grounds)
  const memory = { shapeFor: remember<RibbedPanel>(), zoneFor: remember<number>() }
  const analysis = analysisRules(basis, brief.redistribution)
  return { scheme, brief, basis, level, rules, analysis, shapes, grounds, ...memory, designFor: remember(), orderFor: remember() }
}

/**
 * The level's panels laid out with given zones and analysed together.
 *
 * Source: project rule, engine design sections 2 and 4
 * @param zones - one for each panel, mm
 */
export function laidLevel(job: RibbedJob, zones: readonly number[]): LaidLevel {
  const { level, shapes, grounds, basis, rules, analysis } = job
  const panels = shapes.map((shape, i) => shaped(job, shape, grounds[i]!, zones[i]!))
  const { heightMm, coverMm } = rules
  const depths = { heightMm, depthMm: heightMm - coverMm - job.scheme.link }
  return { zones, panels, analyses: analyseRibs(level, panels, depths, basis, analysis) }
}

function shaped(
  { scheme, brief, basis, shapeFor }: RibbedJob,
  shape: RibbedShape,
  ground: RibbedGround,
  zoneMm: number,
): RibbedPanel {
  return shapeFor(`${zoneMm} ${shape.key}`, () =>
    atPath(shape.site.path, () => ribbedPanel(shape, ground, scheme, brief, basis, zoneMm)),
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
  return { panel, context, scheme, rules, orderFor: job.orderFor }
}
