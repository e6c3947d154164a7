import type { ImportRowState } from '#shared/contracts/rateImport'

/** What a row would write, by column; a null of the database is ''. */
export type RowValues = Record<string, string>

/** A row of the preview, ready to be kept. */
export interface CheckedRow {
  readonly row: number
  readonly state: ImportRowState
  readonly code: string
  readonly before: RowValues | null
  readonly after: RowValues | null
  readonly reason: string | null
  readonly note: string | null
  readonly quotationId: string | null
  readonly seenVersion: number | null
}

/** What stands already: its values, and the version they have. */
export interface Standing {
  readonly values: RowValues
  readonly version: number
  readonly quotationId?: string
}

/** A row that is taken: new, changed, or unchanged against what stands. */
export function takenRow(
  row: { readonly row: number; readonly code: string; readonly notes: readonly string[] },
  after: RowValues,
  standing: Standing | undefined,
): CheckedRow {
  const isSame = standing !== undefined && Object.entries(after).every(([name, value]) => standing.values[name] === value)
  return {
    row: row.row,
    state: standing === undefined ? 'new' : isSame ? 'unchanged' : 'changed',
    code: row.code,
    before: standing?.values ?? null,
    after,
    reason: null,
    note: row.notes.length === 0 ? null : row.notes.join('; ').slice(0, 200),
    quotationId: standing?.quotationId ?? null,
    seenVersion: standing?.version ?? null,
  }
}

/** A row that is not taken, and why. */
export const refusedRow = (row: number, code: string, reason: string): CheckedRow => ({
  ...{ row, code: code.slice(0, 200), state: 'refused', before: null, after: null },
  ...{ reason: reason.slice(0, 500), note: null, quotationId: null, seenVersion: null },
})
