import type { Answer, SpanPosition } from '../codeBasis'
import { figure } from '../figure'

/**
 * Distance between points of zero moment as a share of the span.
 *
 * Source: BS 8110-1:1997, 3.4.1.5 (0.7 for continuous beams; from memory); a cantilever has no midspan, its length stands for one
 */
const ZERO_MOMENT_SHARE = { simple: 1, end: 0.7, interior: 0.7, cantilever: 1 } as const satisfies Record<SpanPosition, number>

/**
 * Effective flange width of a rib between equal ribs, mm: web and a fifth of the distance between zero moments, at most the spacing.
 *
 * Source: BS 8110-1:1997, 3.4.1.5 a) (from memory)
 * @param clearMm - clear distance between ribs
 */
export function ribFlangeWidth(position: SpanPosition, spanMm: number, webMm: number, clearMm: number): Answer {
  const zeroMomentMm = ZERO_MOMENT_SHARE[position] * spanMm
  const value = Math.min(webMm + zeroMomentMm / 5, webMm + clearMm)
  return {
    value,
    clause: 'BS 8110-1 3.4.1.5',
    working: () =>
      `b = min(bw + lz/5; spacing) = min(${figure(webMm)} + ${figure(zeroMomentMm, 0)}/5; ${figure(webMm + clearMm)}) = ${figure(value)} mm`,
  }
}
