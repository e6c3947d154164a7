import type { Brief, RibbedScheme } from '../../contracts/appraisal'
import { layoutGround } from '../../layout/layoutGround'
import type { CodeBasis } from '../codeBasis'
import { overSupports } from '../bars/overSupports'
import type { LevelSite } from '../panelSite'
import type { SizedPanel } from '../sizedPanel'
import { designRibs } from './ribDesign'
import { laidOut } from './ribbedPanel'
import { reinforcementKey } from './ribbedJob'
import { ribTasks } from './ribTasks'
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
  const { job, tasks } = ribTasks(level, scheme, brief, basis)
  const designs = tasks.map((task) => job.designFor(reinforcementKey(task.panel, task.context.analysis), () => designRibs(task)))
  const lines = overSupports(
    level,
    tasks.map((task, i) => ribBarLines(task, designs[i]!)),
  )
  return level.panels.map((site, i) => {
    const [task, design] = [tasks[i]!, designs[i]!]
    const { panel } = task
    const ground = () => layoutGround(site.panel, scheme, job.shapes[i]!.rows?.starts)
    const layout = site === panel.site ? panel.layout : laidOut(site, scheme, basis, panel.solidZoneMm, ground())
    return sizedRibbedPanel(task, design, { level: level.mark, mark: site.panel.mark }, layout, lines[i]!)
  })
}
