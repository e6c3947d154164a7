/** Columns of the panel table that are typed. */
export const PANEL_COLUMNS = ['mark', 'alongX', 'alongY', 'ribs', 'void', 'times'] as const
export type PanelColumn = (typeof PANEL_COLUMNS)[number]

/** A row of the panel table as it stands in its cells, typed or pasted, right or wrong. */
export type PanelRowText = Readonly<Record<PanelColumn, string>>

/** Why a cell cannot be counted, and the likely repair where one can be guessed: both in words for the screen. */
export interface CellProblem {
  readonly column: PanelColumn
  readonly reason: string
  readonly repair?: string
}

/** Cell texts of a row not yet begun. */
export const EMPTY_ROW: PanelRowText = { mark: '', alongX: '', alongY: '', ribs: '', void: '', times: '' }
