import type { LoadFactors } from '../codeBasis'
import { type SpanCase, greatestSagging, momentAt, shearAt, supportMoments } from './continuousBeam'
import { forcesKey, type SpanForces } from './spanForces'
import type { StripSpan } from './strip'

/** Where along a span, as shares of it, patterns that sag or hog most are sought. */
const STATIONS = [0.05, 0.1, 0.2, 0.3, 0.4, 0.5, 0.6, 0.7, 0.8, 0.9, 0.95]

/** Effects of 1 N/mm on one span of the strip, on the span in question. */
type Influence = SpanCase

/**
 * Forces of one span of a continuous strip on knife edges, envelope of the load patterns that matter to it: every span either
 * carries its variable load or does not; unloaded spans keep the permanent load with its own factor.
 *
 * Source: EN 1992-1-1:2004, 5.1.3 and 5.4 (linear elastic analysis, pattern loading); three-moment equation
 * @param index - of the span in question
 */
export function elasticForces(spans: readonly StripSpan[], index: number, factors: LoadFactors): SpanForces {
  const lengths = spans.map(({ spanMm }) => spanMm)
  const spanMm = lengths[index]!
  const influences = lengths.map((_, loaded): Influence => {
    const unit = lengths.map((__, each) => (each === loaded ? 1 : 0))
    const moments = supportMoments(lengths, unit)
    return { load: unit[index]!, startMoment: moments[index]!, endMoment: moments[index + 1]! }
  })
  const cases = patternsFor(influences, spanMm).map((isLoaded) => superposed(spans, influences, isLoaded, factors))
  const most = (effect: (each: SpanCase) => number) => Math.max(0, ...cases.map(effect))
  return {
    method: 'elastic',
    redistributedShare: 0,
    key: forcesKey([spanMm, ...cases.flatMap(({ load, startMoment, endMoment }) => [load, startMoment, endMoment])]),
    saggingNmm: most((each) => greatestSagging(each, spanMm)),
    hoggingNmm: (end, from) => most((each) => -momentAt(each, spanMm, end === 'start' ? from : spanMm - from)),
    casesAt: (end, from) =>
      cases.map((each) => {
        const fromStartMm = end === 'start' ? from : spanMm - from
        const shear = shearAt(each, spanMm, fromStartMm)
        return { hoggingNmm: -momentAt(each, spanMm, fromStartMm), shearN: end === 'start' ? shear : -shear }
      }),
    shearN: (end, from) =>
      most((each) => (end === 'start' ? shearAt(each, spanMm, from) : -shearAt(each, spanMm, spanMm - from))),
  }
}

type Pattern = readonly boolean[]

/** All loaded, and the patterns that are worst for either sign of moment along the span and for shear at its ends. */
function patternsFor(influences: readonly Influence[], spanMm: number): Pattern[] {
  const effects: ((influence: Influence) => number)[] = [
    ({ startMoment }) => startMoment,
    ({ endMoment }) => endMoment,
    (influence) => shearAt(influence, spanMm, 0),
    (influence) => -shearAt(influence, spanMm, spanMm),
    ...STATIONS.flatMap((station) => [
      (influence: Influence) => momentAt(influence, spanMm, station * spanMm),
      (influence: Influence) => -momentAt(influence, spanMm, station * spanMm),
    ]),
  ]
  const patterns = [influences.map(() => true), ...effects.map((effect) => influences.map((influence) => effect(influence) > 0))]
  return [...new Map(patterns.map((pattern) => [pattern.join(), pattern])).values()]
}

function superposed(
  spans: readonly StripSpan[],
  influences: readonly Influence[],
  isLoaded: Pattern,
  factors: LoadFactors,
): SpanCase {
  let [load, startMoment, endMoment] = [0, 0, 0]
  influences.forEach((influence, i) => {
    const { permanentKnPerM2: permanent, variableKnPerM2: variable } = spans[i]!.loads
    const carried = isLoaded[i] ? factors.permanent * permanent + factors.variable * variable : factors.unloaded * permanent
    load += carried * influence.load
    startMoment += carried * influence.startMoment
    endMoment += carried * influence.endMoment
  })
  return { load, startMoment, endMoment }
}
