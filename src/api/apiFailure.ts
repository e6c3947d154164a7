import type { ApiErrorCode, ApiIssue } from '#shared/contracts/apiError'

/** The contract's codes, and two of the line itself: no answer came, or one that the contract does not know. */
export type FailureCode = ApiErrorCode | 'unreachable' | 'unreadable'

/** What an API call throws. Texts for the reader are chosen by `code`; `message` says what the server said. */
export class ApiFailure extends Error {
  constructor(
    readonly code: FailureCode,
    message: string,
    readonly issues: readonly ApiIssue[] = [],
    readonly requestId: string | null = null,
  ) {
    super(message)
    this.name = 'ApiFailure'
  }
}
