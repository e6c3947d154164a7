import type { Brief, RibbedScheme } from '../../contracts/appraisal'
import type { CodeBasis } from '../codeBasis'
import type { LevelSite } from '../panelSite'
import { refuseCoverThroughSection } from '../sectionDepth'
import { CHOSEN_DIAMETERS } from '../tables/bars'
import type { RibTask } from './ribDesign'
import { ribbedJob, type RibbedJob, taskOf } from './ribbedJob'
import { settleZones } from './settleZones'

/** A level of a ribbed scheme laid out and analysed: what the bars and checks of each panel are worked out from. */
export interface RibbedLevel {
  readonly job: RibbedJob
  readonly tasks: readonly RibTask[]
}

/**
 * The panels of a level laid out with the solid zones they need or are given, and analysed.
 *
 * Source: project rule, engine design sections 2 and 4
 * @throws OutOfScopeError where ribs do not run from support to support, no block fits, or the cover takes up the depth
 */
export function ribTasks(level: LevelSite, scheme: RibbedScheme, brief: Brief, basis: CodeBasis): RibbedLevel {
  refuseCoverThroughSection(scheme.block.height + scheme.topping, brief.cover + scheme.link + CHOSEN_DIAMETERS[0])
  const job = ribbedJob(level, scheme, brief, basis)
  const { panels, analyses } = settleZones(job)
  return { job, tasks: panels.map((panel, i) => taskOf(job, panel, analyses[i]!)) }
}
