import type { ApiIssue } from './contracts/apiError'

/** An appraisal file that cannot be appraised as it stands: every issue names a field and what was expected of it. */
export class AppraisalRefusedError extends Error {
  constructor(readonly issues: readonly ApiIssue[]) {
    super(issues.map(({ path, message }) => (path === '' ? message : `${path}: ${message}`)).join('; '))
    this.name = 'AppraisalRefusedError'
  }
}
