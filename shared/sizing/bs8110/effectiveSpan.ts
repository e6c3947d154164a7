import type { SpanEnd } from '../codeBasis'

/**
 * Effective span, mm: between centres of supports; of a member discontinuous at both ends no more than clear span and effective depth.
 *
 * Source: BS 8110-1:1997, 3.4.1.2, 3.4.1.3, 3.5.2.2 (engine design section 1)
 * @param clearMm - between faces of supports, along the span
 */
export function effectiveSpanMm(clearMm: number, depthMm: number, ends: readonly [SpanEnd, SpanEnd]): number {
  const centresMm = ends.reduce((span, { supportMm }) => span + supportMm / 2, clearMm)
  return ends.some(({ isContinuous }) => isContinuous) ? centresMm : Math.min(centresMm, clearMm + depthMm)
}
