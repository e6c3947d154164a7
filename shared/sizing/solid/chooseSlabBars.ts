import type { BarDiameter, BarLayer } from '../../contracts/appraisal'
import { type Candidate, chooseLeastMass } from '../chooseLeastMass'
import type { Flexure } from '../codeBasis'
import { type Finding, utilisationOf } from '../finding'
import { CHOSEN_DIAMETERS } from '../tables/bars'
import {
  longBottomFindings,
  midspanFlexure,
  shortBottomFindings,
  slabShearFinding,
  topFlexure,
  topLayerFindings,
} from './layerFindings'
import { givenTop, isHogging, layerDepthMm, METRE_MM, type SlabContext, type TopPlace, topPlaces } from './slabContext'
import { layerAreaMm2, layerFor, layersOf, type StripLayers } from './slabLayer'
import { bottomParts, stripsMassKg, topParts } from './slabMass'
import { type TorsionBars, torsionBars } from './torsionBars'

/** Top bars at one end with their findings; `layers` null where bars are given and none lies there. */
export interface TopBars {
  readonly place: TopPlace
  readonly layers: StripLayers | null
  readonly flexure: Flexure
  readonly findings: readonly Finding[]
}

/** All bars of a solid panel, and what the checks find. */
export interface SlabBars {
  readonly bottom: Readonly<Record<'short' | 'long', StripLayers>>
  readonly tops: readonly TopBars[]
  readonly torsion: readonly TorsionBars[]
  readonly midspan: Flexure
  readonly findings: readonly Finding[]
}

type Judge = (layer: BarLayer) => readonly Finding[]

const worst = (findings: readonly Finding[]) =>
  findings.reduce((most, { demand, capacity }) => Math.max(most, utilisationOf(demand, capacity)), 0)

/** Of layers in order, the first that meets every finding of `judge`; where none does, the first of those nearest to it. */
function firstMeeting(layers: readonly BarLayer[], judge: Judge): BarLayer {
  let [best, least] = [layers[0]!, Infinity]
  for (const layer of layers) {
    const utilisation = worst(judge(layer))
    if (utilisation <= 1 + 1e-9) return layer
    if (utilisation < least - 1e-9) [best, least] = [layer, utilisation]
  }
  return best
}

/** Layers of one diameter, widest first, that give at least an area; the closest alone where none does. */
function layersGiving(diameter: BarDiameter, neededMm2: number, greatestMm: number): BarLayer[] {
  const layers = layersOf(diameter, greatestMm)
  const enough = layers.filter((layer) => layerAreaMm2(layer) >= neededMm2)
  return enough.length > 0 ? enough : layers.slice(-1)
}

function leastMm2({ basis, heightMm }: SlabContext, depthMm: number): number {
  return basis.leastSteelMm2({ widthMm: METRE_MM, webMm: METRE_MM, heightMm, depthMm }).value
}

/** A middle layer with edge strips at least steel in two-way panels, alone elsewhere. */
function inStrips(context: SlabContext, middle: BarLayer, depthMm: number): StripLayers {
  if (!context.analysis.long) return { middle, edge: null }
  const greatest = context.basis.greatestSpacingMm('principal', context.heightMm).value
  const edge = layerFor(middle.diameter, leastMm2(context, depthMm), greatest)
  return { middle, edge: edge.spacing > middle.spacing ? edge : middle }
}

const isNotNull = (finding: Finding | null): finding is Finding => finding !== null

/** Shear at the ends of one direction where bottom bars are the tension steel. */
function bottomShears(context: SlabContext, direction: 'short' | 'long', depthMm: number, layer: BarLayer): Finding[] {
  return topPlaces(context)
    .filter((place) => place.direction === direction && !place.side.isContinuous)
    .map((place) => slabShearFinding(context, place, depthMm, layerAreaMm2(layer)))
    .filter(isNotNull)
}

/**
 * Top bars at one end: the given layer, or the one of least mass.
 *
 * Source: project rule, engine design section 4
 */
export function chooseTop(context: SlabContext, place: TopPlace): TopBars {
  const given = givenTop(context, place)
  const outerOf = (diameter: BarDiameter) => (place.direction === 'short' ? null : (context.given?.topX?.diameter ?? diameter))
  const hogging = isHogging(place)
  const judged = (layer: BarLayer | null): TopBars => {
    const diameter = layer?.diameter ?? 8
    const outer = outerOf(diameter)
    const flexure = topFlexure(context, place, diameter, outer)
    const depthMm = layerDepthMm(context, diameter, outer)
    const shear = place.side.isContinuous ? slabShearFinding(context, place, depthMm, layer ? layerAreaMm2(layer) : 0) : null
    const strips = layer && (hogging && !given ? inStrips(context, layer, depthMm) : { middle: layer, edge: null })
    const findings = [...topLayerFindings(context, place, layer, flexure, depthMm), ...(shear ? [shear] : [])]
    return { place, layers: strips, flexure, findings }
  }
  if (given) return judged(given)
  if (hogging && context.given) return judged(null)
  const candidates = CHOSEN_DIAMETERS.map((diameter): Candidate<TopBars> => {
    const depthMm = layerDepthMm(context, diameter, outerOf(diameter))
    const { requiredMm2 } = topFlexure(context, place, diameter, outerOf(diameter))
    const needed = hogging ? Math.max(requiredMm2, leastMm2(context, depthMm)) : requiredMm2
    const greatest = context.basis.greatestSpacingMm(hogging ? 'greatestMoment' : 'principal', context.heightMm).value
    const layer = firstMeeting(layersGiving(diameter, needed, greatest), (each) =>
      [place.side.isContinuous ? slabShearFinding(context, place, depthMm, layerAreaMm2(each)) : null].filter(isNotNull),
    )
    const option = judged(layer)
    return { option, findings: option.findings, massKg: topMassKg(context, place, option.layers) }
  })
  return chooseLeastMass(candidates).option
}

function topMassKg(context: SlabContext, place: TopPlace, layers: StripLayers | null): number {
  if (!layers) return 0
  const { short, other } = context.analysis
  const [along, across] = place.direction === 'short' ? [short.axis, other] : [other, short.axis]
  return stripsMassKg(context, layers, topParts(context, place, layers.middle, along.clearMm), across.clearMm, true)
}

/** Bottom bars across the direction spanned first, with what they weigh and what the checks find. */
function chooseLongBottom(context: SlabContext, main: BarLayer): Candidate<StripLayers> {
  const { basis, analysis, heightMm, given } = context
  const candidate = (layer: BarLayer): Candidate<StripLayers> => {
    const depthMm = layerDepthMm(context, layer.diameter, main.diameter)
    const flexure = midspanFlexure(context, 'long', layer.diameter, main.diameter)
    const option = given ? { middle: layer, edge: null } : inStrips(context, layer, depthMm)
    const findings = [...longBottomFindings(context, layer, flexure, main), ...bottomShears(context, 'long', depthMm, layer)]
    const massKg = stripsMassKg(context, option, bottomParts(analysis.other, layer, context.brief.cover), analysis.short.axis.clearMm, false)
    return { option, findings, massKg }
  }
  if (given) return candidate(given.bottomY)
  const candidates = CHOSEN_DIAMETERS.map((diameter) => {
    const depthMm = layerDepthMm(context, diameter, main.diameter)
    if (!analysis.long) {
      const greatest = basis.greatestSpacingMm('secondary', heightMm).value
      return candidate(layerFor(diameter, basis.secondary.share * layerAreaMm2(main), greatest))
    }
    const { requiredMm2 } = midspanFlexure(context, 'long', diameter, main.diameter)
    const needed = Math.max(requiredMm2, leastMm2(context, depthMm))
    const layers = layersGiving(diameter, needed, basis.greatestSpacingMm('greatestMoment', heightMm).value)
    return candidate(firstMeeting(layers, (layer) => bottomShears(context, 'long', depthMm, layer)))
  })
  return chooseLeastMass(candidates)
}

/**
 * All bars of a solid panel: the given ones, or the set of least total mass, corner steel included.
 *
 * Source: project rule, engine design section 4 (set of least total mass that passes every check)
 */
export function chooseSlabBars(context: SlabContext): SlabBars {
  const { basis, analysis, heightMm, given, brief } = context
  const tops = topPlaces(context).map((place) => chooseTop(context, place))
  const candidate = (layer: BarLayer): Candidate<SlabBars> => {
    const midspan = midspanFlexure(context, 'short', layer.diameter, null)
    const depthMm = layerDepthMm(context, layer.diameter, null)
    const short = given ? { middle: layer, edge: null } : inStrips(context, layer, depthMm)
    const across = chooseLongBottom(context, layer)
    const bottom = { short, long: across.option }
    const torsion = torsionBars(context, midspan.requiredMm2, { bottom, tops })
    const findings = [
      ...shortBottomFindings(context, layer, midspan),
      ...bottomShears(context, 'short', depthMm, layer),
      ...across.findings,
    ]
    const own = stripsMassKg(context, short, bottomParts(analysis.short.axis, layer, brief.cover), analysis.other.clearMm, false)
    const massKg = own + across.massKg + torsion.reduce((sum, each) => sum + each.massKg, 0)
    return { option: { bottom, tops, torsion, midspan, findings: [...findings, ...tops.flatMap((each) => each.findings)] }, findings, massKg }
  }
  if (given) return candidate(given.bottomX).option
  const candidates = CHOSEN_DIAMETERS.map((diameter) => {
    const flexure = midspanFlexure(context, 'short', diameter, null)
    const depthMm = layerDepthMm(context, diameter, null)
    const needed = Math.max(flexure.requiredMm2, leastMm2(context, depthMm))
    const layers = layersGiving(diameter, needed, basis.greatestSpacingMm('greatestMoment', heightMm).value)
    const deflects = (layer: BarLayer) => shortBottomFindings(context, layer, flexure).filter(({ name }) => name === 'deflection')
    const judge = (layer: BarLayer) => [...deflects(layer), ...bottomShears(context, 'short', depthMm, layer)]
    return candidate(firstMeeting(layers, judge))
  })
  return chooseLeastMass(candidates).option
}
