import type { EndOfSpan } from '../../analysis/spanForces'
import { type BarSet, areaOf, countOf, setText, thickest } from '../../bars/barSet'
import type { BendingSection } from '../../codeBasis'
import { figure } from '../../figure'
import type { Finding } from '../../finding'
import { flexureFindings, steelLimitFindings } from '../../flexureFindings'
import { type RibContext, RIB_AGGREGATE_MM, endName, perRib, zoneFaceMm } from '../ribContext'
import { concreteAreaMm2, effectiveDepthMm } from '../ribSection'

/** Compression at the bottom of a support: the whole spacing inside a solid zone, the rib alone without one. */
function supportSection({ section, solidZoneMm }: RibContext, bars: BarSet): BendingSection {
  const widthMm = solidZoneMm > 0 ? section.spacingMm : section.ribMm
  return { widthMm, depthMm: effectiveDepthMm(section, bars), flange: null }
}

/**
 * Bending over a continuous end: over the support, and where the solid zone ends and the rib takes over.
 *
 * Source: by the basis, `flexure` (engine design section 4: full spacing inside the solid zone, rib width where it ends)
 */
export function supportBending(context: RibContext, end: EndOfSpan, bars: BarSet) {
  const { basis, section, analysis, solidZoneMm } = context
  const { forces } = analysis
  const momentNmm = perRib(context, forces.hoggingNmm(end, 0))
  const over = basis.flexure(supportSection(context, bars), momentNmm, forces.isRedistributed)
  const atRibNmm = perRib(context, forces.hoggingNmm(end, zoneFaceMm(context, end)))
  const ribSection = { widthMm: section.ribMm, depthMm: effectiveDepthMm(section, bars), flange: null }
  const atRib = solidZoneMm > 0 ? basis.flexure(ribSection, atRibNmm, forces.isRedistributed) : null
  return { momentNmm, over, atRib, requiredMm2: Math.max(over.requiredMm2, atRib?.requiredMm2 ?? 0) }
}

/**
 * What the checks find for the top bars of a rib over a continuous end: bending, least and most steel, room.
 *
 * Source: by the basis; bars lie in the topping where they find cover there, else between the blocks
 */
export function topFindings(context: RibContext, end: EndOfSpan, bars: BarSet): Finding[] {
  const { basis, section } = context
  const where = () => `${endName(context, end)}, ${setText(bars)} a rib`
  const { over, atRib } = supportBending(context, end, bars)
  const provided = areaOf(bars)
  return [
    ...flexureFindings('flexure.support', where, over, provided),
    ...(atRib ? flexureFindings('flexure.support', () => `${where()}, where the solid zone ends`, atRib, provided) : []),
    ...steelLimitFindings(basis, where, tensionZone(context, bars), supportAreaMm2(context), provided),
    ...(section.toppingMm >= section.coverMm + section.linkMm + thickest(bars) ? [] : [topFitFinding(context, end, bars)]),
  ]
}

/** Mean width of the upper half in tension: the spacing in the topping and in solid zones, the rib below. */
function tensionZone({ section, solidZoneMm }: RibContext, bars: BarSet) {
  const { spacingMm, ribMm, heightMm, toppingMm } = section
  const half = heightMm / 2
  const flange = Math.min(toppingMm, half)
  const meanMm = (spacingMm * flange + ribMm * (half - flange)) / half
  const widthMm = solidZoneMm > 0 ? spacingMm : meanMm
  return { widthMm, webMm: ribMm, heightMm, depthMm: effectiveDepthMm(section, bars) }
}

const supportAreaMm2 = ({ section, solidZoneMm }: RibContext) =>
  solidZoneMm > 0 ? section.spacingMm * section.heightMm : concreteAreaMm2(section)

function topFitFinding(context: RibContext, end: EndOfSpan, bars: BarSet): Finding {
  const { ribMm, coverMm, linkMm } = context.section
  const gap = context.basis.leastGapMm(thickest(bars), RIB_AGGREGATE_MM)
  const diameters = bars.reduce((sum, { diameter, count }) => sum + count * diameter, 0)
  const demand = 2 * (coverMm + linkMm) + diameters + Math.max(0, countOf(bars) - 1) * gap.value
  return {
    name: 'bars.fit',
    clause: gap.clause,
    demand,
    capacity: ribMm,
    unit: 'mm',
    working: () =>
      `${endName(context, end)}: top bars below the topping, 2·(${figure(coverMm)} + ${linkMm}) + ${setText(bars)} + gaps = ${figure(demand)}; rib ${figure(ribMm)} mm`,
  }
}

/**
 * What top bars at an end designed as simple must carry: a share of the midspan moment.
 *
 * Source: by the basis, `simpleEdge`
 */
export function simpleEdgeFinding(context: RibContext, end: EndOfSpan, bars: BarSet): Finding {
  const { basis, analysis } = context
  const { share, clause } = basis.simpleEdge
  const momentNmm = share * perRib(context, analysis.forces.saggingNmm)
  const flexure = basis.flexure(supportSection(context, bars), momentNmm, false)
  return {
    name: 'steel.least',
    clause,
    demand: flexure.requiredMm2,
    capacity: areaOf(bars),
    unit: 'mm²',
    working: () =>
      `${endName(context, end)}, top, ${setText(bars)} a rib: ${share} of the midspan moment; ${flexure.steelWorking()}; ` +
      `${figure(areaOf(bars), 0)} mm² provided`,
  }
}
