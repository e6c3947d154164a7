import type { BarDiameter, BarLayer } from '../../../contracts/appraisal'
import { type Candidate, chooseLeastMass } from '../../bars/chooseLeastMass'
import type { Flexure } from '../../codeBasis'
import type { Finding } from '../../finding'
import { CHOSEN_DIAMETERS } from '../../tables/bars'
import { firstMeeting, inStrips, leastMm2 } from './firstMeeting'
import { cantileverDeflection, slabShearFinding, topFlexure, topLayerFindings } from '../layerFindings'
import { greatestSpacingMm, redistributedAt } from '../slabLimits'
import { givenTop, isHogging, layerDepthMm, type SlabContext, type TopPlace } from '../slabContext'
import { layerAreaMm2, layerFor, type StripLayers } from './slabLayer'
import { stripsMassKg, topParts } from './slabMass'

/** Top bars at one end with their findings; `layers` null where bars are given and none lies there. */
export interface TopBars {
  readonly place: TopPlace
  readonly layers: StripLayers | null
  readonly flexure: Flexure
  readonly findings: readonly Finding[]
}

/** Diameter of what lies between a top layer and the face: bars of the short direction over those of the long. */
function outerOf({ given }: SlabContext, { direction }: TopPlace, diameter: BarDiameter): BarDiameter | null {
  return direction === 'short' ? null : (given?.topX?.diameter ?? diameter)
}

function shearOf(context: SlabContext, place: TopPlace, depthMm: number, layer: BarLayer | null): Finding[] {
  if (!place.side.isContinuous) return []
  const finding = slabShearFinding(context, place, depthMm, layer ? layerAreaMm2(layer) : 0)
  return finding ? [finding] : []
}

function judged(context: SlabContext, place: TopPlace, layer: BarLayer | null, layers: StripLayers | null): TopBars {
  const diameter = layer?.diameter ?? CHOSEN_DIAMETERS[0]
  const outer = outerOf(context, place, diameter)
  const flexure = topFlexure(context, place, diameter, outer)
  const depthMm = layerDepthMm(context, diameter, outer)
  const findings = [
    ...topLayerFindings(context, place, layer, flexure, depthMm),
    ...shearOf(context, place, depthMm, layer),
    ...(layer ? cantileverDeflection(context, place, layer, flexure) : []),
  ]
  return { place, layers, flexure, findings }
}

/** The lightest layer of one diameter that carries what a place asks. */
function topLayer(context: SlabContext, place: TopPlace, diameter: BarDiameter): BarLayer {
  const outer = outerOf(context, place, diameter)
  const depthMm = layerDepthMm(context, diameter, outer)
  const flexure = topFlexure(context, place, diameter, outer)
  const { requiredMm2 } = flexure
  const hogging = isHogging(place)
  const needed = hogging ? Math.max(requiredMm2, leastMm2(context, depthMm)) : requiredMm2
  const greatest = greatestSpacingMm(context, hogging ? 'greatestMoment' : 'principal', diameter, depthMm, redistributedAt(place))
  return firstMeeting(layerFor(diameter, needed, greatest), (each) => [
    ...shearOf(context, place, depthMm, each),
    ...cantileverDeflection(context, place, each, flexure),
  ])
}

/** The lightest bars of one diameter; what the checks find is worked out when it is first asked for. */
function candidateOf(context: SlabContext, place: TopPlace, diameter: BarDiameter): Candidate<() => TopBars> {
  const layer = topLayer(context, place, diameter)
  const depthMm = layerDepthMm(context, diameter, outerOf(context, place, diameter))
  const layers = isHogging(place) ? inStrips(context, layer, depthMm) : { middle: layer, edge: null }
  const { short, other } = context.analysis
  const [along, across] = place.direction === 'short' ? [short.axis, other] : [other, short.axis]
  let found: TopBars | null = null
  const option = () => (found ??= judged(context, place, layer, layers))
  return {
    option,
    findings: () => option().findings,
    massKg: stripsMassKg(context, layers, topParts(context, place, layer, along.clearMm), across.clearMm, true),
  }
}

/**
 * Findings of the top bars at one end that any one diameter would give; the given bars' alone where bars are given.
 *
 * Source: project rule, engine design section 3 (least thickness)
 */
export function topAlternatives(context: SlabContext, place: TopPlace): (() => readonly Finding[])[] {
  if (context.given && (isHogging(place) || givenTop(context, place))) return [() => chooseTopBars(context, place).findings]
  return CHOSEN_DIAMETERS.map((diameter) => () => judged(context, place, topLayer(context, place, diameter), null).findings)
}

/**
 * Top bars at one end: the given layer, or the one of least mass. Given bars without a layer there leave continuous ends bare.
 *
 * Source: project rule, engine design section 4
 */
export function chooseTopBars(context: SlabContext, place: TopPlace): TopBars {
  const given = givenTop(context, place)
  if (given) return judged(context, place, given, { middle: given, edge: null })
  if (context.given && isHogging(place)) return judged(context, place, null, null)
  return chooseLeastMass(CHOSEN_DIAMETERS.map((diameter) => candidateOf(context, place, diameter))).option()
}
