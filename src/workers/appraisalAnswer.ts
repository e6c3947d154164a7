import type { ApiIssue } from '#shared/contracts/apiError'
import type { Appraisal, AppraisalFile } from '#shared/contracts/appraisal'
import type { SizedScheme } from '#shared/sizing/sizedPanel'

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

/** Appraisal and sizes of one file, as the engine's front door gives them. */
export interface FullAppraisal {
  readonly appraisal: Appraisal
  readonly sized: readonly SizedScheme[]
}

/** `full` is null when nothing could be appraised; the reasons stand in `problems`, by path in the sheet. */
export interface AppraisalAnswer {
  readonly id: number
  readonly full: FullAppraisal | null
  readonly problems: readonly ApiIssue[]
}
