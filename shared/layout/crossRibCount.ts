import type { RibbedScheme } from '../contracts/appraisal'
import { FIT_TOLERANCE_MM } from '../geometry/tolerance'

/**
 * Cross ribs in one length of a row. `every` N gives `⌈clear length / N⌉ − 1`; `rule` gives the least number that leaves no more
 * than `ruleSpacingMm` clear between cross ribs and solid zones.
 *
 * Source: EN 1992-1-1:2004, 5.3.1(6) (transverse ribs at a clear spacing of at most 10 overall depths) through `ruleSpacingMm`
 * @param clearLengthMm - of the row, solid zones included
 * @param usableLengthMm - between the solid zones
 * @param ruleSpacingMm - greatest clear spacing the basis allows, null where it asks for none
 */
export function crossRibCount(
  { crossRibs, ribWidth }: Pick<RibbedScheme, 'crossRibs' | 'ribWidth'>,
  clearLengthMm: number,
  usableLengthMm: number,
  ruleSpacingMm: number | null,
): number {
  if (crossRibs === 'none') return 0
  if (crossRibs !== 'rule') return Math.max(0, Math.ceil((clearLengthMm - FIT_TOLERANCE_MM) / crossRibs.every) - 1)
  if (ruleSpacingMm === null) return 0
  return Math.max(0, Math.ceil((usableLengthMm - ruleSpacingMm - FIT_TOLERANCE_MM) / (ruleSpacingMm + ribWidth)))
}

/** Width of the scheme's cross ribs, mm: as wide as the ribs unless given. */
export function crossRibWidth({ crossRibs, ribWidth }: Pick<RibbedScheme, 'crossRibs' | 'ribWidth'>): number {
  return typeof crossRibs === 'object' ? crossRibs.width : ribWidth
}
