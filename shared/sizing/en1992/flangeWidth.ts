import type { Answer, SpanPosition } from '../codeBasis'
import { figure } from '../figure'

/**
 * Distance between points of zero moment as a share of the span.
 *
 * Source: EN 1992-1-1:2004, 5.3.2.1(2), Figure 5.2 (0.85 seen in T-EC-1, 0.7 from memory); a cantilever has no
 *   midspan, its length stands for one
 */
const ZERO_MOMENT_SHARE = { simple: 1, end: 0.85, interior: 0.7, cantilever: 1 } as const satisfies Record<SpanPosition, number>

/**
 * Effective flange width of a T-section at midspan, mm.
 *
 * Source: EN 1992-1-1:2004, 5.3.2.1(3), Expressions (5.7), (5.7a), (5.7b) (seen in T-EC-1)
 * @param sidesMm - b1 and b2: half the clear distance to the next web on either side
 */
export function effectiveFlangeWidth(
  zeroMomentMm: number,
  webMm: number,
  sidesMm: readonly [number, number],
): { readonly widthMm: number; readonly partsMm: readonly [number, number] } {
  const part = (sideMm: number) => Math.min(0.2 * sideMm + 0.1 * zeroMomentMm, 0.2 * zeroMomentMm, sideMm)
  const partsMm = [part(sidesMm[0]), part(sidesMm[1])] as const
  return { widthMm: webMm + partsMm[0] + partsMm[1], partsMm }
}

/**
 * Effective flange width of a rib between equal ribs, mm.
 *
 * Source: EN 1992-1-1:2004, 5.3.2.1 (see effectiveFlangeWidth)
 * @param clearMm - clear distance between ribs
 */
export function ribFlangeWidth(position: SpanPosition, spanMm: number, webMm: number, clearMm: number): Answer {
  const zeroMomentMm = ZERO_MOMENT_SHARE[position] * spanMm
  const { widthMm } = effectiveFlangeWidth(zeroMomentMm, webMm, [clearMm / 2, clearMm / 2])
  return {
    value: widthMm,
    clause: 'EN 1992-1-1 5.3.2.1',
    working: () => `beff = bw + Σ min(0.2·bi + 0.1·l0; 0.2·l0; bi) = ${figure(widthMm)} (l0 ${figure(zeroMomentMm, 0)})`,
  }
}
