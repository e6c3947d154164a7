import type { EndOfSpan } from '../analysis/spanForces'
import { type BarSet, areaOf, thickest } from '../barSet'
import { figure } from '../figure'
import type { Finding } from '../finding'
import { type RibContext, TOP_REACH, endName, perRib } from './ribContext'
import { effectiveDepthMm } from './ribSection'

/** Bottom bars of a rib and its top bars at one end. */
export interface RibBars {
  readonly bottom: BarSet
  readonly top: BarSet
}

/**
 * Shear at one end of a rib: where the solid zone ends, on the rib; and at the face of the support, on the whole spacing, where there is
 * a zone. Tension steel at a continuous end are top bars that run an anchorage and d past the section, else bottom bars.
 *
 * Source: by the basis, `shearResistanceN` (engine design section 4: at the zone's inner face, not a further d away; no links)
 */
export function shearFindings(context: RibContext, end: EndOfSpan, bars: RibBars): Finding[] {
  const { section, solidZoneMm } = context
  if (solidZoneMm === 0) return [shearFinding(context, end, bars, 0, section.ribMm, 'at the face of the support')]
  return [
    shearFinding(context, end, bars, solidZoneMm, section.ribMm, 'where the solid zone ends'),
    shearFinding(context, end, bars, 0, section.spacingMm, 'at the face of the support, solid'),
  ]
}

function shearFinding(
  context: RibContext,
  end: EndOfSpan,
  { bottom, top }: RibBars,
  fromFaceMm: number,
  widthMm: number,
  place: string,
): Finding {
  const { basis, section, analysis, ends } = context
  const acting = ends[end].isContinuous ? top : bottom
  const depthMm = effectiveDepthMm(section, acting)
  const steelMm2 = !ends[end].isContinuous || isAnchored(context, top, fromFaceMm) ? areaOf(acting) : 0
  const fromSupportMm = analysis.faceMm[end] + fromFaceMm
  const shearN = perRib(context, analysis.forces.shearN(end, fromSupportMm))
  const resistance = basis.shearResistanceN({ widthMm, depthMm, steelMm2 })
  return {
    name: 'shear',
    clause: resistance.clause,
    demand: shearN / 1000,
    capacity: resistance.value / 1000,
    unit: 'kN',
    working: () =>
      `${endName(context, end)}, ${place}, ${figure(fromSupportMm, 0)} mm from the line of support: V = ${figure(shearN / 1000)} kN a rib; ` +
      resistance.working(),
  }
}

function isAnchored({ basis, section, clearMm }: RibContext, top: BarSet, fromFaceMm: number): boolean {
  const anchorage = basis.anchorageMm(thickest(top), section.heightMm > 250).value
  return fromFaceMm + anchorage + effectiveDepthMm(section, top) <= TOP_REACH * clearMm
}
