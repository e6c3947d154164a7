import type { FullAppraisal } from '#shared/appraise'
import type { ApiIssue } from '#shared/contracts/apiError'
import type { AppraisalFile } from '#shared/contracts/appraisal'

/** Where the rows of a file stood in the sheet it was made from, so that a path leads back to what was typed. */
export interface FileOrigin {
  readonly levels: readonly { readonly index: number; readonly panels: readonly number[] }[]
  readonly schemes: readonly number[]
}

export interface AppraisalRequest {
  readonly id: number
  readonly file: AppraisalFile
  readonly origin: FileOrigin
}

/** `full` is null when nothing could be appraised; the reasons stand in `problems`, by path in the sheet. */
export interface AppraisalAnswer {
  readonly id: number
  readonly full: FullAppraisal | null
  /** What `full` was made from: the file less what could not stand; null with it. */
  readonly file: AppraisalFile | null
  readonly problems: readonly ApiIssue[]
}
