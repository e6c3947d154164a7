import { AppraisalRefusedError } from './appraisalRefused'
import { appraisalFile, type AppraisalFile } from './contracts/appraisal'
import { checkFloor } from './layout/checkFloor'
import { readableIssues } from './readableIssues'

/**
 * An appraisal file read from anything: defaults filled in, nothing repaired.
 *
 * @throws AppraisalRefusedError with every field that is missing, unknown, of the wrong kind or out of range; where all fields
 *   can be read, with what is wrong with the floor they describe
 */
export function parseAppraisalFile(value: unknown): AppraisalFile {
  const parsed = appraisalFile.safeParse(value)
  if (!parsed.success) throw new AppraisalRefusedError(readableIssues(parsed.error.issues, value))
  const issues = checkFloor(parsed.data)
  if (issues.length > 0) throw new AppraisalRefusedError(issues)
  return parsed.data
}
