import type { BarDiameter, BarLayer } from '../../contracts/appraisal'
import { type Candidate, chooseLeastMass } from '../chooseLeastMass'
import type { Finding } from '../finding'
import { CHOSEN_DIAMETERS } from '../tables/bars'
import { firstMeeting, inStrips, layersGiving, leastMm2 } from './firstMeeting'
import { longBottomFindings, midspanFlexure, shortBottomFindings, slabShearFinding } from './layerFindings'
import { layerDepthMm, type SlabContext, topPlaces } from './slabContext'
import { layerAreaMm2, layerFor, type StripLayers } from './slabLayer'
import { bottomParts, stripsMassKg } from './slabMass'

/**
 * Shear at the ends of one direction where bottom bars are the tension steel.
 *
 * Source: by the basis, `shearResistanceN`
 */
export function bottomShears(context: SlabContext, direction: 'short' | 'long', depthMm: number, layer: BarLayer): Finding[] {
  return topPlaces(context)
    .filter((place) => place.direction === direction && !place.side.isContinuous)
    .flatMap((place) => slabShearFinding(context, place, depthMm, layerAreaMm2(layer)) ?? [])
}

/**
 * The lightest layer of one diameter for the direction spanned first: bending, least steel, deflection and shear.
 *
 * Source: by the basis
 */
export function shortLayer(context: SlabContext, diameter: BarDiameter): BarLayer {
  const flexure = midspanFlexure(context, 'short', diameter, null)
  const depthMm = layerDepthMm(context, diameter, null)
  const needed = Math.max(flexure.requiredMm2, leastMm2(context, depthMm))
  const greatest = context.basis.greatestSpacingMm('greatestMoment', context.heightMm).value
  const deflects = (layer: BarLayer) => shortBottomFindings(context, layer, flexure).filter(({ name }) => name === 'deflection')
  return firstMeeting(layersGiving(diameter, needed, greatest), (layer) => [
    ...deflects(layer),
    ...bottomShears(context, 'short', depthMm, layer),
  ])
}

function longCandidate(context: SlabContext, layer: BarLayer, main: BarLayer): Candidate<StripLayers> {
  const { analysis, given, brief } = context
  const depthMm = layerDepthMm(context, layer.diameter, main.diameter)
  const option = given ? { middle: layer, edge: null } : inStrips(context, layer, depthMm)
  return {
    option,
    findings: () => [
      ...longBottomFindings(context, layer, midspanFlexure(context, 'long', layer.diameter, main.diameter), main),
      ...bottomShears(context, 'long', depthMm, layer),
    ],
    massKg: stripsMassKg(context, option, bottomParts(analysis.other, layer, brief.cover), analysis.short.axis.clearMm, false),
  }
}

function longLayer(context: SlabContext, diameter: BarDiameter, main: BarLayer): BarLayer {
  const { basis, analysis, heightMm } = context
  if (!analysis.long) {
    const greatest = basis.greatestSpacingMm('secondary', heightMm).value
    return layerFor(diameter, basis.secondary.share * layerAreaMm2(main), greatest)
  }
  const depthMm = layerDepthMm(context, diameter, main.diameter)
  const { requiredMm2 } = midspanFlexure(context, 'long', diameter, main.diameter)
  const needed = Math.max(requiredMm2, leastMm2(context, depthMm))
  const layers = layersGiving(diameter, needed, basis.greatestSpacingMm('greatestMoment', heightMm).value)
  return firstMeeting(layers, (layer) => bottomShears(context, 'long', depthMm, layer))
}

/**
 * Bottom bars across the direction spanned first: the given ones, or those of least mass, in bending where the panel spans two ways.
 *
 * Source: project rule, engine design section 4
 * @param main - bars of the direction spanned first, which lie nearer the face
 */
export function chooseLongBottom(context: SlabContext, main: BarLayer): Candidate<StripLayers> {
  if (context.given) return longCandidate(context, context.given.bottomY, main)
  return chooseLeastMass(CHOSEN_DIAMETERS.map((diameter) => longCandidate(context, longLayer(context, diameter, main), main)))
}
