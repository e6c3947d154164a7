import { type EndOfSpan, type SpanForces } from './spanForces'
import type { Strip } from './strip'

/**
 * Strips for which top bars may end at the usual share of the span: no overhang, spans within 15 % of the longest, little variable load.
 *
 * Source: BS 8110-1:1997, 3.12.10.3.1 (spans about equal, one load case; seen in part); 15 %: as published detailing rules have it (seen);
 *   the same for other bases, common practice
 */
const EVEN = { shortestToLongest: 0.85, greatestVariableToPermanent: 1.25 } as const

/** Stations along a span at which hogging is looked for, and halvings that find its end between two of them. */
const [STATIONS, HALVINGS] = [20, 12]

function isEven({ spans }: Strip): boolean {
  const lengths = spans.map(({ spanMm }) => spanMm)
  return (
    !spans.some(({ isCantilever }) => isCantilever) &&
    Math.min(...lengths) >= EVEN.shortestToLongest * Math.max(...lengths) &&
    spans.every(({ loads }) => loads.variableKnPerM2 <= EVEN.greatestVariableToPermanent * loads.permanentKnPerM2)
  )
}

/**
 * How far from one end a span hogs under some load case, as a share of the span: 1 where it does so all along. 0 where nobody needs to
 * know: the strip is even enough for the usual length of top bars, or is no strip.
 *
 * Source: statics, the envelope of the load patterns (see `elasticForces`)
 * @param forces - of the looked-at span of the strip, not raised to those of its neighbours
 */
export function hoggingShare(strip: Strip, forces: SpanForces, end: EndOfSpan): number {
  const { spanMm, isCantilever } = strip.spans[strip.index]!
  if (strip.spans.length === 1 || isCantilever || forces.method !== 'elastic' || isEven(strip)) return 0
  const hogs = (share: number) => forces.hoggingNmm(end, share * spanMm) > 0
  if (!hogs(0)) return 0
  const first = Array.from({ length: STATIONS }, (_, i) => (i + 1) / STATIONS).find((share) => share < 1 && !hogs(share))
  if (first === undefined) return 1
  let [from, to] = [first - 1 / STATIONS, first]
  for (let i = 0; i < HALVINGS; i += 1) {
    const middle = (from + to) / 2
    if (hogs(middle)) from = middle
    else to = middle
  }
  return to
}
