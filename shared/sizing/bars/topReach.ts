import type { BarDiameter } from '../../contracts/appraisal'
import type { BarBond, CodeBasis } from '../codeBasis'
import { figure } from '../figure'

/**
 * Reach of top bars over a continuous support past its face, as a share of the clear span.
 *
 * Source: project rule, common practice of detailing, no source (engine design section 4, lengths)
 */
export const USUAL_REACH = 0.3

/** What the reach of a top bar past the face of a continuous support depends on, mm. */
export interface TopReach {
  readonly basis: Pick<CodeBasis, 'pastHogging' | 'lapMm'>
  readonly diameter: BarDiameter
  readonly depthMm: number
  readonly bond: BarBond
  readonly clearMm: number
  /** As `hoggingShare`: 0 where the usual reach will do. */
  readonly hoggingShare: number
  /** Length of a cantilever that goes on behind the support, 0 without one. */
  readonly overhangMm: number
}

const usualReachMm = ({ clearMm, overhangMm }: TopReach) => Math.max(USUAL_REACH * clearMm, Math.min(clearMm, overhangMm))

/**
 * Whether a top bar must run on further than is usual.
 *
 * Source: see `topBarReachMm`
 */
export function isFarReach(reach: TopReach): boolean {
  return reach.hoggingShare > 0 && topBarReachMm(reach) > usualReachMm(reach)
}

/**
 * That top bars run on further than is usual, and why.
 *
 * Source: project rule, what departs from the usual is stated
 * @param edges - as they are named
 */
export function farReachFlag(edges: string, hoggingShare: number): string {
  const far = hoggingShare >= 1 ? 'all along the span' : `over ${figure(100 * hoggingShare, 0)} % of the span`
  return (
    `${edges}: under the worst load pattern the panel hogs ${far}, further than top bars of 0.3 of the clear span cover, so they run on ` +
    `past the hogging${hoggingShare >= 1 ? ' and meet in a lap' : ''}`
  )
}

/**
 * How far a top bar runs past the face of a continuous support, mm: the usual share of the clear span; as far as a cantilever behind it is
 * long; and where spans are too uneven for that share, past the end of the hogging by what the basis asks. Where a span hogs all along, the
 * bars of both ends meet in a lap in its middle.
 *
 * Source: see USUAL_REACH; by the basis, `pastHogging` and `lapMm`; behind a cantilever as long as it: common practice, no source
 */
export function topBarReachMm(reach: TopReach): number {
  const { basis, diameter, depthMm, bond, clearMm, hoggingShare } = reach
  const usualMm = usualReachMm(reach)
  if (hoggingShare === 0) return usualMm
  if (hoggingShare >= 1) return Math.max(usualMm, Math.min(clearMm, (clearMm + basis.lapMm(diameter, bond).value) / 2))
  return Math.max(usualMm, Math.min(clearMm, hoggingShare * clearMm + basis.pastHogging(diameter, depthMm).value))
}
