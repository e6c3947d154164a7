import type { RibbedScheme } from '../contracts/appraisal'
import { crossRibCount, crossRibWidth } from './crossRibCount'
import type { FilledLength, Stretch } from './fillLength'
import { fillLength } from './fillLength'
import type { PanelField } from './panelField'
import type { ClearLength, RowLength } from './rowLengths'
import { clearLengths, lessSolidZones } from './rowLengths'

/** A row with all that lies in its band. Local frame, mm. */
export interface LaidRow {
  readonly bandStart: number
  readonly bandEnd: number
  readonly lengths: readonly RowLength[]
  /** Usable lengths that are left between solid zones. */
  readonly usable: readonly Stretch[]
  /** One for each usable length. */
  readonly filled: readonly FilledLength[]
}

/** Rules of the layout that do not stand in the scheme. */
export interface LayoutRules {
  readonly solidZoneMm: number
  readonly crossRibSpacingMm: number | null
}

/** A row before solid zones: where its band starts, and its lengths. */
export interface ClearRow {
  readonly bandStart: number
  readonly lengths: readonly ClearLength[]
}

/** The row whose band starts at a height. */
export function clearRow(field: PanelField, bandStart: number, { block, edgeStrip }: RibbedScheme): ClearRow {
  return { bandStart, lengths: clearLengths(field, { start: bandStart, end: bandStart + block.width }, edgeStrip) }
}

/** One row laid: its lengths, cross ribs, blocks and fillers. */
export function layRow({ bandStart, lengths: clear }: ClearRow, scheme: RibbedScheme, rules: LayoutRules): LaidRow {
  const lengths = clear.map((each) => lessSolidZones(each, rules.solidZoneMm))
  const open = lengths.filter(({ usableStart, usableEnd }) => usableEnd > usableStart)
  const usable = open.map(({ usableStart, usableEnd }) => ({ start: usableStart, end: usableEnd }))
  const filled = open.map(({ start, end }, i) => {
    const { start: from, end: to } = usable[i]!
    const count = crossRibCount(scheme, end - start, to - from, rules.crossRibSpacingMm)
    return fillLength(usable[i]!, { count, widthMm: crossRibWidth(scheme) }, scheme)
  })
  return { bandStart, bandEnd: bandStart + scheme.block.width, lengths, usable, filled }
}
