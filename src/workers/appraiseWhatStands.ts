import type { FullAppraisal } from '#shared/appraise'
import { AppraisalRefusedError } from '#shared/appraisalRefused'
import type { ApiIssue } from '#shared/contracts/apiError'
import type { AppraisalFile } from '#shared/contracts/appraisal'
import { OutOfScopeError } from '#shared/outOfScope'
import type { AppraisalAnswer } from './appraisalAnswer'
import type { TracedFile } from './fileRows'
import { namesFloor, pathInSheet, rowCount, withoutRows } from './fileRows'
import { panelMisfits } from './panelMisfits'

type Appraise = (file: AppraisalFile) => FullAppraisal

/** What could be appraised, from which file, and what could not. */
type Stood = Omit<AppraisalAnswer, 'id'>

/** The result of one try, and what it says against the file. @throws what is a fault of the engine */
function attempt(appraise: Appraise, file: AppraisalFile): { full: FullAppraisal | null; issues: readonly ApiIssue[] } {
  try {
    const full = appraise(file)
    return { full, issues: full.problems.map(({ issue }) => issue) }
  } catch (cause) {
    if (cause instanceof AppraisalRefusedError) return { full: null, issues: cause.issues }
    if (cause instanceof OutOfScopeError) return { full: null, issues: [{ path: cause.path, message: cause.expected }] }
    throw cause
  }
}

/**
 * Appraises what stands: a row that the engine refuses is left out, its reason kept, and the rest is appraised again,
 * so that one half-typed panel does not blank the sheet. A panel that one scheme cannot cover is left out of all of them,
 * so that the schemes still answer the same floor.
 */
export function appraiseWhatStands(appraise: Appraise, given: TracedFile): Stood {
  const misfits = panelMisfits(given.file)
  const problems: ApiIssue[] = misfits.map(({ path, message }) => ({ path: pathInSheet(path, given.origin), message }))
  let traced = withoutRows(
    given,
    misfits.map(({ path }) => path),
  )
  while (traced.file.levels.length > 0 && traced.file.schemes.length > 0) {
    const { full, issues } = attempt(appraise, traced.file)
    const { origin } = traced
    problems.push(...issues.map(({ path, message }) => ({ path: pathInSheet(path, origin), message })))
    const barred = issues.map(({ path }) => path).filter((path) => full === null || namesFloor(path))
    if (barred.length === 0) return stood(full, traced.file, problems)
    const rest = withoutRows(traced, barred)
    if (rowCount(rest) === rowCount(traced)) return stood(full, traced.file, problems)
    traced = rest
  }
  return stood(null, traced.file, problems)
}

const stood = (full: FullAppraisal | null, file: AppraisalFile, problems: readonly ApiIssue[]): Stood => ({
  full,
  file: full && file,
  problems,
})
