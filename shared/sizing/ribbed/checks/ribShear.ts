import type { EndOfSpan } from '../../analysis/spanForces'
import { type BarSet, areaOf, thickest } from '../../bars/barSet'
import type { Answer } from '../../codeBasis'
import { figure } from '../../figure'
import type { Finding } from '../../finding'
import { remember } from '../../remember'
import { type RibContext, endName, perRib, topReachMm } from '../ribContext'
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
  if (solidZoneMm === 0) return [ribShearFinding(context, end, bars)]
  return [
    ribShearFinding(context, end, bars),
    shearFinding(context, end, bars, 0, section.spacingMm, 'at the face of the support, solid'),
  ]
}

/**
 * Shear at one end on the rib itself: where the solid zone ends, or at the face of the support where there is none.
 *
 * Source: as `shearFindings`
 */
export function ribShearFinding(context: RibContext, end: EndOfSpan, bars: RibBars): Finding {
  const { section, solidZoneMm } = context
  const place = solidZoneMm === 0 ? 'at the face of the support' : 'where the solid zone ends'
  return shearFinding(context, end, bars, solidZoneMm, section.ribMm, place)
}

function shearFinding(
  context: RibContext,
  end: EndOfSpan,
  bars: RibBars,
  fromFaceMm: number,
  widthMm: number,
  place: string,
): Finding {
  const { analysis, section } = context
  const fromSupportMm = analysis.faceMm[end] + fromFaceMm
  const tension = tensionAt(context, end, bars, fromFaceMm, widthMm)
  const judged = analysis.forces.casesAt(end, fromSupportMm).map((forces) => ({
    shearN: Math.max(0, perRib(context, forces.shearN)),
    tension: tension(perRib(context, forces.hoggingNmm)),
  }))
  const { shearN, tension: worstTension } = judged.reduce((worst, each) =>
    each.shearN * worst.tension.resistance.value > worst.shearN * each.tension.resistance.value ? each : worst,
  )
  const { steelMm2, resistance } = worstTension
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

/** Tension steel of a section, and its resistance with it. */
interface Tension {
  readonly steelMm2: number
  readonly resistance: Answer
}

/**
 * What is in tension at a section by the moment there: top bars where it hogs and they are anchored, bottom bars, which run on to the
 * support, elsewhere. The resistance of each is worked out once.
 */
function tensionAt(
  context: RibContext,
  end: EndOfSpan,
  { bottom, top }: RibBars,
  fromFaceMm: number,
  widthMm: number,
): (hoggingNmm: number) => Tension {
  const { basis, section } = context
  const once = remember<Tension>()
  const tension = (bars: BarSet, steelMm2: number): Tension => ({
    steelMm2,
    resistance: basis.shearResistanceN({ widthMm, depthMm: effectiveDepthMm(section, bars), steelMm2 }),
  })
  const isAnchored = anchorageAt(context, end, top, fromFaceMm)
  return (hoggingNmm) => {
    if (hoggingNmm <= 0) return once('bottom', () => tension(bottom, areaOf(bottom)))
    if (isAnchored(hoggingNmm)) return once('top', () => tension(top, areaOf(top)))
    return once('none', () => tension(top, 0))
  }
}

/** Whether top bars, as far as a moment stresses them, run an anchorage and d past a section. */
function anchorageAt(context: RibContext, end: EndOfSpan, top: BarSet, fromFaceMm: number): (hoggingNmm: number) => boolean {
  const { basis, section, analysis, clearMm } = context
  if (top.length === 0) return () => false
  const depthMm = effectiveDepthMm(section, top)
  const roomMm = topReachMm(context, end, clearMm) - fromFaceMm - depthMm
  const bond = { isTop: true, sectionMm: section.heightMm, isCorner: false }
  const fits = (stressShare: number) => basis.anchorageMm(thickest(top), bond, stressShare).value <= roomMm
  if (fits(1)) return () => true
  if (!fits(0)) return () => false
  const rib = { widthMm: section.ribMm, depthMm, flange: null }
  return (hoggingNmm) =>
    fits(Math.min(1, basis.flexure(rib, hoggingNmm, analysis.forces.redistributedShare).requiredMm2 / areaOf(top)))
}
