import { AppraisalRefusedError } from '#shared/appraisalRefused'
import { calculationOf } from '#shared/calculation/calculationOf'
import { tightestPanel } from '#shared/calculation/tightestPanel'
import { appraise, appraiseInFull } from '#shared/appraise'
import type { AppraisalFile } from '#shared/contracts/appraisal'
import type { Appraisal } from '#shared/contracts/appraisalResult'
import { checkFloor } from '#shared/layout/checkFloor'
import { OutOfScopeError } from '#shared/outOfScope'
import { parseAppraisalFile } from '#shared/parseAppraisalFile'
import type { AppraisalJob, AppraisalOutcome } from './appraisalJob'

/** Every scheme that can stand on the floor as it is stored; the others have no result. */
function appraiseStored(file: AppraisalFile): Appraisal {
  const schemes = file.schemes.filter((scheme) => checkFloor({ ...file, schemes: [scheme] }).length === 0)
  if (schemes.length === 0) return { format: 'bothways.appraisal-result/1', schemes: [], comparison: null }
  return appraiseInFull({ ...file, schemes }).appraisal
}

/** Every scheme, or the reasons why one of them has no result. */
function appraiseCompared(file: AppraisalFile): AppraisalOutcome {
  const { appraisal, sized, problems, alsoCompared, scopeDifferences } = appraiseInFull(parseAppraisalFile(file))
  if (problems.length > 0) {
    const issues = problems.map(({ scheme, issue }) => ({ path: `schemes.${scheme}.${issue.path}`, message: issue.message }))
    return { kind: 'outOfScope', issues }
  }
  const cutPanels = sized.map(({ panels }) => (panels[0] ? { ...panels[0], layout: null } : null))
  const calculations = appraisal.schemes.map((scheme) =>
    calculationOf(file, { scheme: scheme.mark, ...tightestPanel(scheme.checks) }),
  )
  return { kind: 'compared', appraisal, cutPanels, alsoCompared, scopeDifferences, calculations }
}

/** Appraises, and says in plain data how it ended, so that the outcome can cross threads. */
export function doAppraisalJob(job: AppraisalJob): AppraisalOutcome {
  try {
    if (job.kind === 'compared') return appraiseCompared(job.file)
    const appraisal = job.kind === 'sent' ? appraise(parseAppraisalFile(job.value)) : appraiseStored(job.file)
    return { kind: 'done', appraisal }
  } catch (error) {
    if (error instanceof AppraisalRefusedError) return { kind: 'refused', issues: error.issues }
    if (error instanceof OutOfScopeError) return { kind: 'outOfScope', issues: [{ path: error.path, message: error.expected }] }
    return { kind: 'fault', text: error instanceof Error ? (error.stack ?? error.message) : String(error) }
  }
}
