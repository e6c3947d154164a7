import { FIT_TOLERANCE_MM } from '../geometry/tolerance'
import type { Window } from '../geometry/region'
import type { Stretch } from './fillLength'
import type { LaidRow } from './laidRow'
import type { PanelField } from './panelField'
import type { SolidRegion } from './panelLayout'

/** An upright window of the local frame; what of it lies inside the clear outline, clear of voids and trimmers, is of one kind. */
export interface KindWindow extends Window {
  readonly kind: Exclude<SolidRegion['kind'], 'trimmers'> | 'ribs'
  /** Known to lie wholly inside the clear outline, clear of voids and trimmers. */
  readonly isWhole: boolean
}

/**
 * All of a panel but blocks, voids and trimmers, divided into windows that do not overlap:
 * - edge strips: below the first and above the last row, over the whole length;
 * - in each row: cross ribs and fillers within its usable lengths;
 * - ribs: between two rows, as far as either of them has a usable length;
 * - the rest of rows and ribs is solid zone where it reaches a supported end of a row, else filler.
 * Without a row all is solid zone.
 */
export function solidWindows(field: PanelField, rows: readonly LaidRow[]): KindWindow[] {
  const [first, last] = [rows[0], rows[rows.length - 1]]
  const everywhere = { left: -Infinity, right: Infinity }
  if (!first || !last) return [{ ...everywhere, bottom: field.bottom, top: field.top, kind: 'solidZones', isWhole: false }]
  const windows: KindWindow[] = [
    { ...everywhere, bottom: field.bottom, top: first.bandStart, kind: 'edgeStrips', isWhole: false },
    { ...everywhere, bottom: last.bandEnd, top: field.top, kind: 'edgeStrips', isWhole: false },
  ]
  rows.forEach((row, i) => {
    windows.push(...windowsOfRow(row))
    const next = rows[i + 1]
    if (next) windows.push(...windowsOfRib(row, next))
  })
  return windows.filter(({ bottom, top, left, right }) => top > bottom && right > left)
}

function windowsOfRow(row: LaidRow): KindWindow[] {
  const window = (stretch: Stretch, kind: KindWindow['kind'], isWhole: boolean): KindWindow => ({
    left: stretch.start,
    right: stretch.end,
    bottom: row.bandStart,
    top: row.bandEnd,
    kind,
    isWhole,
  })
  return [
    ...row.filled.flatMap(({ crossRibs }) => crossRibs.map((stretch) => window(stretch, 'crossRibs', true))),
    ...row.filled.flatMap(({ fillers }) => fillers.map((stretch) => window(stretch, 'fillers', true))),
    ...gapsBetween(row.usable).map((gap) => window(gap, kindOfGap(gap, [row]), false)),
  ]
}

function windowsOfRib(row: LaidRow, next: LaidRow): KindWindow[] {
  const [bottom, top] = [row.bandEnd, next.bandStart]
  const covered = union([...row.usable, ...next.usable])
  return [
    ...covered.map(({ start, end }) => ({ left: start, right: end, bottom, top, kind: 'ribs' as const, isWhole: false })),
    ...gapsBetween(covered).map((gap) => ({
      left: gap.start,
      right: gap.end,
      bottom,
      top,
      kind: kindOfGap(gap, [row, next]),
      isWhole: false,
    })),
  ]
}

function kindOfGap(gap: Stretch, rows: readonly LaidRow[]): 'solidZones' | 'fillers' {
  const within = (x: number) => x >= gap.start - FIT_TOLERANCE_MM && x <= gap.end + FIT_TOLERANCE_MM
  const reachesSupport = rows.some(({ lengths }) =>
    lengths.some(
      ({ start, end, startsAt, endsAt }) => (startsAt === 'support' && within(start)) || (endsAt === 'support' && within(end)),
    ),
  )
  return reachesSupport ? 'solidZones' : 'fillers'
}

/** What lies before, between and after stretches that are sorted and apart. */
function gapsBetween(stretches: readonly Stretch[]): Stretch[] {
  const bounds = [-Infinity, ...stretches.flatMap(({ start, end }) => [start, end]), Infinity]
  return Array.from({ length: bounds.length / 2 }, (_, i) => ({ start: bounds[2 * i]!, end: bounds[2 * i + 1]! }))
}

function union(stretches: readonly Stretch[]): Stretch[] {
  const result: { start: number; end: number }[] = []
  for (const { start, end } of [...stretches].sort((a, b) => a.start - b.start)) {
    const last = result[result.length - 1]
    if (last && start <= last.end) last.end = Math.max(last.end, end)
    else result.push({ start, end })
  }
  return result
}
