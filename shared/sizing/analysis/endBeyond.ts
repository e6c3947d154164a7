import type { Beyond } from '../../contracts/appraisal'
import { distance, edgeOfRing } from '../../geometry/ring'
import type { PanelSite } from '../panelSite'

/**
 * What was typed to go on behind some edges of a panel that are one end of it: of several, what stands at the longest.
 *
 * Source: project rule, the user's word comes before what the level would find by itself
 */
export function endBeyond({ panel, edges }: PanelSite, numbers: readonly number[]): Beyond | null {
  const typed = numbers.filter((edge) => edges[edge]!.beyond)
  const lengthOf = (edge: number) => distance(...edgeOfRing(panel.outline, edge))
  const longest = typed.reduce<number | null>(
    (best, edge) => (best === null || lengthOf(edge) > lengthOf(best) ? edge : best),
    null,
  )
  return longest === null ? null : (edges[longest]!.beyond ?? null)
}

/**
 * Length of some edges of a panel, mm.
 *
 * Source: geometry
 */
export function edgesLengthMm({ panel }: PanelSite, numbers: readonly number[]): number {
  return numbers.reduce((sum, edge) => sum + distance(...edgeOfRing(panel.outline, edge)), 0)
}
