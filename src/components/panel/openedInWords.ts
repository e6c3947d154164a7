import type { PlanPanel } from '#shared/drawing/planPanel'
import { toM2 } from '#shared/units'
import { formatQuantity } from '../base/formatQuantity'

/** What an opened panel holds, in one line: '162 blocks in 12 rows, 36 ends to close, 7.02 m² solid'. */
export function openedInWords({ kind, layout, isCounted, isBothWays }: PlanPanel): string {
  if (!isCounted) return 'not counted until it is put right'
  if (kind === 'solid' || layout === null) return isBothWays ? 'spans both ways' : 'spans one way'
  const { edgeStrips, solidZones, crossRibs, trimmers, fillers } = layout.areas
  const solid = formatQuantity(toM2(edgeStrips + solidZones + crossRibs + trimmers + fillers), { decimals: 2 })
  const cut = layout.blocksCut > 0 ? ` and ${formatQuantity(layout.blocksCut)} cut` : ''
  const rows = `${layout.rows.length} ${layout.rows.length === 1 ? 'row' : 'rows'}`
  return `${formatQuantity(layout.blocksWhole)} blocks${cut} in ${rows}, ${formatQuantity(layout.closedEnds)} ends to close, ${solid} m² solid`
}
