import type { BarDiameter, BarLayer } from '../../../contracts/appraisal'
import { type Candidate, chooseLeastMass } from '../../bars/chooseLeastMass'
import type { Finding } from '../../finding'
import { CHOSEN_DIAMETERS } from '../../tables/bars'
import { firstMeeting, inStrips, leastMm2 } from './firstMeeting'
import { longBottomFindings, midspanFlexure, shortBottomFindings, slabDeflection, slabShearFinding } from '../layerFindings'
import { greatestSpacingMm, secondarySteel } from '../slabLimits'
import { layerDepthMm, type SlabContext } from '../slabContext'
import { layerAreaMm2, layerFor, type StripLayers } from './slabLayer'
import { bottomParts, stripsMassKg } from './slabMass'

/** Shear at the ends of one direction where bottom bars are the tension steel. */
function bottomShears(context: SlabContext, direction: 'short' | 'long', depthMm: number, layer: BarLayer): Finding[] {
  return context.places
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
  const greatest = greatestSpacingMm(context, 'greatestMoment', diameter, depthMm)
  return firstMeeting(layerFor(diameter, needed, greatest), (layer) => [
    ...(context.analysis.short.position === 'cantilever' ? [] : [slabDeflection(context, layer, flexure)]),
    ...bottomShears(context, 'short', depthMm, layer),
  ])
}

/**
 * What the checks find for bottom bars in the direction spanned first, shear at simple ends included.
 *
 * Source: by the basis
 */
export function shortFindings(context: SlabContext, layer: BarLayer): Finding[] {
  const midspan = midspanFlexure(context, 'short', layer.diameter, null)
  const depthMm = layerDepthMm(context, layer.diameter, null)
  return [...shortBottomFindings(context, layer, midspan), ...bottomShears(context, 'short', depthMm, layer)]
}

function longFindings(context: SlabContext, layer: BarLayer, main: BarLayer): Finding[] {
  const flexure = midspanFlexure(context, 'long', layer.diameter, main.diameter)
  const depthMm = layerDepthMm(context, layer.diameter, main.diameter)
  return [...longBottomFindings(context, layer, flexure, main), ...bottomShears(context, 'long', depthMm, layer)]
}

function longCandidate(context: SlabContext, layer: BarLayer, main: BarLayer): Candidate<StripLayers> {
  const { analysis, given } = context
  const depthMm = layerDepthMm(context, layer.diameter, main.diameter)
  const option = given ? { middle: layer, edge: null } : inStrips(context, layer, depthMm)
  return {
    option,
    findings: () => longFindings(context, layer, main),
    massKg: stripsMassKg(context, option, bottomParts(context, analysis.other, layer), analysis.short.axis.clearMm, false),
  }
}

function longLayer(context: SlabContext, diameter: BarDiameter, main: BarLayer): BarLayer {
  const { analysis } = context
  const depthMm = layerDepthMm(context, diameter, main.diameter)
  if (!analysis.long) {
    const greatest = greatestSpacingMm(context, 'secondary', diameter, depthMm)
    return layerFor(diameter, secondarySteel(context, main, depthMm).value, greatest)
  }
  const { requiredMm2 } = midspanFlexure(context, 'long', diameter, main.diameter)
  const needed = Math.max(requiredMm2, leastMm2(context, depthMm))
  const widest = layerFor(diameter, needed, greatestSpacingMm(context, 'greatestMoment', diameter, depthMm))
  return firstMeeting(widest, (layer) => bottomShears(context, 'long', depthMm, layer))
}

/**
 * Findings of the bottom bars that any one diameter in the direction spanned first would give, and of those across it; the given bars'
 * alone where bars are given.
 *
 * Source: project rule, engine design section 3 (least thickness)
 */
export function bottomAlternatives(
  context: SlabContext,
): { readonly short: () => Finding[]; readonly long: (() => Finding[])[] }[] {
  const { given } = context
  const diameters = given ? [given.bottomX.diameter] : CHOSEN_DIAMETERS
  return diameters.map((diameter) => {
    const main = given?.bottomX ?? shortLayer(context, diameter)
    const across = given ? [given.bottomY] : null
    return {
      short: () => shortFindings(context, main),
      long: across
        ? across.map((layer) => () => longFindings(context, layer, main))
        : CHOSEN_DIAMETERS.map((each) => () => longFindings(context, longLayer(context, each, main), main)),
    }
  })
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
