import { ultimateLoad } from '../actions'
import type { LoadFactors, SpanPosition } from '../codeBasis'
import { coefficientForces, coefficientsApply } from './coefficientForces'
import { elasticForces } from './elasticForces'
import { type SpanForces, simpleSpanForces } from './spanForces'
import type { Strip } from './strip'

/**
 * Forces of the looked-at span of a strip: by coefficients where their conditions hold, else as an elastic continuous beam.
 *
 * Source: BS 8110-1:1997, 3.5.2.3 and Table 3.12; EN 1992-1-1:2004, 5.4 (engine design section 4)
 */
export function stripForces({ spans, index }: Strip, factors: LoadFactors): SpanForces {
  if (spans.length === 1) return simpleSpanForces(ultimateLoad(spans[0]!.loads, factors), spans[0]!.spanMm)
  return coefficientsApply(spans) ? coefficientForces(spans, index, factors) : elasticForces(spans, index, factors)
}

/**
 * Whether the looked-at span is a simple, an end or an interior one.
 *
 * Source: project rule, rows of EN 1992-1-1:2004 Table 7.4N
 */
export function positionIn({ spans, index }: Strip): SpanPosition {
  const outer = (index === 0 ? 1 : 0) + (index === spans.length - 1 ? 1 : 0)
  return outer === 2 ? 'simple' : outer === 1 ? 'end' : 'interior'
}
