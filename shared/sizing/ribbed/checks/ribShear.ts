import type { EndOfSpan } from '../../analysis/spanForces'
import { type BarSet, areaOf, thickest } from '../../bars/barSet'
import { figure } from '../../figure'
import type { Finding } from '../../finding'
import { type RibContext, TOP_REACH, endName, perRib } from '../ribContext'
import { effectiveDepthMm } from '../ribSection'

/** Bottom bars of a rib and its top bars at one end. */
export interface RibBars {
  readonly bottom: BarSet
  readonly top: BarSet
}

/**
 * Shear at one end of a rib: where the solid zone ends, on the rib; and at the face of the support, on the whole spacing, where there is
 * a zone. Moment and shear are of one load case; tension steel where it hogs are top bars that run an anchorage and d past the section,
 * elsewhere bottom bars.
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
  bars: RibBars,
  fromFaceMm: number,
  widthMm: number,
  place: string,
): Finding {
  const { basis, analysis, section } = context
  const fromSupportMm = analysis.faceMm[end] + fromFaceMm
  const judged = analysis.forces.casesAt(end, fromSupportMm).map((forces) => {
    const { depthMm, steelMm2 } = tensionSteel(context, bars, perRib(context, forces.hoggingNmm), fromFaceMm)
    const resistance = basis.shearResistanceN({ widthMm, depthMm, steelMm2 })
    return { shearN: Math.max(0, perRib(context, forces.shearN)), steelMm2, resistance }
  })
  const { shearN, steelMm2, resistance } = judged.reduce((worst, each) =>
    each.shearN * worst.resistance.value > worst.shearN * each.resistance.value ? each : worst,
  )
  return {
    name: 'shear',
    place: () => `${endName(context, end)}, ${widthMm === section.ribMm ? 'rib' : 'solid'}`,
    clause: resistance.clause,
    demand: shearN / 1000,
    capacity: resistance.value / 1000,
    unit: 'kN',
    working: () =>
      `${endName(context, end)}, ${place}, ${figure(fromSupportMm, 0)} mm from the line of support: V = ${figure(shearN / 1000)} kN a rib; ` +
      `Asl ${figure(steelMm2, 0)} mm²; ${resistance.working()}`,
  }
}

/** Bars in tension at a section and anchored there: top bars where it hogs, bottom bars, which run on to the support, elsewhere. */
function tensionSteel(context: RibContext, { bottom, top }: RibBars, hoggingNmm: number, fromFaceMm: number) {
  const { section } = context
  if (hoggingNmm <= 0) return { depthMm: effectiveDepthMm(section, bottom), steelMm2: areaOf(bottom) }
  const steelMm2 = isAnchored(context, top, hoggingNmm, fromFaceMm) ? areaOf(top) : 0
  return { depthMm: effectiveDepthMm(section, top), steelMm2 }
}

/** Whether top bars, as far as they are stressed, run an anchorage and d past a section. */
function isAnchored(
  { basis, section, analysis, clearMm }: RibContext,
  top: BarSet,
  hoggingNmm: number,
  fromFaceMm: number,
): boolean {
  if (top.length === 0) return false
  const depthMm = effectiveDepthMm(section, top)
  const rib = { widthMm: section.ribMm, depthMm, flange: null }
  const { requiredMm2 } = basis.flexure(rib, hoggingNmm, analysis.forces.redistributedShare)
  const stressShare = Math.min(1, requiredMm2 / areaOf(top))
  const bond = { isTop: true, sectionMm: section.heightMm, isCorner: false }
  const anchorage = basis.anchorageMm(thickest(top), bond, stressShare).value
  return fromFaceMm + anchorage + depthMm <= TOP_REACH * clearMm
}
