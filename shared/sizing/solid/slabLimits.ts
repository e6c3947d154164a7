import type { BarDiameter, BarLayer } from '../../contracts/appraisal'
import type { Answer, BarPlace, TensionZone } from '../codeBasis'
import { layerAreaMm2 } from './bars/slabLayer'
import { isHogging, METRE_MM, type SlabContext, type TopPlace } from './slabContext'

/**
 * A metre of slab as a tension zone for least steel.
 *
 * Source: statics, a rectangle
 */
export function slabZone(heightMm: number, depthMm: number): TensionZone {
  return { tension: 'rectangle', widthMm: METRE_MM, webMm: METRE_MM, flangeMm: METRE_MM, heightMm, depthMm }
}

/**
 * Greatest spacing of bars of one diameter, mm.
 *
 * Source: by the basis, `greatestSpacingMm`
 */
export function greatestSpacingMm(
  { basis, heightMm }: SlabContext,
  place: BarPlace,
  diameterMm: BarDiameter,
  depthMm: number,
  redistributedShare = 0,
): number {
  return basis.greatestSpacingMm({ place, heightMm, depthMm, diameterMm, redistributedShare }).value
}

/**
 * Share of the hogging moment at a place that redistribution took off; 0 at edges taken as simple.
 *
 * Source: project rule, as the analysis has it
 */
export function redistributedAt(place: TopPlace): number {
  return isHogging(place) ? (place.span?.redistributedShare ?? 0) : 0
}

/**
 * Steel across the principal bars of a one-way panel, mm² per metre.
 *
 * Source: by the basis, `secondarySteelMm2`
 */
export function secondarySteel({ basis, heightMm }: SlabContext, main: BarLayer, depthMm: number): Answer {
  return basis.secondarySteelMm2(layerAreaMm2(main), slabZone(heightMm, depthMm))
}
