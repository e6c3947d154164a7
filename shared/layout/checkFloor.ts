import type { ApiIssue } from '../contracts/apiError'
import type { AppraisalFile } from '../contracts/appraisal'
import { checkBeyond } from './checks/checkBeyond'
import { checkBlockFit } from './checks/checkBlockFit'
import { checkGivenPanels } from './checks/checkGivenPanels'
import { checkMarks } from './checks/checkMarks'
import { checkOverlaps } from './checks/checkOverlaps'
import { checkPanel } from './checks/checkPanel'

/**
 * Geometric rules on top of the appraisal file's schema, in the order of the file: every issue names the field and what was
 * expected. Rules that need a sound outline (overlaps, blocks) wait until a level's, or a panel's, own rings are in order.
 *
 * Source: project rule, engine design section 9
 * @param file - one that the schema accepted
 * @returns issues with paths as `levels.0.panels.2.outline.3`; empty when the floor can be laid out
 */
export function checkFloor(file: AppraisalFile): ApiIssue[] {
  const ribbed = file.schemes.flatMap((scheme, i) => (scheme.kind === 'ribbed' ? [{ scheme, path: `schemes.${i}` }] : []))
  const ofLevels = file.levels.flatMap((level, i) => {
    const path = `levels.${i}`
    const ofPanels = level.panels.flatMap((panel, j): ApiIssue[] => {
      const own = checkPanel(panel, `${path}.panels.${j}`)
      if (own.length > 0) return own
      const where = `panel ${panel.mark} of level ${level.mark}`
      return ribbed.flatMap(({ scheme, path: schemePath }) => checkBlockFit(panel, scheme, where, schemePath))
    })
    if (ofPanels.some((issue) => issue.path.startsWith(path))) return ofPanels
    return [...ofPanels, ...checkOverlaps(level, path), ...checkBeyond(level, path)]
  })
  return [...checkMarks(file), ...ofLevels, ...checkGivenPanels(file)]
}
