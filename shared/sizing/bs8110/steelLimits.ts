import type { BarDiameter } from '../../contracts/appraisal'
import type { Answer, TensionZone } from '../codeBasis'
import { figure } from '../figure'
import type { Strengths } from './strengths'

/** Shares of the section for mild steel, and for high yield steel. */
interface Shares {
  readonly mild: number
  readonly highYield: number
}

/**
 * Least tension steel as a share: of b·h for rectangles, of bw·h for flanged sections with their web pulled, narrow or wide, and with the
 * flange of a T pulled.
 *
 * Source: BS 8110-1:1997, Table 3.25 (from memory; 0.13 % of bw·h seen in R-BS-3), for fy 250 and 460
 */
export const LEAST_SHARES = {
  rectangle: { mild: 0.0024, highYield: 0.0013 },
  narrowWeb: { mild: 0.0032, highYield: 0.0018 },
  wideWeb: { mild: 0.0024, highYield: 0.0013 },
  flange: { mild: 0.0048, highYield: 0.0026 },
} as const satisfies Record<string, Shares>

/** Web over flange width below which a web counts as narrow. Source: BS 8110-1:1997, Table 3.25 */
const NARROW_WEB = 0.4

/** Yield strength from which the shares of high yield steel hold, MPa; those of mild steel hold below, on the safe side. */
export const HIGH_YIELD_MPA = 460

const CLAUSE = 'BS 8110-1 3.12.5.3, Table 3.25'

function shareOf(shares: Shares, { fyMpa }: Strengths): number {
  return fyMpa >= HIGH_YIELD_MPA ? shares.highYield : shares.mild
}

function leastOf(shares: Shares, widthMm: number, heightMm: number, symbol: string, strengths: Strengths): Answer {
  const share = shareOf(shares, strengths)
  const value = share * widthMm * heightMm
  return {
    value,
    clause: CLAUSE,
    working: () =>
      `As ≥ ${figure(100 * share, 2)} %·${symbol}·h = ${figure(100 * share, 2)} %·${figure(widthMm)}·${figure(heightMm)} = ${figure(value, 0)} mm²`,
  }
}

/**
 * Least tension steel of a section, mm². Over a support a rib is a T with its flange pulled, and the solid zone a rectangle as wide as the
 * spacing: the greater counts.
 *
 * Source: BS 8110-1:1997, 3.12.5.3 and Table 3.25 (see LEAST_SHARES)
 */
export function leastSteelMm2({ tension, webMm, flangeMm, heightMm }: TensionZone, strengths: Strengths): Answer {
  if (tension === 'rectangle') return leastOf(LEAST_SHARES.rectangle, webMm, heightMm, 'b', strengths)
  if (tension === 'web') {
    const shares = webMm / flangeMm < NARROW_WEB ? LEAST_SHARES.narrowWeb : LEAST_SHARES.wideWeb
    return leastOf(shares, webMm, heightMm, 'bw', strengths)
  }
  const tee = leastOf(LEAST_SHARES.flange, webMm, heightMm, 'bw', strengths)
  const solid = leastOf(LEAST_SHARES.rectangle, flangeMm, heightMm, 'b', strengths)
  const [least, other] = solid.value > tee.value ? [solid, tee] : [tee, solid]
  return { ...least, working: () => `${least.working()}, more than ${other.working()}` }
}

/**
 * Most steel of a section outside laps, mm².
 *
 * Source: BS 8110-1:1997, 3.12.6.1 (4 %; from memory)
 */
export function mostSteelMm2(concreteMm2: number): Answer {
  const value = 0.04 * concreteMm2
  return {
    value,
    clause: 'BS 8110-1 3.12.6.1',
    working: () => `As ≤ 4 %·Ac = 0.04·${figure(concreteMm2, 0)} = ${figure(value, 0)} mm²`,
  }
}

/**
 * Least clear gap between bars, mm: 5 over the aggregate, the bar where it is thicker than that.
 *
 * Source: BS 8110-1:1997, 3.12.11.1 (from memory)
 */
export function leastGapMm(diameterMm: BarDiameter, aggregateMm: number): Answer {
  const value = Math.max(aggregateMm + 5, diameterMm)
  return {
    value,
    clause: 'BS 8110-1 3.12.11.1',
    working: () => `gap = max(hagg + 5; φ) = max(${aggregateMm} + 5; ${diameterMm}) = ${value} mm`,
  }
}

/**
 * Mesh in the topping of a ribbed floor, mm² per metre each way: 0.12 % of the topping.
 *
 * Source: BS 8110-1:1997, 3.6.6.2 (from memory)
 */
export function toppingMeshMm2(toppingMm: number): Answer {
  const value = 0.0012 * 1000 * toppingMm
  return {
    value,
    clause: 'BS 8110-1 3.6.6.2',
    working: () => `0.12 %·1000·${figure(toppingMm)} = ${figure(value, 0)} mm²/m`,
  }
}
