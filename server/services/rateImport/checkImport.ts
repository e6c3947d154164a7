import type { ImportCounts, ImportMatching } from '#shared/contracts/rateImport'
import type { RateMove } from '#shared/contracts/resource'
import { existsSync } from 'node:fs'
import type { EntityManager } from 'typeorm'
import type { RateImportEntity } from '../../entities/rates/RateImportEntity'
import { AppError } from '../../errors'
import { toPriced } from '../rates/buildUpPricesOf'
import { movesWith } from '../rates/rateMoves'
import { inTransaction } from '../transaction'
import type { CheckedRow } from './checking/checkedRow'
import { checkRows } from './checking/checkRows'
import type { Tell } from './importDesk'
import { takeStep } from './importStep'
import { bulkInsert, type SqlValue } from './writing/bulkInsert'
import { writesOf } from './writing/writesOf'

const INSERT =
  'INSERT INTO rate_import_row (firm_id, import_id, `row_number`, state, code, `before`, after, reason, note, quotation_id, seen_version)'
const REMOVED_AT_ONCE = 5000

const json = (value: object | null): string | null => (value === null ? null : JSON.stringify(value))

function countsOf(rows: readonly CheckedRow[], leftOut: number): ImportCounts {
  const counts = { new: 0, changed: 0, unchanged: 0, refused: 0, leftOut }
  for (const { state } of rows) counts[state] += 1
  return counts
}

/** Which built-up rates the rows would move. */
async function movesOf(
  db: EntityManager,
  of: { firmId: string; editionId: string },
  { target }: ImportMatching,
  rows: readonly CheckedRow[],
): Promise<RateMove[]> {
  const written = rows.filter(({ state }) => state === 'new' || state === 'changed')
  if (target === 'rates' || written.length === 0) return []
  const { resources } = await writesOf(db, of, target, written)
  return await movesWith(db, of, { resources: new Map(resources.map(({ target: code, after }) => [code, toPriced(after)])) })
}

/** Removes the rows of an earlier preview, some thousand at a time. */
async function removeRows(tx: EntityManager, { firmId, id }: RateImportEntity): Promise<void> {
  for (;;) {
    const statement = 'DELETE FROM rate_import_row WHERE firm_id = ? AND import_id = ? LIMIT ?'
    const { affectedRows } = await tx.query<{ affectedRows: number }>(statement, [firmId, id, REMOVED_AT_ONCE])
    if (affectedRows < REMOVED_AT_ONCE) return
  }
}

/**
 * Checks every row of an import and keeps what it found for the preview. The import must be in the state `checking`.
 * @throws AppError `conflict` when the rows are not there any more
 */
export async function checkImport(
  db: EntityManager,
  row: RateImportEntity,
  matching: ImportMatching,
  rowsPath: string,
  tell: Tell,
): Promise<void> {
  const { firmId, id, editionId } = row
  if (!existsSync(rowsPath)) throw new AppError('conflict', 'The rows of this file are not kept any longer. Send the file again.')
  const { rows, leftOut } = await checkRows(db, { firmId, editionId }, rowsPath, matching, row.fileName)
  tell(0.5)
  const moves = await movesOf(db, { firmId, editionId }, matching, rows)
  const kept = rows.map(({ row: number, state, code, before, after, reason, note, quotationId, seenVersion }): SqlValue[] => [
    ...[firmId, id, number, state, code.slice(0, 200), json(before), json(after)],
    ...[reason, note, quotationId, seenVersion],
  ])
  await inTransaction(db, async (tx) => {
    await removeRows(tx, row)
    await bulkInsert(tx, INSERT, kept, '', (count) => tell(0.5 + (0.5 * count) / kept.length))
    await takeStep(tx, row, ['checking'], { state: 'previewed', progress: 1, counts: countsOf(rows, leftOut), moves })
  })
}
