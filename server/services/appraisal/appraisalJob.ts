import type { ApiIssue } from '#shared/contracts/apiError'
import type { Appraisal, AppraisalFile } from '#shared/contracts/appraisal'

/** Work for another thread: a file as somebody sent it, or one of ours whose schemes are taken as far as they stand. */
export type AppraisalJob =
  { readonly kind: 'sent'; readonly value: unknown } | { readonly kind: 'stored'; readonly file: AppraisalFile }

/** How it ended. `outOfScope` names the field and what was expected, as `refused` does. */
export type AppraisalOutcome =
  | { readonly kind: 'done'; readonly appraisal: Appraisal }
  | { readonly kind: 'refused'; readonly issues: readonly ApiIssue[] }
  | { readonly kind: 'outOfScope'; readonly issues: readonly ApiIssue[] }
  | { readonly kind: 'fault'; readonly text: string }
