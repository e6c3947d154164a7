import type { EndOfSpan } from '../../analysis/spanForces'
import { type BarSet, areaOf, countOf, setText, thickest } from '../../bars/barSet'
import type { BendingSection, Flexure, TensionZone } from '../../codeBasis'
import { figure } from '../../figure'
import type { Finding } from '../../finding'
import { deflectionFinding, flexureFindings, steelLimitFindings } from '../../flexureFindings'
import { type RibContext, RIB_AGGREGATE_MM, endName, perRib, zoneFaceMm } from '../ribContext'
import { simpleEdgeFlexure } from '../../simpleEdgeFlexure'
import { effectiveDepthMm, midspanSection, type RibSection } from '../ribSection'
import { midspanBending } from './bottomFindings'

/** A section whose compression face, at the bottom, is as wide as the spacing (solid over a support) or the rib. */
const hoggingSection = ({ section }: RibContext, widthMm: number, bars: BarSet): BendingSection => ({
  widthMm,
  depthMm: effectiveDepthMm(section, bars),
  flange: null,
})

/** The T over a support, its flange pulled; solid across the spacing over the support and in the solid zone. */
const supportZone = (section: RibSection, bars: BarSet): TensionZone => ({
  tension: 'flange',
  widthMm: section.spacingMm,
  webMm: section.ribMm,
  flangeMm: section.spacingMm,
  heightMm: section.heightMm,
  depthMm: effectiveDepthMm(section, bars),
})

/**
 * Bending over a continuous end: over the support, where all is solid, and where the solid zone ends and the rib takes over, which is
 * the face of the support where there is no zone.
 *
 * Source: by the basis, `flexure` (engine design section 4: full spacing inside the solid zone, rib width where it ends)
 */
export function supportBending(context: RibContext, end: EndOfSpan, bars: BarSet) {
  const { basis, section, analysis } = context
  const { forces } = analysis
  const momentAt = (fromMm: number) => perRib(context, forces.hoggingNmm(end, fromMm))
  const over = basis.flexure(hoggingSection(context, section.spacingMm, bars), momentAt(0), forces.redistributedShare)
  const atRib = ribBending(context, end, bars)
  return { over, atRib, requiredMm2: Math.max(over.requiredMm2, atRib.requiredMm2) }
}

/**
 * Bending where the rib begins, at a continuous end.
 *
 * Source: as `supportBending`
 */
export function ribBending(context: RibContext, end: EndOfSpan, bars: BarSet): Flexure {
  const { basis, section, analysis } = context
  const momentNmm = perRib(context, analysis.forces.hoggingNmm(end, zoneFaceMm(context, end)))
  return basis.flexure(hoggingSection(context, section.ribMm, bars), momentNmm, analysis.forces.redistributedShare)
}

/**
 * What the checks find for the top bars of a rib over a continuous end: bending, least and most steel, room.
 *
 * Source: by the basis; bars lie in the topping where they find cover there, else between the blocks
 */
export function topFindings(context: RibContext, end: EndOfSpan, bars: BarSet): Finding[] {
  const { basis, section } = context
  const { spacingMm, heightMm } = section
  const at = (place: (name: string) => string) => ({
    place: () => place(endName(context, end)),
    bars: () => `${setText(bars)} a rib`,
  })
  const { over, atRib } = supportBending(context, end, bars)
  const provided = areaOf(bars)
  const zone = supportZone(section, bars)
  return [
    ...flexureFindings(
      'flexure.support',
      at((name) => `over ${name}`),
      over,
      provided,
    ),
    ...flexureFindings(
      'flexure.support',
      at((name) => `${name}, where the rib begins`),
      atRib,
      provided,
    ),
    ...steelLimitFindings(
      basis,
      at((name) => name),
      zone,
      spacingMm * heightMm,
      provided,
    ),
    ...(section.toppingMm >= section.coverMm + section.linkMm + thickest(bars) ? [] : [topFitFinding(context, end, bars)]),
    ...(context.analysis.position === 'cantilever' ? [cantileverDeflection(context, end, bars)] : []),
  ]
}

/** Span to depth of a cantilever, by the steel that its support asks for. */
function cantileverDeflection(context: RibContext, end: EndOfSpan, bars: BarSet): Finding {
  const { basis, section, analysis } = context
  const { over, atRib } = supportBending(context, end, bars)
  return deflectionFinding(
    basis,
    { place: () => `cantilever, ${endName(context, end)}`, bars: () => `${setText(bars)} a rib` },
    {
      position: analysis.position,
      spanMm: analysis.spanMm,
      section: midspanSection(section, effectiveDepthMm(section, bars), section.spacingMm),
      momentNmm: perRib(context, analysis.forces.hoggingNmm(end, 0)),
      requiredMm2: Math.max(over.requiredMm2, atRib.requiredMm2),
      providedMm2: areaOf(bars),
      carriesPartitions: context.carriesPartitions,
    },
  )
}

function topFitFinding(context: RibContext, end: EndOfSpan, bars: BarSet): Finding {
  const { ribMm, coverMm, linkMm } = context.section
  const gap = context.basis.leastGapMm(thickest(bars), RIB_AGGREGATE_MM)
  const diameters = bars.reduce((sum, { diameter, count }) => sum + count * diameter, 0)
  const demand = 2 * (coverMm + linkMm) + diameters + Math.max(0, countOf(bars) - 1) * gap.value
  return {
    name: 'bars.fit',
    place: () => endName(context, end),
    clause: gap.clause,
    demand,
    capacity: ribMm,
    unit: 'mm',
    working: () =>
      `${endName(context, end)}: top bars below the topping, 2·(${figure(coverMm)} + ${linkMm}) + ${setText(bars)} + gaps = ${figure(demand)}; rib ${figure(ribMm)} mm`,
  }
}

/**
 * What top bars at an end designed as simple must be: by a share of the midspan moment, or of the midspan steel.
 *
 * Source: by the basis, `simpleEdge`
 */
export function simpleEdgeFinding(context: RibContext, end: EndOfSpan, bars: BarSet): Finding {
  const { basis, analysis, section } = context
  const { clause } = basis.simpleEdge.rib
  const flexure = simpleEdgeFlexure(basis, 'rib', {
    hogging: hoggingSection(context, section.ribMm, bars),
    sagging: midspanBending(context, bars).bendingSection,
    midspanNmm: perRib(context, analysis.forces.saggingNmm),
    zone: supportZone(section, bars),
  })
  return {
    name: 'steel.least',
    place: () => endName(context, end),
    clause,
    demand: flexure.requiredMm2,
    capacity: areaOf(bars),
    unit: 'mm²',
    working: () =>
      `${endName(context, end)}, top, ${setText(bars)} a rib: ${flexure.steelWorking()}; ` +
      `${figure(areaOf(bars), 0)} mm² provided`,
  }
}
