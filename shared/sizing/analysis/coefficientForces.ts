import { ultimateLoad } from '../actions'
import type { LoadFactors } from '../codeBasis'
import { COEFFICIENT_REDISTRIBUTION, ONE_WAY_COEFFICIENTS, ONE_WAY_CONDITIONS } from '../tables/oneWayCoefficients'
import { type EndOfSpan, forcesKey, type SpanForces } from './spanForces'
import type { StripSpan } from './strip'

/**
 * Whether the coefficients of one-way slabs may be used for a strip.
 *
 * Source: BS 8110-1:1997, 3.5.2.3 (see ONE_WAY_CONDITIONS); not with an overhang, project rule on the safe side
 */
export function coefficientsApply(spans: readonly StripSpan[]): boolean {
  const limits = ONE_WAY_CONDITIONS
  const lengths = spans.map(({ spanMm }) => spanMm)
  return (
    spans.length >= limits.leastSpans &&
    !spans.some(({ isCantilever }) => isCantilever) &&
    Math.min(...lengths) >= limits.shortestToLongest * Math.max(...lengths) &&
    spans.every(
      ({ loads, bayMm2 }) =>
        bayMm2 >= limits.leastBayM2 * 1e6 &&
        loads.variableKnPerM2 <= limits.greatestImposedToDead * loads.permanentKnPerM2 &&
        loads.imposedKnPerM2 <= limits.greatestImposedKnPerM2,
    )
  )
}

/**
 * Forces of one span of a strip by coefficients of F, the ultimate load on the span, and l, its effective span. Over a support the
 * span with the greater F·l gives the moment. Between supports the moment follows from moment and shear at the end.
 *
 * Source: BS 8110-1:1997, Table 3.12 (see ONE_WAY_COEFFICIENTS)
 */
export function coefficientForces(spans: readonly StripSpan[], index: number, factors: LoadFactors): SpanForces {
  const { moment, shear } = ONE_WAY_COEFFICIENTS
  const loadOf = (i: number) => ultimateLoad(spans[i]!.loads, factors)
  const momentUnit = (i: number) => loadOf(i) * spans[i]!.spanMm ** 2
  const load = loadOf(index)
  const spanMm = spans[index]!.spanMm
  const isEndSpan = index === 0 || index === spans.length - 1
  const ends = { start: supportAt(index), end: supportAt(index + 1) }

  function supportAt(support: number) {
    if (support === 0 || support === spans.length) return { momentNmm: 0, shearN: shear.outerSupport * load * spanMm }
    const isFirst = support === 1 || support === spans.length - 1
    const unit = Math.max(momentUnit(support - 1), momentUnit(support))
    return {
      momentNmm: (isFirst ? moment.firstInteriorSupport : moment.interiorSupport) * unit,
      shearN: (isFirst ? shear.firstInteriorSupport : shear.interiorSupport) * load * spanMm,
    }
  }
  const hoggingNmm = (end: EndOfSpan, from: number) => ends[end].momentNmm - ends[end].shearN * from + (load * from ** 2) / 2
  return {
    method: 'coefficients',
    redistributedShare: COEFFICIENT_REDISTRIBUTION,
    key: forcesKey([load, spanMm, ...Object.values(ends).flatMap(({ momentNmm, shearN }) => [momentNmm, shearN])]),
    saggingNmm: (isEndSpan ? moment.endSpan : moment.interiorSpan) * momentUnit(index),
    hoggingNmm: (end, from) => (from < spanMm / 2 ? Math.max(0, hoggingNmm(end, from)) : 0),
    shearN: (end, from) => Math.max(0, ends[end].shearN - load * from),
    casesAt: (end, from) => [{ hoggingNmm: hoggingNmm(end, from), shearN: ends[end].shearN - load * from }],
  }
}
