import { type EndOfSpan, forcesKey, type SpanForces } from './spanForces'

/**
 * Forces of an even load on a span that is held at one end only.
 *
 * Source: statics, w·(a − x)²/2 and w·(a − x)
 * @param load - N/mm per metre of width, which is kN/m²
 * @param held - the end that goes on behind its support
 */
export function cantileverForces(load: number, spanMm: number, held: EndOfSpan): SpanForces {
  const beyond = (end: EndOfSpan, from: number) => Math.max(0, end === held ? spanMm - from : from)
  const hoggingNmm = (end: EndOfSpan, from: number) => (load * beyond(end, from) ** 2) / 2
  return {
    method: 'elastic',
    redistributedShare: 0,
    key: `cantilever ${held} ${forcesKey([load, spanMm])}`,
    saggingNmm: 0,
    hoggingNmm,
    shearN: (end, from) => (end === held ? load * beyond(end, from) : 0),
    casesAt: (end, from) => [{ hoggingNmm: hoggingNmm(end, from), shearN: (end === held ? 1 : -1) * load * beyond(end, from) }],
  }
}
