import type { RibbedScheme } from '../contracts/appraisal'
import { crossRibCount, crossRibWidth } from './crossRibCount'
import type { FilledLength, Stretch } from './fillLength'
import { fillLength } from './fillLength'
import type { PanelField } from './panelField'
import type { RowLength } from './rowLengths'
import { rowLengths } from './rowLengths'

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

/** One row laid: its lengths, cross ribs, blocks and fillers. */
export function layRow(field: PanelField, bandStart: number, scheme: RibbedScheme, rules: LayoutRules): LaidRow {
  const band = { start: bandStart, end: bandStart + scheme.block.width }
  const lengths = rowLengths(field, band, scheme.edgeStrip, rules.solidZoneMm)
  const open = lengths.filter(({ usableStart, usableEnd }) => usableEnd > usableStart)
  const usable = open.map(({ usableStart, usableEnd }) => ({ start: usableStart, end: usableEnd }))
  const filled = open.map(({ start, end }, i) => {
    const { start: from, end: to } = usable[i]!
    const count = crossRibCount(scheme, end - start, to - from, rules.crossRibSpacingMm)
    return fillLength(usable[i]!, { count, widthMm: crossRibWidth(scheme) }, scheme)
  })
  return { bandStart, bandEnd: band.end, lengths, usable, filled }
}
