import { signedArea } from '../geometry/ring'
import { toM2 } from '../units'
import type { Expression } from './expression'
import type { MeasuredPanel } from './measuredPanel'
import { areaOf } from './ringExpressions'

/**
 * Areas of those voids of a panel that are deducted, m², one expression each. All voids together have the area that the panel's plan
 * areas give them: what reaches past a support face within the tolerance of a fit is no void of the floor.
 *
 * @param overM2 - a void is deducted where its area on plan is larger than this, m²
 */
export function deductedVoids({ panel: { voids }, sized: { areas } }: MeasuredPanel, overM2: number): Expression[] {
  const drawnMm2 = voids.map((ring) => Math.abs(signedArea(ring)))
  const insideShare = areas.voids / drawnMm2.reduce((sum, area) => sum + area, 0)
  return voids
    .map((ring, index) => ({ ring, areaMm2: drawnMm2[index]! * insideShare }))
    .filter(({ areaMm2 }) => toM2(areaMm2) > overM2)
    .map(({ ring, areaMm2 }) => areaOf(ring, areaMm2))
}
