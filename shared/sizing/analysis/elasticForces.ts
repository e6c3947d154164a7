import type { LoadFactors } from '../codeBasis'
import type { AnalysisRules } from './analysisRules'
import { beamInfluence, type BeamInfluence, type Pattern } from './beamInfluence'
import { greatestSagging, momentAt, shearAt, type SpanCase } from './continuousBeam'
import { mayRedistribute, redistributed } from './redistribution'
import { type EndOfSpan, forcesKey, type SpanForces } from './spanForces'
import type { StripSpan } from './strip'

/**
 * Forces of one supported span of a continuous strip on knife edges, overhangs and all, envelope of the load patterns that matter to it:
 * every span either carries its variable load or does not; unloaded spans keep the permanent load with its own factor. Support moments
 * are redistributed where that is asked for and the code allows it.
 *
 * Source: EN 1992-1-1:2004, 5.1.3, 5.4 and 5.5 (linear elastic analysis, pattern loading, redistribution); BS 8110-1:1997, 3.2.2.1
 * @param index - of the span in question
 */
export function elasticForces(spans: readonly StripSpan[], index: number, rules: AnalysisRules): SpanForces {
  const spanMm = spans[index]!.spanMm
  const { influences, patterns } = influenceOf(spans, index, rules)
  const elastic = patterns.map((isLoaded) => superposed(spans, influences, isLoaded, rules.factors))
  const share = shareOff(spans, rules)
  if (share === 0) return { ...envelope(elastic, spanMm), redistributedShare: 0, key: casesKey(spanMm, elastic) }
  const cases = redistributed(elastic, share, beside(spans, index))
  const [after, before] = [envelope(cases, spanMm), envelope(elastic, spanMm)]
  const { leastElasticShare } = rules.redistribution
  return {
    ...after,
    redistributedShare: share,
    key: `${casesKey(spanMm, elastic)} ${share}`,
    hoggingNmm: (end, from) => Math.max(after.hoggingNmm(end, from), leastElasticShare * before.hoggingNmm(end, from)),
  }
}

/** Whether the spans before and after one are overhangs. */
function beside(spans: readonly StripSpan[], index: number): [boolean, boolean] {
  const isCantilever = (at: number) => spans[at]?.isCantilever === true
  return [isCantilever(index - 1), isCantilever(index + 1)]
}

/** Share taken off the support moments of a strip: none where statics alone decide them, or the code forbids it. */
function shareOff(spans: readonly StripSpan[], { redistributedShare, redistribution }: AnalysisRules): number {
  const supported = spans.filter(({ isCantilever }) => !isCantilever).length
  return redistributedShare > 0 && supported > 1 && mayRedistribute(spans, redistribution) ? redistributedShare : 0
}

function influenceOf(spans: readonly StripSpan[], index: number, { influenceFor }: AnalysisRules): BeamInfluence {
  const spansMm = spans.map((span) => span.spanMm)
  const isCantilever = [spans[0]!.isCantilever === true, spans[spans.length - 1]!.isCantilever === true] as const
  return influenceFor(`${index} ${isCantilever.join()} ${spansMm.join()}`, () => beamInfluence({ spansMm, isCantilever }, index))
}

function casesKey(spanMm: number, cases: readonly SpanCase[]): string {
  return forcesKey([spanMm, ...cases.flatMap(({ load, startMoment, endMoment }) => [load, startMoment, endMoment])])
}

/** Greatest forces of all cases, and the cases themselves. */
function envelope(
  cases: readonly SpanCase[],
  spanMm: number,
): Pick<SpanForces, 'method' | 'saggingNmm' | 'hoggingNmm' | 'shearN' | 'casesAt'> {
  const most = (effect: (each: SpanCase) => number) => cases.reduce((greatest, each) => Math.max(greatest, effect(each)), 0)
  const at = (end: EndOfSpan, from: number) => (end === 'start' ? from : spanMm - from)
  return {
    method: 'elastic',
    saggingNmm: most((each) => greatestSagging(each, spanMm)),
    hoggingNmm: (end, from) => most((each) => -momentAt(each, spanMm, at(end, from))),
    shearN: (end, from) =>
      most((each) => (end === 'start' ? shearAt(each, spanMm, from) : -shearAt(each, spanMm, spanMm - from))),
    casesAt: (end, from) =>
      cases.map((each) => {
        const shear = shearAt(each, spanMm, at(end, from))
        return { hoggingNmm: -momentAt(each, spanMm, at(end, from)), shearN: end === 'start' ? shear : -shear }
      }),
  }
}

function superposed(
  spans: readonly StripSpan[],
  influences: readonly SpanCase[],
  isLoaded: Pattern,
  factors: LoadFactors,
): SpanCase {
  let [load, startMoment, endMoment] = [0, 0, 0]
  influences.forEach((influence, i) => {
    const { loads, isPartOfWidth } = spans[i]!
    const { permanentKnPerM2: permanent, variableKnPerM2: variable } = loads
    const unloaded = isPartOfWidth ? 0 : factors.unloaded * permanent
    const carried = isLoaded[i] ? factors.permanent * permanent + factors.variable * variable : unloaded
    load += carried * influence.load
    startMoment += carried * influence.startMoment
    endMoment += carried * influence.endMoment
  })
  return { load, startMoment, endMoment }
}
