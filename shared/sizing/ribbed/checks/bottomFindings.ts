import { type BarSet, areaOf, countOf, setText, thickest } from '../../bars/barSet'
import { figure } from '../../figure'
import type { Finding } from '../../finding'
import { deflectionFinding, flexureFindings, steelLimitFindings } from '../../flexureFindings'
import { type RibContext, RIB_AGGREGATE_MM, perRib } from '../ribContext'
import { axisDistanceMm, concreteAreaMm2, effectiveDepthMm, midspanSection } from '../ribSection'

const midspan = () => 'midspan'

/**
 * What the checks find for the bottom bars of a rib: bending at midspan, deflection, least and most steel, room, axis distance in fire. A
 * cantilever has no midspan moment: its bottom is pressed.
 *
 * Source: by the basis; T-section at midspan (engine design section 4)
 */
export function bottomFindings(context: RibContext, bars: BarSet): Finding[] {
  const { basis, section, analysis } = context
  const where = { place: midspan, bars: () => `${setText(bars)} a rib` }
  const bending = midspanBending(context, bars)
  const { flexure, momentNmm, bendingSection } = bending
  const providedMm2 = areaOf(bars)
  const { ribMm, heightMm } = section
  const { depthMm, widthMm, flange } = bendingSection
  const tension = flange ? 'web' : 'rectangle'
  const zone = { tension, widthMm: ribMm, webMm: ribMm, flangeMm: widthMm, heightMm, depthMm } as const
  const limits = steelLimitFindings(basis, where, zone, concreteAreaMm2(section), providedMm2)
  if (analysis.position === 'cantilever')
    return [...limits.filter(({ name }) => name === 'steel.most'), fitFinding(context, bars), ...fireFindings(context, bars)]
  return [
    ...flexureFindings('flexure.midspan', where, flexure, providedMm2),
    deflectionFinding(basis, where, {
      position: analysis.position,
      spanMm: analysis.spanMm,
      section: bendingSection,
      momentNmm,
      requiredMm2: flexure.requiredMm2,
      providedMm2,
      carriesPartitions: context.carriesPartitions,
    }),
    ...limits,
    fitFinding(context, bars),
    ...fireFindings(context, bars),
  ]
}

/**
 * Bending of a rib at midspan with given bars, N·mm a rib.
 *
 * Source: by the basis, `flangeWidthMm` and `flexure`
 */
export function midspanBending(context: RibContext, bars: BarSet) {
  const { basis, section, analysis } = context
  const flange = basis.flangeWidthMm(analysis.position, analysis.spanMm, section.ribMm, section.clearMm)
  const bendingSection = midspanSection(section, effectiveDepthMm(section, bars), flange.value)
  const momentNmm = perRib(context, analysis.forces.saggingNmm)
  return { bendingSection, momentNmm, flexure: basis.flexure(bendingSection, momentNmm, 0) }
}

/** Width the bars take up side by side: bars and gaps between, mm. */
function barsWidthMm(
  { basis }: RibContext,
  bars: BarSet,
): { readonly widthMm: number; readonly gapMm: number; readonly clause: string } {
  const gap = basis.leastGapMm(thickest(bars), RIB_AGGREGATE_MM)
  const diameters = bars.reduce((sum, { diameter, count }) => sum + count * diameter, 0)
  return { widthMm: diameters + Math.max(0, countOf(bars) - 1) * gap.value, gapMm: gap.value, clause: gap.clause }
}

function fitFinding(context: RibContext, bars: BarSet): Finding {
  const { ribMm, coverMm, linkMm } = context.section
  const { widthMm, gapMm, clause } = barsWidthMm(context, bars)
  const demand = 2 * (coverMm + linkMm) + widthMm
  return {
    name: 'bars.fit',
    place: midspan,
    clause,
    demand,
    capacity: ribMm,
    unit: 'mm',
    working: () =>
      `2·(cover + link) + bars + gaps = 2·(${figure(coverMm)} + ${linkMm}) + ${figure(widthMm)} = ${figure(demand)}; rib ${figure(ribMm)} mm ` +
      `(${setText(bars)}, gap ${gapMm}, aggregate ${RIB_AGGREGATE_MM})`,
  }
}

/**
 * Axis distance or cover of the bottom bars in fire: from below, and to the side faces with the bars closed up in the middle of the rib.
 *
 * Source: by the basis, `ribFire`
 */
export function fireFindings(context: RibContext, bars: BarSet): Finding[] {
  const { basis, section, analysis, fireMinutes } = context
  if (fireMinutes === 0) return []
  const isContinuous = analysis.position !== 'simple'
  const fire = basis.ribFire(fireMinutes, section.ribMm, isContinuous, analysis.forces.redistributedShare)
  const isAxis = fire.measuredTo === 'axis'
  const provided = isAxis ? axisDistanceMm(section, bars) : section.coverMm
  const found: Finding[] = [
    {
      name: 'fire.cover',
      place: () => 'bottom bars, from below',
      clause: fire.bars.clause,
      demand: fire.bars.value,
      capacity: provided,
      unit: 'mm',
      working: () => `${fire.bars.working()}; ${isAxis ? 'a = cover + link + φ/2 =' : 'cover'} ${figure(provided)} mm`,
    },
  ]
  const { sideAxisMm } = fire
  if (!sideAxisMm) return found
  const side = (section.ribMm - barsWidthMm(context, bars).widthMm + thickest(bars)) / 2
  const working = () => `${sideAxisMm.working()}; bars closed up in the rib: asd = ${figure(side)} mm`
  const demand = sideAxisMm.value
  const place = () => 'bottom bars, from the side'
  return [...found, { name: 'fire.cover', place, clause: sideAxisMm.clause, demand, capacity: side, unit: 'mm', working }]
}
