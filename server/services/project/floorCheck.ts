import type { ApiIssue } from '#shared/contracts/apiError'
import type { LevelInput } from '#shared/contracts/project'
import { checkOverlaps } from '#shared/layout/checks/checkOverlaps'
import { checkPanel } from '#shared/layout/checks/checkPanel'
import { AppError } from '../../errors'

function markIssues({ panels }: LevelInput): ApiIssue[] {
  const first = new Map<string, number>()
  return panels.flatMap(({ mark }, index) => {
    if (!first.has(mark)) first.set(mark, index)
    const earlier = first.get(mark)!
    return earlier < index
      ? [{ path: `panels.${index}.mark`, message: `expected a mark of its own: panels.${earlier} has it too` }]
      : []
  })
}

/**
 * The geometric rules of the appraisal file, for a level that is stored: a floor that cannot be is not kept.
 * Whether a scheme's blocks fit is asked when it is appraised, since schemes and levels change apart.
 * @throws AppError `invalid_request` naming every panel that cannot be built as drawn
 */
export function requireSoundFloor(level: LevelInput): void {
  const ofPanels = level.panels.flatMap((panel, index) => checkPanel(panel, `panels.${index}`))
  const overlaps =
    ofPanels.length > 0 ? [] : checkOverlaps(level, '').map(({ path, message }) => ({ path: path.replace(/^\./, ''), message }))
  const issues = [...markIssues(level), ...ofPanels, ...overlaps].slice(0, 50)
  if (issues.length > 0) throw new AppError('invalid_request', undefined, issues)
}
