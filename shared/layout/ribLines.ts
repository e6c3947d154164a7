import type { RibbedScheme } from '../contracts/appraisal'
import type { Region } from '../geometry/region'
import { chordsAt } from '../geometry/region'
import { FIT_TOLERANCE_MM } from '../geometry/tolerance'
import type { LaidRow } from './laidRow'
import type { PanelField } from './panelField'
import type { RibLine } from './panelLayout'

/**
 * Lines of rib bars: n rows have n + 1, one between neighbours and one in the middle of each edge strip. A line stops at trimmers
 * and leaves the panel at a re-entrant corner, so it may come in several pieces.
 */
export function ribLines(field: PanelField, rows: readonly LaidRow[], scheme: Pick<RibbedScheme, 'ribWidth'>): RibLine[] {
  return lineHeights(field, rows, scheme.ribWidth).flatMap((y) =>
    chordsAt(field.free, y)
      .filter(({ start, end }) => end - start > FIT_TOLERANCE_MM)
      .map(({ start, end }) => ({
        start: field.frame.toLevel([start, y]),
        end: field.frame.toLevel([end, y]),
        length: end - start,
      })),
  )
}

/** Longest clear rib from support face to support face, voids passed over, mm; 0 without a row. */
export function longestRib(field: PanelField, rows: readonly LaidRow[], scheme: Pick<RibbedScheme, 'ribWidth'>): number {
  const longestIn = (region: Region, y: number) =>
    chordsAt(region, y).reduce((longest, { start, end }) => Math.max(longest, end - start), 0)
  return lineHeights(field, rows, scheme.ribWidth).reduce((longest, y) => Math.max(longest, longestIn(field.clear, y)), 0)
}

function lineHeights(field: PanelField, rows: readonly LaidRow[], ribWidthMm: number): number[] {
  const [first, last] = [rows[0], rows[rows.length - 1]]
  if (!first || !last) return []
  const within = (y: number) => Math.min(field.top - FIT_TOLERANCE_MM, Math.max(field.bottom + FIT_TOLERANCE_MM, y))
  return [
    within((field.bottom + first.bandStart) / 2),
    ...rows.slice(1).map(({ bandStart }) => bandStart - ribWidthMm / 2),
    within((field.top + last.bandEnd) / 2),
  ]
}
