import type { BarLayer } from '../../../contracts/appraisal'
import type { EndOfSpan } from '../../analysis/spanForces'
import { pastFaceMm, totalLengthMm } from '../../bars/barRuns'
import { BAR_MASS_KG_PER_M } from '../../tables/bars'
import { isHogging, type SlabContext, type TopPlace } from '../slabContext'
import type { StripLayers } from './slabLayer'
import type { SlabAxis } from '../slabPlan'

/** A section deeper than this has poor bond at its top, mm. Source: EN 1992-1-1:2004, 8.4.2, Figure 8.2 */
const GOOD_BOND_MM = 250

/**
 * Share of a two-way panel's width that one edge strip takes.
 *
 * Source: BS 8110-1:1997, 3.5.3.5 and Figure 3.9 (middle strips three quarters; from memory, engine design section 4)
 */
export const EDGE_STRIP = 1 / 8

/**
 * Reach of top bars past the face of a continuous support, as a share of the clear span.
 *
 * Source: project rule, common practice of detailing, no source (engine design section 4, lengths)
 */
export const SLAB_TOP_REACH = 0.3

/**
 * Bars that a width takes at a spacing, half a spacing in from either side.
 *
 * Source: project rule, engine design section 4; each bar serves one spacing
 */
export function lineCount(widthMm: number, spacingMm: number): number {
  return Math.max(1, Math.ceil(widthMm / spacingMm - 1e-6))
}

/**
 * Parts of a bottom bar along an axis, mm: clear length and past each face; short of a free edge by the cover.
 *
 * Source: see pastFaceMm
 */
export function bottomParts({ clearMm, ends }: SlabAxis, { diameter }: BarLayer, coverMm: number): number[] {
  const past = (end: EndOfSpan) => pastFaceMm(diameter, ends[end].supportMm, coverMm)
  return [clearMm, past('start'), past('end')]
}

/**
 * Parts of a top bar at one end: half the support and 0.3 of the clear span; at an edge taken as simple an anchorage and the basis' share
 * of the span that carries.
 *
 * Source: by the basis, `anchorageMm` and `simpleEdge`; engine design section 4 (each panel counts its half)
 */
export function topParts(context: SlabContext, place: TopPlace, { diameter }: BarLayer, clearMm: number): number[] {
  const { basis, analysis, heightMm } = context
  if (isHogging(place)) return [place.side.supportMm / 2, SLAB_TOP_REACH * clearMm]
  const { spanMm } = place.span ?? analysis.short
  return [basis.anchorageMm(diameter, isPoorBond(heightMm), 1).value, basis.simpleEdge.reach * spanMm]
}

/**
 * Whether top bars of a slab have poor bond.
 *
 * Source: EN 1992-1-1:2004, 8.4.2, Figure 8.2 (from memory)
 */
export function isPoorBond(heightMm: number): boolean {
  return heightMm > GOOD_BOND_MM
}

/**
 * Mass of a layer's bars on the panel's rectangle, kg.
 *
 * Source: BS 4449, nominal masses
 * @param widthMm - clear width that the layer covers
 */
export function layerMassKg(
  context: SlabContext,
  layer: BarLayer,
  parts: readonly number[],
  widthMm: number,
  isTop: boolean,
): number {
  const lapMm = () => context.basis.lapMm(layer.diameter, isTop && isPoorBond(context.heightMm)).value
  const lengthMm = totalLengthMm({ pieces: [parts], each: lineCount(widthMm, layer.spacing), lapMm })
  return (lengthMm * BAR_MASS_KG_PER_M[layer.diameter]) / 1000
}

/**
 * Mass of middle and edge strips together, kg.
 *
 * Source: as `layerMassKg`
 */
export function stripsMassKg(
  context: SlabContext,
  { middle, edge }: StripLayers,
  parts: readonly number[],
  widthMm: number,
  isTop: boolean,
): number {
  if (!edge) return layerMassKg(context, middle, parts, widthMm, isTop)
  return (
    layerMassKg(context, middle, parts, (1 - 2 * EDGE_STRIP) * widthMm, isTop) +
    2 * layerMassKg(context, edge, parts, EDGE_STRIP * widthMm, isTop)
  )
}
