import { type Expression, figure } from './expression'
import type { MeasuredPanel } from './measuredPanel'

/** Number of whole blocks, cut blocks or closed ends of one panel as laid; null where there are none. */
export function blockCount(
  { sized: { layout } }: MeasuredPanel,
  of: 'blocksWhole' | 'blocksCut' | 'closedEnds',
): Expression | null {
  const count = layout?.[of] ?? 0
  return count > 0 ? figure(count) : null
}
