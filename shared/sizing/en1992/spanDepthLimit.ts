import type { Answer, SpanDepthInput, SpanPosition } from '../codeBasis'
import { figure } from '../figure'
import type { Strengths } from './strengths'

/**
 * Factor K for the structural system.
 *
 * Source: EN 1992-1-1:2004, Table 7.4N (from memory; its l/d values seen in several encodings)
 */
export const STRUCTURAL_SYSTEM = { simple: 1, end: 1.3, interior: 1.5, cantilever: 0.4 } as const satisfies Record<
  SpanPosition,
  number
>

/**
 * Greatest l/d tabulated: an interior span lightly stressed, before the factor for steel.
 *
 * Source: EN 1992-1-1:2004, Table 7.4N (30 seen in several encodings)
 */
export const GREATEST_TABULATED = 30

/**
 * Span over 7 m above which slabs that carry partitions are reduced, mm.
 *
 * Source: EN 1992-1-1:2004, 7.4.2(2) (seen in R-EC-1)
 */
const LONG_SPAN_MM = 7000

/**
 * Basic span to depth ratio of lightly (7.16.a) or heavily (7.16.b) reinforced concrete without compression steel, before K.
 *
 * Source: EN 1992-1-1:2004, 7.4.2(2), Expressions (7.16.a), (7.16.b) (seen in R-EC-1 and T-EC-1)
 * @param rho - required tension reinforcement ratio at midspan, > 0
 */
export function basicSpanDepth(rho: number, fckMpa: number): number {
  const root = Math.sqrt(fckMpa)
  const share = (0.001 * root) / rho
  return share >= 1 ? 11 + 1.5 * root * share + 3.2 * root * (share - 1) ** 1.5 : 11 + 1.5 * root * share
}

/**
 * Reinforcement ratio for the span to depth rule: of the gross section of slabs, web and flange of T-sections.
 *
 * Source: EN 1992-1-1:2004, 7.4.2(2); for T-sections as CCIP-041 section 3.3 (seen in R-EC-1)
 */
export function spanDepthRatioOfSteel({ position, section, requiredMm2 }: SpanDepthInput): number {
  const { widthMm, depthMm, flange } = section
  if (!flange) return requiredMm2 / (widthMm * depthMm)
  if (position === 'cantilever') return requiredMm2 / (flange.webMm * depthMm)
  return requiredMm2 / (flange.webMm * depthMm + (widthMm - flange.webMm) * flange.thicknessMm)
}

/**
 * Greatest span over effective depth for which deflection need not be calculated. A span that no load case bends downwards requires no
 * steel there, for which the expression has no value: the least share of steel stands in for what is required.
 *
 * Source: EN 1992-1-1:2004, 7.4.2(2), Expressions (7.16), (7.17), Table 7.4N; 9.2.1.1(1) for the least share; cap on the steel factor by
 *   the national values
 */
export function spanDepthLimit(input: SpanDepthInput, { fckMpa, fykMpa, values }: Strengths): Answer {
  const { section, spanMm, requiredMm2, providedMm2 } = input
  const isBentDown = requiredMm2 > 0
  const rho = isBentDown ? spanDepthRatioOfSteel(input) : values.leastSteel.share
  const system = STRUCTURAL_SYSTEM[input.position]
  const basic = basicSpanDepth(rho, fckMpa)
  const { overWidthRatio, factor } = values.flangedFactor
  const flanged = section.flange && section.widthMm / section.flange.webMm > overWidthRatio ? factor : 1
  const long = input.carriesPartitions && spanMm > LONG_SPAN_MM ? LONG_SPAN_MM / spanMm : 1
  const steel = isBentDown ? Math.min(values.greatestSteelStressFactor, (500 * providedMm2) / (fykMpa * requiredMm2)) : 1
  const steelNote = () =>
    isBentDown
      ? `F3 = 500·${figure(providedMm2, 0)}/(${figure(fykMpa)}·${figure(requiredMm2, 0)}) ≤ ${values.greatestSteelStressFactor}`
      : 'nowhere bent downwards, so the least ρ'
  const byExpression = system * basic * flanged * long * steel
  const cap = system * values.greatestSpanDepth
  return {
    value: Math.min(byExpression, cap),
    clause: 'EN 1992-1-1 7.4.2(2)',
    working: () =>
      `limit = K·N·F1·F2·F3 = ${system}·${figure(basic)}·${flanged}·${figure(long, 3)}·${figure(steel, 3)} = ` +
      `${figure(byExpression)}${cap < byExpression ? `, nationally at most ${figure(values.greatestSpanDepth)}·K = ${figure(cap)}` : ''} ` +
      `(ρ ${figure(100 * rho, 3)} %, ρ0 ${figure(0.1 * Math.sqrt(fckMpa), 3)} %; ${steelNote()})`,
  }
}
