import type { RedistributionRules } from '../codeBasis'
import type { SpanCase } from './continuousBeam'
import type { StripSpan } from './strip'

/**
 * Whether support moments of a strip may be redistributed: by the ratio of its neighbouring spans.
 *
 * Source: by the basis, `redistribution` (EN 1992-1-1:2004, 5.5(4): ratios of 0.5 to 2)
 */
export function mayRedistribute(spans: readonly StripSpan[], { greatestSpanRatio }: RedistributionRules): boolean {
  const supported = spans.filter(({ isCantilever }) => !isCantilever).map(({ spanMm }) => spanMm)
  if (greatestSpanRatio === null) return true
  return supported.slice(1).every((spanMm, i) => {
    const ratio = spanMm / supported[i]!
    return Math.max(ratio, 1 / ratio) <= greatestSpanRatio * (1 + 1e-9)
  })
}

/**
 * Load cases of a span with its support moments held to a share of the greatest elastic ones; what is under that stays. Loads and spans
 * are unchanged, so the moment taken off a support is found again in the span: equilibrium holds in every case.
 *
 * Source: EN 1992-1-1:2004, 5.5(1) and BS 8110-1:1997, 3.2.2.1 (equilibrium kept); statics
 * @param share - taken off, 0 to 0.3
 * @param isFixed - ends whose moment statics alone decide, beside an overhang: those keep it
 */
export function redistributed(cases: readonly SpanCase[], share: number, isFixed: readonly [boolean, boolean]): SpanCase[] {
  const limit = (moments: number[], fixed: boolean) => (fixed ? Infinity : (1 - share) * Math.max(0, ...moments))
  const start = limit(
    cases.map(({ startMoment }) => startMoment),
    isFixed[0],
  )
  const end = limit(
    cases.map(({ endMoment }) => endMoment),
    isFixed[1],
  )
  return cases.map(({ load, startMoment, endMoment }) => ({
    load,
    startMoment: Math.min(startMoment, start),
    endMoment: Math.min(endMoment, end),
  }))
}
