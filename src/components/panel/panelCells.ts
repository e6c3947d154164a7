import type { Panel } from '#shared/contracts/appraisal'
import type { PanelColumn, PanelRowText } from '#shared/layout/edit/panelRowText'
import { ribDirectionText } from '#shared/layout/edit/readRibDirection'
import { voidText } from '#shared/layout/edit/readVoid'
import { boxLengths, isRectangle } from '#shared/layout/edit/rectangle'
import { formatQuantity } from '../base/formatQuantity'

/** Heads of the typed columns; `spoken` names a cell to those who hear it. */
export const COLUMN_HEADS: Readonly<
  Record<PanelColumn, { readonly head: string; readonly unit?: string; readonly spoken: string }>
> = {
  mark: { head: 'Mark', spoken: 'mark' },
  alongX: { head: 'Along x', unit: 'mm', spoken: 'along x, mm' },
  alongY: { head: 'Along y', unit: 'mm', spoken: 'along y, mm' },
  ribs: { head: 'Ribs', unit: 'run', spoken: 'ribs run' },
  void: { head: 'Void', unit: 'mm', spoken: 'void, mm' },
  times: { head: 'Times', spoken: 'times' },
}

/** What a panel's cells say at rest. */
export function panelRowText(panel: Panel): PanelRowText {
  const [alongX, alongY] = boxLengths(panel.outline)
  return {
    mark: panel.mark,
    alongX: formatQuantity(alongX, { decimals: Number.isInteger(alongX) ? 0 : 1 }),
    alongY: formatQuantity(alongY, { decimals: Number.isInteger(alongY) ? 0 : 1 }),
    ribs: ribDirectionText(panel.ribDirection),
    void: voidText(panel.voids),
    times: String(panel.repeat),
  }
}

/** Columns that are worked out and not typed here: lengths of a panel by points, voids that are no single rectangle. */
export function workedOutColumns(panel: Panel): readonly PanelColumn[] {
  const lengths: PanelColumn[] = isRectangle(panel) ? [] : ['alongX', 'alongY']
  const isPlainVoid = panel.voids.length === 0 || (panel.voids.length === 1 && isRectangle({ outline: panel.voids[0]! }))
  return isPlainVoid ? lengths : [...lengths, 'void']
}
