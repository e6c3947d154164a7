import { AppraisalRefusedError } from '#shared/appraisalRefused'
import { appraise, appraiseInFull } from '#shared/appraise'
import type { Appraisal, AppraisalFile } from '#shared/contracts/appraisal'
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

/** Appraises, and says in plain data how it ended, so that the outcome can cross threads. */
export function doAppraisalJob(job: AppraisalJob): AppraisalOutcome {
  try {
    const appraisal = job.kind === 'sent' ? appraise(parseAppraisalFile(job.value)) : appraiseStored(job.file)
    return { kind: 'done', appraisal }
  } catch (error) {
    if (error instanceof AppraisalRefusedError) return { kind: 'refused', issues: error.issues }
    if (error instanceof OutOfScopeError) return { kind: 'outOfScope', issues: [{ path: error.path, message: error.expected }] }
    return { kind: 'fault', text: error instanceof Error ? (error.stack ?? error.message) : String(error) }
  }
}
