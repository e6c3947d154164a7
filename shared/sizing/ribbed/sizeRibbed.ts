import type { Brief, RibbedScheme } from '../../contracts/appraisal'
import type { CodeBasis } from '../codeBasis'
import { overSupports } from '../bars/overSupports'
import type { LevelSite } from '../panelSite'
import { refuseCoverThroughSection } from '../sectionDepth'
import type { SizedPanel } from '../sizedPanel'
import { CHOSEN_DIAMETERS } from '../tables/bars'
import { designRibs } from './ribDesign'
import { laidOut } from './ribbedPanel'
import { reinforcementKey, ribbedJob, taskOf } from './ribbedJob'
import { settleZones } from './settleZones'
import { ribBarLines, sizedRibbedPanel } from './sizedRibbedPanel'

/**
 * The panels of a level built ribbed: laid out, analysed one way along the ribs, reinforced and checked.
 *
 * Signs: moments and forces are magnitudes, sagging and hogging apart. Lengths mm, forces N, moments N·mm, per metre of width until
 * `perRib` makes them those of one rib.
 *
 * Source: project rule, engine design sections 2 and 4
 * @throws OutOfScopeError where ribs do not run from support to support, no block fits, or the cover takes up the depth
 */
export function sizeRibbed(level: LevelSite, scheme: RibbedScheme, brief: Brief, basis: CodeBasis): SizedPanel[] {
  refuseCoverThroughSection(scheme.block.height + scheme.topping, brief.cover + scheme.link + CHOSEN_DIAMETERS[0])
  const job = ribbedJob(level, scheme, brief, basis)
  const { panels, analyses } = settleZones(job)
  const designed = panels.map((panel, i) => {
    const task = taskOf(job, panel, analyses[i]!)
    return { task, design: job.designFor(reinforcementKey(panel, analyses[i]!), () => designRibs(task)) }
  })
  const lines = overSupports(
    level,
    designed.map(({ task, design }) => ribBarLines(task, design)),
  )
  return level.panels.map((site, i) => {
    const [panel, { task, design }] = [panels[i]!, designed[i]!]
    const layout = site === panel.site ? panel.layout : laidOut(site, scheme, basis, panel.solidZoneMm)
    return sizedRibbedPanel(task, design, { level: level.mark, mark: site.panel.mark }, layout, lines[i]!)
  })
}
