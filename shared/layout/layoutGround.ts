import type { Panel, RibbedScheme } from '../contracts/appraisal'
import { type ClearOutline, clearOutline } from './clearOutline'
import { type ClearRow, clearRow } from './laidRow'
import { type PanelField, panelField } from './panelField'
import type { RibLine } from './panelLayout'
import { longestRib, ribLines } from './ribLines'
import { rowBands } from './rowBands'

/** What of a ribbed panel's layout does not depend on how wide its solid zones are. */
export interface LayoutGround {
  readonly clear: ClearOutline
  readonly field: PanelField
  readonly rows: readonly ClearRow[]
  readonly ribLines: readonly RibLine[]
  /** mm; 0 without a row. */
  readonly longestRib: number
}

/**
 * Rows and ribs of a panel before solid zones are laid.
 *
 * Source: project rule, engine design section 2
 * @param rowStarts - starts of the rows' bands in the panel's local frame, mm, where they are not its own (`alignedRows`)
 * @throws OutOfScopeError when the supports leave no clear outline
 */
export function layoutGround(panel: Panel, scheme: RibbedScheme, rowStarts?: readonly number[]): LayoutGround {
  const clear = clearOutline(panel)
  const field = panelField(panel, clear, scheme.trimmerWidth)
  const starts = rowStarts ?? rowBands(field.top - field.bottom, scheme).starts.map((start) => field.bottom + start)
  const rows = starts.map((start) => clearRow(field, start, scheme))
  return { clear, field, rows, ribLines: ribLines(field, rows, scheme), longestRib: longestRib(field, rows, scheme) }
}
