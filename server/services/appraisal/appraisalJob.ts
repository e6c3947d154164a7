import type { PanelCalculation } from '#shared/calculation/calculation'
import type { AlsoCompared } from '#shared/alsoCompared/alsoCompared'
import type { ScopeDifference } from '#shared/alsoCompared/scopeDifferences'
import type { ApiIssue } from '#shared/contracts/apiError'
import type { AppraisalFile } from '#shared/contracts/appraisal'
import type { Appraisal } from '#shared/contracts/appraisalResult'
import type { SizedPanel } from '#shared/sizing/sizedPanel'

/**
 * Work for another thread: a file as somebody sent it; one of ours whose schemes are taken as far as they stand; or one of ours
 * that must stand as a whole, to be compared and drawn.
 */
export type AppraisalJob =
  | { readonly kind: 'sent'; readonly value: unknown }
  | { readonly kind: 'stored'; readonly file: AppraisalFile }
  | { readonly kind: 'compared'; readonly file: AppraisalFile }

/** An appraisal with the panel of each scheme that its cross-section shows, without the panel's blocks. */
export interface ComparedAppraisal {
  readonly appraisal: Appraisal
  readonly cutPanels: readonly (SizedPanel | null)[]
  /** Beside `appraisal.schemes`. */
  readonly alsoCompared: readonly AlsoCompared[]
  readonly scopeDifferences: readonly ScopeDifference[]
  /** Of the panel with the tightest check, beside `appraisal.schemes`. */
  readonly calculations: readonly PanelCalculation[]
}

/** How it ended. `outOfScope` names the field and what was expected, as `refused` does. */
export type AppraisalOutcome =
  | { readonly kind: 'done'; readonly appraisal: Appraisal }
  | ({ readonly kind: 'compared' } & ComparedAppraisal)
  | { readonly kind: 'refused'; readonly issues: readonly ApiIssue[] }
  | { readonly kind: 'outOfScope'; readonly issues: readonly ApiIssue[] }
  | { readonly kind: 'fault'; readonly text: string }
