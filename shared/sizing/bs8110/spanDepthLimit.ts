import type { Answer, SpanDepthInput, SpanPosition } from '../codeBasis'
import { figure } from '../figure'
import { interpolate } from '../tables/interpolate'
import type { Strengths } from './strengths'

/**
 * Basic span to effective depth of rectangular sections, and of flanged ones whose web takes at most 0.3 of the flange.
 *
 * Source: BS 8110-1:1997, Table 3.9 (from memory; R-BS-2 and R-BS-3 reproduce the interpolation)
 */
export const BASIC_SPAN_DEPTH = {
  simple: { rectangular: 20, flanged: 16 },
  end: { rectangular: 26, flanged: 20.8 },
  interior: { rectangular: 26, flanged: 20.8 },
  cantilever: { rectangular: 7, flanged: 5.6 },
} as const satisfies Record<SpanPosition, { readonly rectangular: number; readonly flanged: number }>

/** Web over flange width between which Table 3.9 is interpolated. Source: BS 8110-1:1997, 3.4.6.3 */
const WEB_SHARES = [0.3, 1] as const

/** Span above which the ratio falls, mm. Source: BS 8110-1:1997, 3.4.6.4 */
const LONG_SPAN_MM = 10_000

/** Greatest modification factor. Source: BS 8110-1:1997, Table 3.10, equation 7 (formula seen in S-BS-2) */
const GREATEST_FACTOR = 2

/** Greatest basic ratio of Table 3.9 with the greatest factor of Table 3.10. Source: BS 8110-1:1997, Tables 3.9 and 3.10 */
export const GREATEST_TABULATED = BASIC_SPAN_DEPTH.interior.rectangular * GREATEST_FACTOR

/**
 * Modification factor for tension steel.
 *
 * Source: BS 8110-1:1997, 3.4.6.5, Table 3.10, equation 7 (formula seen in S-BS-2, confirmed by evaluating the printed table)
 * @param serviceMpa - stress of the steel under service loads, fs
 * @param momentMpa - M/(b·d²)
 */
export function tensionSteelFactor(serviceMpa: number, momentMpa: number): number {
  return Math.min(GREATEST_FACTOR, 0.55 + (477 - serviceMpa) / (120 * (0.9 + momentMpa)))
}

/**
 * Basic span to effective depth of a section, between rectangle and narrow web in a straight line.
 *
 * Source: BS 8110-1:1997, 3.4.6.3, Table 3.9 (see BASIC_SPAN_DEPTH)
 */
export function basicSpanDepth({ position, section: { widthMm, flange } }: Pick<SpanDepthInput, 'position' | 'section'>): number {
  const { rectangular, flanged } = BASIC_SPAN_DEPTH[position]
  return flange ? interpolate(WEB_SHARES, [flanged, rectangular], flange.webMm / widthMm) : rectangular
}

/**
 * Greatest span over effective depth for which deflection need not be calculated.
 *
 * Source: BS 8110-1:1997, 3.4.6.3 to 3.4.6.5, 3.5.7, 3.6.5, Tables 3.9 and 3.10, equation 8 with fs = 2·fy·As,req/(3·As,prov), βb taken as 1
 */
export function spanDepthLimit(input: SpanDepthInput, { fyMpa }: Strengths): Answer {
  const { position, section, spanMm, momentNmm, requiredMm2, providedMm2 } = input
  const basic = basicSpanDepth(input)
  const pressedMm = position === 'cantilever' && section.flange ? section.flange.webMm : section.widthMm
  const long = spanMm > LONG_SPAN_MM ? LONG_SPAN_MM / spanMm : 1
  const momentMpa = momentNmm / (pressedMm * section.depthMm ** 2)
  const serviceMpa = (2 * fyMpa * requiredMm2) / (3 * providedMm2)
  const factor = tensionSteelFactor(serviceMpa, momentMpa)
  const web = section.flange ? `, bw/b ${figure(section.flange.webMm / section.widthMm, 2)}` : ''
  return {
    value: Math.max(0, basic * long * factor),
    clause: 'BS 8110-1 3.4.6, Tables 3.9, 3.10',
    working: () =>
      `limit = basic·factor${long < 1 ? '·10/l' : ''} = ${figure(basic, 2)}·${figure(factor, 2)}${long < 1 ? `·${figure(long, 3)}` : ''} = ` +
      `${figure(basic * long * factor)} (factor 0.55 + (477 − fs)/(120·(0.9 + M/bd²)) ≤ 2; M/bd² ${figure(momentMpa, 2)}; ` +
      `fs = 2·${figure(fyMpa)}·${figure(requiredMm2, 0)}/(3·${figure(providedMm2, 0)}) = ${figure(serviceMpa, 0)} MPa${web})`,
  }
}
