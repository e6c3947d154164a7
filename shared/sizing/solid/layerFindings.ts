import type { BarDiameter, BarLayer } from '../../contracts/appraisal'
import type { BarPlace, BendingSection, Flexure, SpacedBars } from '../codeBasis'
import { figure } from '../figure'
import type { Finding, Where } from '../finding'
import { deflectionFinding, flexureFindings, steelLimitFindings } from '../flexureFindings'
import { simpleEdgeFlexure } from '../simpleEdgeFlexure'
import { METRE_MM, type SlabContext, type TopPlace, isHogging, layerDepthMm, placeName } from './slabContext'
import { layerAreaMm2, layerText } from './bars/slabLayer'
import { redistributedAt, secondarySteel, slabZone } from './slabLimits'

/**
 * A metre of slab with one layer of tension bars.
 *
 * Source: statics, effective depth as `layerDepthMm`
 */
export function slabSection(context: SlabContext, diameter: BarDiameter, outer: BarDiameter | null): BendingSection {
  return { widthMm: METRE_MM, depthMm: layerDepthMm(context, diameter, outer), flange: null }
}

/**
 * Bending at midspan of the short or the long direction, N·mm per metre.
 *
 * Source: by the basis, `flexure`
 */
export function midspanFlexure(
  context: SlabContext,
  direction: 'short' | 'long',
  diameter: BarDiameter,
  outer: BarDiameter | null,
): Flexure {
  const span = context.analysis[direction]
  return context.basis.flexure(slabSection(context, diameter, outer), span?.saggingNmm ?? 0, 0)
}

/**
 * Bending at one end: the hogging moment where the floor is continuous, else the share of the midspan moment of simple edges.
 *
 * Source: by the basis, `flexure` and `simpleEdge`
 */
export function topFlexure(context: SlabContext, place: TopPlace, diameter: BarDiameter, outer: BarDiameter | null): Flexure {
  const { basis, analysis } = context
  const section = slabSection(context, diameter, outer)
  if (isHogging(place) && place.span)
    return basis.flexure(section, place.span.ends[place.end].hoggingNmm, place.span.redistributedShare)
  const midspan = (place.span ?? analysis.short).saggingNmm
  const zone = slabZone(context.heightMm, section.depthMm)
  return simpleEdgeFlexure(basis, 'slab', { hogging: section, sagging: section, midspanNmm: midspan, zone })
}

const at = (place: string, layer: BarLayer): Where => ({ place: () => place, bars: () => layerText(layer) })

/** Depth and redistribution that a spacing is judged by. */
type SpacedAt = Pick<SpacedBars, 'depthMm' | 'redistributedShare'>

const unredistributed = (depthMm: number): SpacedAt => ({ depthMm, redistributedShare: 0 })

function spacingFinding(context: SlabContext, where: Where, place: BarPlace, layer: BarLayer, bars: SpacedAt): Finding {
  const { diameter } = layer
  const { heightMm } = context
  const most = context.basis.greatestSpacingMm({ place, heightMm, diameterMm: diameter, ...bars })
  return {
    name: 'bars.spacing',
    place: where.place,
    clause: most.clause,
    demand: layer.spacing,
    capacity: most.value,
    unit: 'mm',
    working: () => `${where.place()}, ${where.bars()}: ${most.working()}; ${layerText(layer)}`,
  }
}

function limitFindings(context: SlabContext, where: Where, bars: SpacedAt, layer: BarLayer): Finding[] {
  const { basis, heightMm } = context
  return [
    ...steelLimitFindings(basis, where, slabZone(heightMm, bars.depthMm), METRE_MM * heightMm, layerAreaMm2(layer)),
    spacingFinding(context, where, 'greatestMoment', layer, bars),
  ]
}

/**
 * Deflection of a slab, by the direction it spans first.
 *
 * Source: by the basis, `spanDepthLimit` (short span of two-way panels)
 */
export function slabDeflection(context: SlabContext, layer: BarLayer, flexure: Flexure): Finding {
  return deflectionAt(context, at('short span, midspan', layer), context.analysis.short.saggingNmm, layer, flexure)
}

/**
 * Deflection of a cantilever, by its top bars; nothing where a panel is none.
 *
 * Source: by the basis, `spanDepthLimit`
 */
export function cantileverDeflection(context: SlabContext, place: TopPlace, layer: BarLayer, flexure: Flexure): Finding[] {
  const { short } = context.analysis
  if (short.position !== 'cantilever') return []
  const where = at(`cantilever, ${placeName(place)}`, layer)
  return [deflectionAt(context, where, short.ends[place.end].hoggingNmm, layer, flexure)]
}

function deflectionAt(
  context: SlabContext,
  where: ReturnType<typeof at>,
  momentNmm: number,
  layer: BarLayer,
  flexure: Flexure,
): Finding {
  const { basis, analysis, brief } = context
  return deflectionFinding(basis, where, {
    position: analysis.short.position,
    spanMm: analysis.short.spanMm,
    section: slabSection(context, layer.diameter, null),
    momentNmm,
    requiredMm2: flexure.requiredMm2,
    providedMm2: layerAreaMm2(layer),
    carriesPartitions: brief.partitionsLoad > 0,
  })
}

/**
 * What the checks find for the bottom bars of the direction that the panel spans first. A cantilever has no midspan moment.
 *
 * Source: by the basis
 */
export function shortBottomFindings(context: SlabContext, layer: BarLayer, flexure: Flexure): Finding[] {
  const where = at('short span, midspan', layer)
  const rest = [
    ...limitFindings(context, where, unredistributed(layerDepthMm(context, layer.diameter, null)), layer),
    ...fireFindings(context, layer),
  ]
  if (context.analysis.short.position === 'cantilever') return rest
  return [
    ...flexureFindings('flexure.midspan', where, flexure, layerAreaMm2(layer)),
    slabDeflection(context, layer, flexure),
    ...rest,
  ]
}

/**
 * Axis distance or cover of the main bottom bars in fire.
 *
 * Source: by the basis, `slabFire`
 * @param minutes - 0: no fire period, nothing is found
 */
export function fireFindings(
  { basis, brief, analysis }: SlabContext,
  { diameter }: BarLayer,
  minutes: number = brief.fireMinutes,
): Finding[] {
  if (minutes === 0) return []
  const action = analysis.long === null ? 'oneWay' : analysis.aspect <= 1.5 ? 'twoWay' : 'twoWayLong'
  const isContinuous = analysis.short.position !== 'simple'
  const { bars, measuredTo } = basis.slabFire(minutes, action, isContinuous)
  const isAxis = measuredTo === 'axis'
  const provided = isAxis ? brief.cover + diameter / 2 : brief.cover
  return [
    {
      name: 'fire.cover',
      place: () => 'short span, bottom bars',
      clause: bars.clause,
      demand: bars.value,
      capacity: provided,
      unit: 'mm',
      working: () =>
        isAxis
          ? `${bars.working()}; a = cover + φ/2 = ${figure(brief.cover)} + ${diameter}/2 = ${figure(provided)} mm`
          : `${bars.working()}; cover ${figure(provided)} mm`,
    },
  ]
}

/**
 * What the checks find for the bottom bars across: in bending where the panel spans two ways, else as a share of the main bars.
 *
 * Source: by the basis, `secondary` one way
 * @param main - bars of the direction spanned first, which lie outside these
 */
export function longBottomFindings(context: SlabContext, layer: BarLayer, flexure: Flexure, main: BarLayer): Finding[] {
  const depthMm = layerDepthMm(context, layer.diameter, main.diameter)
  if (context.analysis.long) {
    const where = at('long span, midspan', layer)
    return [
      ...flexureFindings('flexure.midspan', where, flexure, layerAreaMm2(layer)),
      ...limitFindings(context, where, unredistributed(depthMm), layer),
    ]
  }
  const secondary = secondarySteel(context, main, depthMm)
  const where = at('across the span', layer)
  return [
    {
      name: 'steel.least',
      place: where.place,
      clause: secondary.clause,
      demand: secondary.value,
      capacity: layerAreaMm2(layer),
      unit: 'mm²',
      working: () => `${where.place()}, ${where.bars()}: ${secondary.working()}; ${figure(layerAreaMm2(layer), 0)} mm² provided`,
    },
    spacingFinding(context, where, 'secondary', layer, unredistributed(depthMm)),
  ]
}

/**
 * What the checks find for the top bars at one end.
 *
 * Source: by the basis; at edges taken as simple by its `simpleEdge`
 * @param layer - null where bars are given and none of them lies there
 */
export function topLayerFindings(
  context: SlabContext,
  place: TopPlace,
  layer: BarLayer | null,
  flexure: Flexure,
  depthMm: number,
): Finding[] {
  const where: Where = { place: () => placeName(place), bars: () => (layer ? layerText(layer) : 'no bars') }
  const provided = layer ? layerAreaMm2(layer) : 0
  if (isHogging(place))
    return [
      ...flexureFindings('flexure.support', where, flexure, provided),
      ...(layer ? limitFindings(context, where, { depthMm, redistributedShare: redistributedAt(place) }, layer) : []),
    ]
  const { clause } = context.basis.simpleEdge.slab
  return [
    {
      name: 'steel.least',
      place: where.place,
      clause,
      demand: flexure.requiredMm2,
      capacity: provided,
      unit: 'mm²',
      working: () => `${where.place()}, ${where.bars()}: ${flexure.steelWorking()}; ${figure(provided, 0)} mm² provided`,
    },
    ...(layer ? [spacingFinding(context, where, 'principal', layer, unredistributed(depthMm))] : []),
  ]
}

/**
 * Shear at one end of a direction that carries, per metre.
 *
 * Source: by the basis, `shearResistanceN`; at the line of support, on the safe side
 */
export function slabShearFinding(context: SlabContext, place: TopPlace, depthMm: number, steelMm2: number): Finding | null {
  if (!place.span) return null
  const { shearN } = place.span.ends[place.end]
  const resistance = context.basis.shearResistanceN({ widthMm: METRE_MM, depthMm, steelMm2 })
  return {
    name: 'shear',
    place: () => placeName(place),
    clause: resistance.clause,
    demand: shearN / 1000,
    capacity: resistance.value / 1000,
    unit: 'kN/m',
    working: () => `${placeName(place)}: V = ${figure(shearN / 1000)} kN/m; ${resistance.working()}`,
  }
}

/**
 * Least thickness of a slab in fire.
 *
 * Source: by the basis, `slabFire`
 */
export function sizeFindings({ basis, brief, heightMm }: SlabContext, minutes: number = brief.fireMinutes): Finding[] {
  if (minutes === 0) return []
  const { size } = basis.slabFire(minutes, 'oneWay', true)
  const working = () => `${size.working()}; slab ${figure(heightMm)} mm`
  const place = () => 'slab'
  return [{ name: 'fire.size', place, clause: size.clause, demand: size.value, capacity: heightMm, unit: 'mm', working }]
}
