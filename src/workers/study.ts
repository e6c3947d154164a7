import { appraise } from '#shared/appraise'
import type { PanelCalculation } from '#shared/calculation/calculation'
import { type CalculationTarget, calculationOf } from '#shared/calculation/calculationOf'
import { cheapestThickness, type ThicknessChoice } from '#shared/comparison/cheapestThickness'
import type { AppraisalFile } from '#shared/contracts/appraisal'
import { OutOfScopeError } from '#shared/outOfScope'
import type { CheckTarget, Cures } from '#shared/sizing/cures/cure'
import { curesOf } from '#shared/sizing/cures/curesOf'

/** What may be asked about a file beside its appraisal: slow, and only when somebody looks. */
export interface StudyQuestions {
  readonly calculation: { readonly file: AppraisalFile; readonly target: CalculationTarget }
  readonly cures: { readonly file: AppraisalFile; readonly scheme: string; readonly target: CheckTarget }
  readonly thickness: { readonly file: AppraisalFile; readonly scheme: string }
}

/** What comes back. */
export interface StudyAnswers {
  readonly calculation: PanelCalculation
  readonly cures: Cures
  readonly thickness: ThicknessChoice
}

export type StudyKind = keyof StudyQuestions

/** A question by its number, and its answer, or why there is none. */
export type StudyRequest = { [Kind in StudyKind]: { readonly id: number; readonly kind: Kind } & StudyQuestions[Kind] }[StudyKind]
export type StudyReply =
  { readonly id: number; readonly answer: StudyAnswers[StudyKind] } | { readonly id: number; readonly problem: string }

function answerOf(request: StudyRequest): StudyAnswers[StudyKind] {
  switch (request.kind) {
    case 'calculation':
      return calculationOf(request.file, request.target)
    case 'thickness':
      return cheapestThickness(request.file, request.scheme, appraise)
    case 'cures': {
      const scheme = request.file.schemes.find(({ mark }) => mark === request.scheme)
      if (scheme === undefined) throw new RangeError(`expected the mark of a scheme, got ${request.scheme}`)
      return curesOf({ ...request.file, scheme }, request.target)
    }
  }
}

/** The answer, or in words why there is none: what lies outside the rules, or is no longer on the sheet. @throws faults of the engine */
export function studied(request: StudyRequest): StudyReply {
  try {
    return { id: request.id, answer: answerOf(request) }
  } catch (cause) {
    if (cause instanceof OutOfScopeError) return { id: request.id, problem: cause.expected }
    if (cause instanceof RangeError) return { id: request.id, problem: cause.message }
    throw cause
  }
}
