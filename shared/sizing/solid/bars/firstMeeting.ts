import type { BarLayer } from '../../../contracts/appraisal'
import { type Finding, isMet, utilisationOf } from '../../finding'
import { hasHeldCorners, type SlabContext } from '../slabContext'
import { greatestSpacingMm, slabZone } from '../slabLimits'
import { closerLayer, layerFor, type StripLayers } from './slabLayer'

/**
 * Of a layer and closer ones of its diameter, the first that meets every finding of `judge`; where none does, the first of those
 * nearest to it.
 *
 * Source: project rule, engine design sections 4 and 8 (more load never ends in less steel)
 */
export function firstMeeting(widest: BarLayer, judge: (layer: BarLayer) => readonly Finding[]): BarLayer {
  let [best, least] = [widest, Infinity]
  for (let layer: BarLayer | null = widest; layer; layer = closerLayer(layer)) {
    const utilisation = judge(layer).reduce((most, { demand, capacity }) => Math.max(most, utilisationOf(demand, capacity)), 0)
    if (isMet(utilisation, 1)) return layer
    if (utilisation < least - 1e-9) [best, least] = [layer, utilisation]
  }
  return best
}

/**
 * Least steel of a metre of slab, mm².
 *
 * Source: by the basis, `leastSteelMm2`
 */
export function leastMm2({ basis, heightMm }: SlabContext, depthMm: number): number {
  return basis.leastSteelMm2(slabZone(heightMm, depthMm)).value
}

/**
 * A layer in the middle strip with least steel in the edge strips of two-way panels with corners held down; across the whole width of others.
 *
 * Source: BS 8110-1:1997, 3.5.3.5, rules 1 to 3 (from memory, engine design section 4)
 */
export function inStrips(context: SlabContext, middle: BarLayer, depthMm: number): StripLayers {
  if (!hasHeldCorners(context)) return { middle, edge: null }
  const greatest = greatestSpacingMm(context, 'principal', middle.diameter, depthMm)
  const edge = layerFor(middle.diameter, leastMm2(context, depthMm), greatest)
  return { middle, edge: edge.spacing > middle.spacing ? edge : middle }
}
