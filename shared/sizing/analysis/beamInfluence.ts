import { momentAt, shearAt, type SpanCase, supportMoments } from './continuousBeam'

/** Which spans carry their variable load. */
export type Pattern = readonly boolean[]

/** What loads on a strip do to one of its spans. */
export interface BeamInfluence {
  /** One for each span of the strip: the effects of 1 N/mm on it. */
  readonly influences: readonly SpanCase[]
  /** The load patterns that matter. */
  readonly patterns: readonly Pattern[]
}

/** Spans of a strip, mm, and whether the first and the last are overhangs. */
export interface BeamShape {
  readonly spansMm: readonly number[]
  readonly isCantilever: readonly [boolean, boolean]
}

/** Where along a span, as shares of it, patterns that sag or hog most are sought. */
const STATIONS = [0.05, 0.1, 0.2, 0.3, 0.4, 0.5, 0.6, 0.7, 0.8, 0.9, 0.95]

/**
 * Effects of even loads on the spans of a continuous beam, on one of its supported spans, and the patterns worth looking at.
 *
 * Source: three-moment equation (see supportMoments); moment of an overhang w·a²/2, statics
 * @param index - of the span in question, no overhang
 */
export function beamInfluence({ spansMm, isCantilever: [atStart, atEnd] }: BeamShape, index: number): BeamInfluence {
  const first = atStart ? 1 : 0
  const supported = spansMm.slice(first, spansMm.length - (atEnd ? 1 : 0))
  const loadedAlone = (at: number) => supported.map((_, i) => (i === at ? 1 : 0))
  const influences = spansMm.map((spanMm, loaded): SpanCase => {
    const isFirst = atStart && loaded === 0
    const isLast = atEnd && loaded === spansMm.length - 1
    const overhang = (spanMm * spanMm) / 2
    const moments =
      isFirst || isLast
        ? supportMoments(supported, loadedAlone(-1), [isFirst ? overhang : 0, isLast ? overhang : 0])
        : supportMoments(supported, loadedAlone(loaded - first))
    return { load: loaded === index ? 1 : 0, startMoment: moments[index - first]!, endMoment: moments[index - first + 1]! }
  })
  return { influences, patterns: patternsFor(influences, spansMm[index]!) }
}

/** All loaded, and the patterns that are worst for either sign of moment along the span and for shear at its ends. */
function patternsFor(influences: readonly SpanCase[], spanMm: number): Pattern[] {
  const effects: ((influence: SpanCase) => number)[] = [
    ({ startMoment }) => startMoment,
    ({ endMoment }) => endMoment,
    (influence) => shearAt(influence, spanMm, 0),
    (influence) => -shearAt(influence, spanMm, spanMm),
    ...STATIONS.flatMap((station) => [
      (influence: SpanCase) => momentAt(influence, spanMm, station * spanMm),
      (influence: SpanCase) => -momentAt(influence, spanMm, station * spanMm),
    ]),
  ]
  const patterns = [influences.map(() => true), ...effects.map((effect) => influences.map((influence) => effect(influence) > 0))]
  return [...new Map(patterns.map((pattern) => [pattern.join(), pattern])).values()]
}
