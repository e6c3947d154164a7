import type { BarDiameter } from '../../contracts/appraisal'
import type { CodeBasis, SpanEnd } from '../codeBasis'
import { LEAST_END_MM } from './bends'

/** How a bar ends at a support, mm: how far past the face, and the leg that turns it there; 0 for a straight end. */
export interface BarEnd {
  readonly pastMm: number
  readonly legMm: number
}

/**
 * Anchored past a face where the support leaves room; else turned by a leg that makes up what is missing, never shorter than a bend
 * takes.
 *
 * Source: EN 1992-1-1:2004, 8.4.1 and Figure 8.1 (a bend counts by the length of its centre-line, from memory); least leg BS 8666:2005, Table 2
 * @param wantedMm - length past the face that anchors the bar
 * @param roomMm - from the face to where cover begins
 */
export function anchoredEnd(diameter: BarDiameter, wantedMm: number, roomMm: number): BarEnd {
  if (wantedMm <= roomMm) return { pastMm: wantedMm, legMm: 0 }
  return { pastMm: roomMm, legMm: Math.max(LEAST_END_MM[diameter], wantedMm - roomMm) }
}

/**
 * How a bottom bar ends: as far past the face as is usual, at most to the far cover; where a support at which the floor ends is too
 * narrow for what the basis asks at least, the bar is turned up. Short of a free edge by the cover.
 *
 * Source: by the basis, `bottomEnd`; to the far cover: engine design section 4 (lengths)
 */
export function bottomBarEnd(
  basis: CodeBasis,
  diameter: BarDiameter,
  support: SpanEnd,
  { coverMm, heightMm }: { readonly coverMm: number; readonly heightMm: number },
): BarEnd {
  const { supportMm, isContinuous } = support
  if (supportMm === 0) return { pastMm: -coverMm, legMm: 0 }
  const { leastMm, usualMm } = basis.bottomEnd(diameter, support, heightMm - coverMm)
  const roomMm = supportMm - coverMm
  if (isContinuous) return { pastMm: Math.max(leastMm, Math.min(usualMm, roomMm)), legMm: 0 }
  return leastMm <= roomMm ? { pastMm: Math.min(usualMm, roomMm), legMm: 0 } : anchoredEnd(diameter, leastMm, roomMm)
}
