import { clearIntervals } from '../geometry/region'
import type { PanelField } from './panelField'
import type { RunEnd } from './panelLayout'

/** A length over which a row's widened band lies clear. Local frame, mm. */
export interface ClearLength {
  readonly start: number
  readonly end: number
  readonly startsAt: RunEnd
  readonly endsAt: RunEnd
}

/** The same with `usable…` less the solid zones. */
export interface RowLength extends ClearLength {
  /** `usableEnd` ≤ `usableStart` where the solid zones take all. */
  readonly usableStart: number
  readonly usableEnd: number
}

/** Lengths of one row: where its band, widened by the edge strip on each side, lies inside the clear outline and clear of trimmers. */
export function clearLengths(
  field: PanelField,
  band: { readonly start: number; readonly end: number },
  edgeStripMm: number,
): ClearLength[] {
  return clearIntervals(field.free, band.start - edgeStripMm, band.end + edgeStripMm).map(
    ({ start, end, startEdges, endEdges }) => ({
      start,
      end,
      startsAt: field.endAt(startEdges),
      endsAt: field.endAt(endEdges),
    }),
  )
}

/** A clear length less its solid zones, which stand at supported ends only. */
export function lessSolidZones({ start, end, startsAt, endsAt }: ClearLength, solidZoneMm: number): RowLength {
  const usableStart = startsAt === 'support' ? start + solidZoneMm : start
  const usableEnd = endsAt === 'support' ? end - solidZoneMm : end
  return { start, end, startsAt, endsAt, usableStart, usableEnd }
}
