import type { BarDiameter, BarLayer } from '../../../contracts/appraisal'
import { barAreaMm2 } from '../../tables/bars'

/**
 * Step of bar spacings, and the closest, mm.
 *
 * Source: project rule, engine design section 4 (25 mm steps); closest spacing common practice, no source
 */
export const SPACING_STEP_MM = 25
const CLOSEST_MM = 75

/** Bars of one direction: in the middle strip, or across the whole width where `edge` is null; `edge` in the edge strips. */
export interface StripLayers {
  readonly middle: BarLayer
  readonly edge: BarLayer | null
}

/**
 * Area of a layer of bars, mm² per metre.
 *
 * Source: EN 10080:2005, nominal areas
 */
export function layerAreaMm2({ diameter, spacing }: BarLayer): number {
  return (barAreaMm2(diameter) * 1000) / spacing
}

/**
 * Layer of one diameter with the widest spacing that gives an area; the closest where none does.
 *
 * Source: project rule, engine design section 4
 * @param neededMm2 - per metre
 * @param greatestMm - greatest spacing the basis allows
 */
export function layerFor(diameter: BarDiameter, neededMm2: number, greatestMm: number): BarLayer {
  const widest = neededMm2 > 0 ? Math.min(greatestMm, (barAreaMm2(diameter) * 1000) / neededMm2) : greatestMm
  return { diameter, spacing: Math.max(CLOSEST_MM, Math.floor(widest / SPACING_STEP_MM + 1e-9) * SPACING_STEP_MM) }
}

/**
 * The same layer one step closer; null where it is the closest.
 *
 * Source: project rule, engine design section 4 (25 mm spacing steps)
 */
export function closerLayer({ diameter, spacing }: BarLayer): BarLayer | null {
  return spacing > CLOSEST_MM ? { diameter, spacing: spacing - SPACING_STEP_MM } : null
}

/**
 * A layer as a reader writes it, `φ10 at 150`.
 *
 * Source: project rule
 */
export function layerText({ diameter, spacing }: BarLayer): string {
  return `φ${diameter} at ${spacing}`
}
