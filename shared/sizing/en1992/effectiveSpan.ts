import type { SpanEnd } from '../codeBasis'

/**
 * Effective span, mm: clear span and at each end the lesser of half the depth and half the support.
 *
 * Source: EN 1992-1-1:2004, 5.3.2.2(1), Expression (5.8), Figure 5.4 (engine design section 1)
 * @param clearMm - between faces of supports, along the span
 */
export function effectiveSpanMm(clearMm: number, heightMm: number, ends: readonly [SpanEnd, SpanEnd]): number {
  return ends.reduce((span, { supportMm }) => span + Math.min(heightMm / 2, supportMm / 2), clearMm)
}
