import { ultimateLoad } from '../actions'
import type { SpanPosition } from '../codeBasis'
import type { AnalysisRules } from './analysisRules'
import { cantileverForces } from './cantileverForces'
import { coefficientForces, coefficientsApply } from './coefficientForces'
import { elasticForces } from './elasticForces'
import { type SpanForces, simpleSpanForces } from './spanForces'
import type { Strip } from './strip'

/**
 * Forces of the looked-at span of a strip: by coefficients where their conditions hold, else as an elastic continuous beam; those of a
 * cantilever by statics.
 *
 * Source: BS 8110-1:1997, 3.5.2.3 and Table 3.12; EN 1992-1-1:2004, 5.4 (engine design section 4)
 */
export function stripForces({ spans, index }: Strip, rules: AnalysisRules): SpanForces {
  const { spanMm, loads, isCantilever } = spans[index]!
  if (isCantilever) return cantileverForces(ultimateLoad(loads, rules.factors), spanMm, index === 0 ? 'end' : 'start')
  if (spans.length === 1) return simpleSpanForces(ultimateLoad(loads, rules.factors), spanMm)
  return coefficientsApply(spans) ? coefficientForces(spans, index, rules.factors) : elasticForces(spans, index, rules)
}

/**
 * Whether the looked-at span is a simple, an end or an interior one, or a cantilever. An overhang does not make its neighbour continuous
 * there: without its load it restrains nothing.
 *
 * Source: project rule, rows of EN 1992-1-1:2004 Table 7.4N
 */
export function positionIn({ spans, index }: Strip): SpanPosition {
  if (spans[index]!.isCantilever) return 'cantilever'
  const isOuter = (at: number) => !spans[at] || spans[at].isCantilever === true
  const outer = Number(isOuter(index - 1)) + Number(isOuter(index + 1))
  return outer === 2 ? 'simple' : outer === 1 ? 'end' : 'interior'
}
