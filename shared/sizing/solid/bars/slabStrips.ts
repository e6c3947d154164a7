import type { BarLayer } from '../../../contracts/appraisal'
import type { StripLayers } from './slabLayer'
import { EDGE_STRIP } from './slabMass'

/** A strip of the panel across the bars, shares of the clear width, and the layer that lies in it. */
export interface Strip {
  readonly name: string
  readonly from: number
  readonly to: number
  readonly layer: BarLayer
}

/**
 * The strips that layers lie in: middle and edge strips, or the whole width.
 *
 * Source: BS 8110-1:1997, 3.5.3.5 (see EDGE_STRIP)
 */
export function stripsOf({ middle, edge }: StripLayers): Strip[] {
  if (!edge) return [{ name: '', from: 0, to: 1, layer: middle }]
  return [
    { name: ', middle strip', from: EDGE_STRIP, to: 1 - EDGE_STRIP, layer: middle },
    { name: ', edge strips', from: 0, to: EDGE_STRIP, layer: edge },
    { name: ', edge strips', from: 1 - EDGE_STRIP, to: 1, layer: edge },
  ]
}
