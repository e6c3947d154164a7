import type { Panel } from '../contracts/appraisal'
import { signedArea } from '../geometry/ring'
import { toM2 } from '../units'
import type { Expression } from './expression'
import { areaOf } from './ringExpressions'

/**
 * Areas of those voids of a panel that are deducted, m², one expression each.
 *
 * @param overM2 - a void is deducted where its area on plan is larger than this, m²
 */
export function deductedVoids({ voids }: Panel, overM2: number): Expression[] {
  return voids
    .map((ring) => ({ ring, areaMm2: Math.abs(signedArea(ring)) }))
    .filter(({ areaMm2 }) => toM2(areaMm2) > overM2)
    .map(({ ring, areaMm2 }) => areaOf(ring, areaMm2))
}
