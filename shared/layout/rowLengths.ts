import { clearIntervals } from '../geometry/region'
import type { PanelField } from './panelField'
import type { RunEnd } from './panelLayout'

/** A length over which a row's widened band lies clear; `usable…` is less the solid zones. Local frame, mm. */
export interface RowLength {
  readonly start: number
  readonly end: number
  readonly startsAt: RunEnd
  readonly endsAt: RunEnd
  /** `usableEnd` ≤ `usableStart` where the solid zones take all. */
  readonly usableStart: number
  readonly usableEnd: number
}

/**
 * Lengths of one row: where its band, widened by the edge strip on each side, lies inside the clear outline and clear of trimmers.
 * A solid zone stands at supported ends only.
 */
export function rowLengths(
  field: PanelField,
  band: { readonly start: number; readonly end: number },
  edgeStripMm: number,
  solidZoneMm: number,
): RowLength[] {
  return clearIntervals(field.free, band.start - edgeStripMm, band.end + edgeStripMm).map(
    ({ start, end, startEdges, endEdges }) => {
      const [startsAt, endsAt] = [field.endAt(startEdges), field.endAt(endEdges)]
      const usableStart = startsAt === 'support' ? start + solidZoneMm : start
      const usableEnd = endsAt === 'support' ? end - solidZoneMm : end
      return { start, end, startsAt, endsAt, usableStart, usableEnd }
    },
  )
}
