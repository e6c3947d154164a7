import type { AppraisalFile, Scheme } from '../contracts/appraisal'
import type { DeadLoad } from '../contracts/appraisalResult'
import type { SizedPanel } from '../sizing/sizedPanel'
import type { SchemeMeasures } from '../takeoff/schemeMeasures'
import type { AlsoFigure } from './alsoFigure'
import { carbonFigures } from './carbonFigures'
import { fireFigure } from './fireFigure'
import { labourFigures } from './labourFigures'
import { type ScopeAnswer, scopeAnswers } from './scopeAnswers'
import { soundFigures } from './soundFigures'
import { weightFigures } from './weightFigures'

/** What is compared of one scheme beside its cost, and what it declares of the same scope. */
export interface AlsoCompared {
  readonly mark: string
  readonly kind: Scheme['kind']
  /** One for each of `FIGURE_KEYS`, in their order. */
  readonly figures: readonly AlsoFigure[]
  readonly scope: readonly ScopeAnswer[]
}

/** A scheme as appraised, as far as this needs it. */
export interface AppraisedScheme {
  readonly mark: string
  readonly kind: Scheme['kind']
  readonly deadLoad: DeadLoad
  readonly panels: readonly SizedPanel[]
  readonly measures: SchemeMeasures
}

/**
 * Everything that is compared beside the cost: weight, steel, labour, time, formwork, carbon, sound and fire, each with its formula and
 * source.
 *
 * Source: project rule, engine design section 5 (also compared); each figure its own
 */
export function alsoCompared(
  { mark, kind, deadLoad, panels, measures }: AppraisedScheme,
  { brief, factors, scope }: Pick<AppraisalFile, 'brief' | 'factors' | 'scope'>,
): AlsoCompared {
  return {
    mark,
    kind,
    figures: [
      ...weightFigures(measures, deadLoad),
      ...labourFigures(measures, factors.labour),
      ...carbonFigures(measures, factors.carbon),
      ...soundFigures(measures),
      fireFigure(panels, brief),
    ],
    scope: scopeAnswers(scope, mark, measures),
  }
}
