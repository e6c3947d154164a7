import type { RateImport } from '#shared/contracts/rateImport'
import { MoreThan, type EntityManager } from 'typeorm'
import { QuotationEntity } from '../../entities/rates/QuotationEntity'
import { RateEntity } from '../../entities/rates/RateEntity'
import type { RateImportEntity } from '../../entities/rates/RateImportEntity'
import { RateImportWriteEntity } from '../../entities/rates/RateImportWriteEntity'
import { ResourceEntity } from '../../entities/rates/ResourceEntity'
import { AppError } from '../../errors'
import { recordEvent } from '../auditLog'
import { recomputeRates } from '../rates/recomputeRates'
import { touchDraft } from '../rates/touchDraft'
import type { SignedIn } from '../session/signedIn'
import { inTransaction } from '../transaction'
import { findByCodes } from './checking/standingRows'
import { importAnswers } from './importAnswer'
import type { ImportDesk } from './importDesk'
import { findImport, takeStep } from './importStep'
import type { DraftKind } from './writing/draftWrite'
import { putRows } from './writing/putWrites'
import { removeRows } from './writing/removeRows'
import { named } from './writing/requireAsSeen'
import { restingOnNew } from './writing/restingOnNew'

/** Rows read before others get their turn. */
const READ_AT_ONCE = 1000

type Writes = readonly RateImportWriteEntity[]

const ofKind = (writes: Writes, kind: DraftKind) => writes.filter((write) => write.kind === kind)

/** What was written and stands at another version now, or not at all. */
async function changedSince(tx: EntityManager, of: { firmId: string; editionId: string }, writes: Writes): Promise<string[]> {
  const targets = (kind: DraftKind) => ofKind(writes, kind).map(({ target }) => target)
  const resources = await findByCodes(tx, ResourceEntity, of, 'code', targets('resource'))
  const quotations = await findByCodes(tx, QuotationEntity, of, 'id', targets('quotation'))
  const rates = await findByCodes(tx, RateEntity, of, 'item', targets('rate'))
  const standing = new Map<string, number>([
    ...resources.map((row) => [`resource ${row.code}`, row.version] as const),
    ...quotations.map((row) => [`quotation ${row.id}`, row.version] as const),
    ...rates.map((row) => [`rate ${row.item}`, row.version] as const),
  ])
  const suppliers = new Map(quotations.map((row) => [row.id, `the quotation of ${row.supplier} for ${row.resource}`]))
  return writes
    .filter(({ kind, target, version }) => standing.get(`${kind} ${target}`) !== version)
    .map(({ kind, target }) => (kind === 'quotation' ? (suppliers.get(target) ?? 'a quotation that was removed') : target))
}

/** All that an import wrote, some at a time. */
async function writesOfImport(tx: EntityManager, { firmId, id }: RateImportEntity): Promise<RateImportWriteEntity[]> {
  const writes: RateImportWriteEntity[] = []
  for (const kind of ['resource', 'quotation', 'rate'] as const) {
    for (let last = ''; ;) {
      const where = { firmId, importId: id, kind, target: MoreThan(last) }
      const some = await tx.find(RateImportWriteEntity, { where, order: { target: 'ASC' }, take: READ_AT_ONCE })
      for (const write of some) writes.push(write)
      last = some.at(-1)?.target ?? ''
      if (some.length < READ_AT_ONCE) break
    }
  }
  return writes
}

async function requireUntouched(tx: EntityManager, row: RateImportEntity, writes: Writes): Promise<void> {
  const of = { firmId: row.firmId, editionId: row.editionId }
  const changed = await changedSince(tx, of, writes)
  const resting = changed.length > 0 ? [] : await restingOnNew(tx, of, writes)
  if (changed.length + resting.length === 0) return
  const reason = changed.length > 0 ? `changed since the import: ${named(changed)}` : `in use since the import: ${named(resting)}`
  throw new AppError('conflict', `Nothing was undone, since some rows were ${reason}.`)
}

/** Takes back what was new, and gives the rest its values as they stood, with a version that goes on. */
async function restore(tx: EntityManager, row: RateImportEntity, writes: Writes): Promise<void> {
  for (const kind of ['quotation', 'resource', 'rate'] as const) {
    const own = ofKind(writes, kind)
    await removeRows(tx, kind, row, own.filter(({ before }) => before === null).map(({ target }) => target)) // prettier-ignore
    const standing = own.flatMap(({ before, version }) => (before === null ? [] : [{ ...before, version: version + 1 }]))
    await putRows(tx, kind, standing as never)
  }
}

/**
 * Undoes an import while its edition is a draft: every row is as it was.
 * @throws AppError `not_found`, `conflict` that names rows changed or used since; then nothing is undone
 */
export async function undoImport(db: EntityManager, desk: ImportDesk, who: SignedIn, id: string): Promise<RateImport> {
  const row = await findImport(db, who, id)
  const { firmId, editionId } = row
  await inTransaction(db, async (tx) => {
    await touchDraft(tx, who, editionId)
    await takeStep(tx, row, ['committed'], { state: 'undone', failure: null, moves: null })
    const writes = await writesOfImport(tx, row)
    await requireUntouched(tx, row, writes)
    await restore(tx, row, writes)
    const moved = await recomputeRates(tx, firmId, editionId)
    const detail = { editionId, importId: id, rows: writes.length, moved: moved.map(({ item }) => item) }
    await recordEvent(tx, { event: 'edition.importUndone', firmId, personId: who.personId, detail })
  })
  return (await importAnswers(db, desk, [await findImport(db, who, id)]))[0]!
}
