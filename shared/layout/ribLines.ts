import type { RibbedScheme } from '../contracts/appraisal'
import type { Region } from '../geometry/region'
import { chordsAt } from '../geometry/region'
import { FIT_TOLERANCE_MM } from '../geometry/tolerance'
import type { ClearRow } from './laidRow'
import type { PanelField } from './panelField'
import type { RibLine } from './panelLayout'

/**
 * Lines of rib bars: n rows have n + 1, one between neighbours and one in the middle of each edge strip. A line stops at trimmers
 * and leaves the panel at a re-entrant corner, so it may come in several pieces.
 */
export function ribLines(
  field: PanelField,
  rows: readonly ClearRow[],
  scheme: Pick<RibbedScheme, 'ribWidth' | 'block'>,
): RibLine[] {
  return lineHeights(field, rows, scheme).flatMap((y) =>
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
export function longestRib(
  field: PanelField,
  rows: readonly ClearRow[],
  scheme: Pick<RibbedScheme, 'ribWidth' | 'block'>,
): number {
  const longestIn = (region: Region, y: number) =>
    chordsAt(region, y).reduce((longest, { start, end }) => Math.max(longest, end - start), 0)
  return lineHeights(field, rows, scheme).reduce((longest, y) => Math.max(longest, longestIn(field.clear, y)), 0)
}

function lineHeights(
  field: PanelField,
  rows: readonly ClearRow[],
  { ribWidth, block }: Pick<RibbedScheme, 'ribWidth' | 'block'>,
): number[] {
  const [first, last] = [rows[0], rows[rows.length - 1]]
  if (!first || !last) return []
  const within = (y: number) => Math.min(field.top - FIT_TOLERANCE_MM, Math.max(field.bottom + FIT_TOLERANCE_MM, y))
  return [
    within((field.bottom + first.bandStart) / 2),
    ...rows.slice(1).map(({ bandStart }) => bandStart - ribWidth / 2),
    within((field.top + (last.bandStart + block.width)) / 2),
  ]
}
