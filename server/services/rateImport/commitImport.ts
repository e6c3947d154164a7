import type { ImportCommit, RateImport } from '#shared/contracts/rateImport'
import { rm } from 'node:fs/promises'
import { In, MoreThan, type EntityManager } from 'typeorm'
import type { RateImportEntity } from '../../entities/rates/RateImportEntity'
import { RateImportRowEntity } from '../../entities/rates/RateImportRowEntity'
import { AppError } from '../../errors'
import { recordEvent } from '../auditLog'
import { recomputeRates } from '../rates/recomputeRates'
import { touchDraft } from '../rates/touchDraft'
import type { SignedIn } from '../session/signedIn'
import { inTransaction } from '../transaction'
import { importAnswers } from './importAnswer'
import type { ImportDesk, Tell } from './importDesk'
import { findImport, takeStep } from './importStep'
import { requireDraft } from './requireDraft'
import { bulkInsert } from './writing/bulkInsert'
import type { DraftKind, DraftWrite, DraftWrites, WrittenRow } from './writing/draftWrite'
import { putRows } from './writing/putWrites'
import { requireAsSeen } from './writing/requireAsSeen'
import { writesOf } from './writing/writesOf'

/** Rows read before others get their turn. */
const READ_AT_ONCE = 1000
const LOG = 'INSERT INTO rate_import_write (firm_id, import_id, kind, target, `before`, version)'

/** Puts the rows in and keeps how they stood. */
async function put<K extends DraftKind>(
  tx: EntityManager,
  { firmId, id }: RateImportEntity,
  kind: K,
  writes: readonly DraftWrite<K>[],
  onRows: (count: number) => void,
): Promise<void> {
  const log = writes.map(({ target, before, after }) => [
    ...[firmId, id, kind, target, before === null ? null : JSON.stringify(before), after.version],
  ])
  await putRows(tx, kind, writes.map(({ after }) => after), onRows) // prettier-ignore
  await bulkInsert(tx, LOG, log)
}

async function putAll(tx: EntityManager, row: RateImportEntity, writes: DraftWrites, tell: Tell): Promise<void> {
  const { resources, quotations, rates } = writes
  const total = resources.length + quotations.length + rates.length
  const share = (done: number) => tell(0.3 + (0.6 * done) / total)
  await put(tx, row, 'resource', resources, share)
  await put(tx, row, 'quotation', quotations, (count) => share(resources.length + count))
  await put(tx, row, 'rate', rates, (count) => share(resources.length + quotations.length + count))
}

/** New and changed rows in the order of the sheet, some at a time. */
async function writtenRows(tx: EntityManager, { firmId, id }: RateImportEntity): Promise<WrittenRow[]> {
  const rows: RateImportRowEntity[] = []
  for (;;) {
    const where = { firmId, importId: id, state: In(['new', 'changed']), row: MoreThan(rows.at(-1)?.row ?? 0) }
    const some = await tx.find(RateImportRowEntity, { where, order: { row: 'ASC' }, take: READ_AT_ONCE })
    for (const row of some) rows.push(row)
    if (some.length < READ_AT_ONCE) return rows
  }
}

/** Everything in one transaction: the rows, what is needed to undo them, the rates that rest on them, the record. */
async function commit(db: EntityManager, who: SignedIn, row: RateImportEntity, tell: Tell): Promise<void> {
  const { firmId, editionId, matching } = row
  const of = { firmId, editionId }
  await inTransaction(db, async (tx) => {
    await touchDraft(tx, who, editionId)
    const rows = await writtenRows(tx, row)
    const target = matching?.target ?? 'resources'
    const writes = await writesOf(tx, of, target, rows)
    requireAsSeen(target, rows, writes)
    tell(0.3)
    await tx.query('DELETE FROM rate_import_write WHERE firm_id = ? AND import_id = ?', [firmId, row.id])
    await putAll(tx, row, writes, tell)
    const moved = await recomputeRates(tx, firmId, editionId)
    const detail = { editionId, importId: row.id, rows: rows.length, target, moved: moved.map(({ item }) => item) }
    await recordEvent(tx, { event: 'edition.imported', firmId, personId: who.personId, detail })
    await takeStep(tx, row, ['committing'], { state: 'committed', progress: 1, moves: moved })
  })
}

/**
 * Begins to put the new and changed rows of a previewed import into its draft, all or none.
 * @throws AppError `not_found`, `conflict`, also where rows are refused and not left out
 */
export async function commitImport(
  db: EntityManager,
  desk: ImportDesk,
  who: SignedIn,
  id: string,
  { leaveOutRefused }: ImportCommit,
): Promise<RateImport> {
  const row = await findImport(db, who, id)
  await requireDraft(db, row)
  const { counts } = row
  if (row.state === 'previewed' && counts !== null) {
    if (counts.refused > 0 && !leaveOutRefused) {
      throw new AppError('conflict', `${counts.refused} rows are refused. Leave them out, or put them right in the file first.`)
    }
    if (counts.new + counts.changed === 0) throw new AppError('conflict', 'There is nothing to put in: no row is new or changed.')
  }
  await takeStep(db, row, ['previewed'], { state: 'committing', progress: 0, failure: null })
  desk.begin(row, 'previewed', async (tell) => {
    await commit(db, who, row, tell)
    await rm(desk.files.rowsPath(id), { force: true })
  })
  return (await importAnswers(db, desk, [await findImport(db, who, id)]))[0]!
}
