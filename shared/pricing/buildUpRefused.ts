import type { ApiIssue } from '../contracts/apiError'

/** A build-up that no rate can be made of: every issue names the line and the field, as `materials.0.resource`. */
export class BuildUpRefusedError extends Error {
  constructor(readonly issues: readonly ApiIssue[]) {
    super(issues.map(({ path, message }) => `${path}: ${message}`).join('; '))
    this.name = 'BuildUpRefusedError'
  }
}
