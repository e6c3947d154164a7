import type { Edition, EditionState, EditionWithRates, RateBook } from '#shared/contracts/rateBook'
import { In, type EntityManager } from 'typeorm'
import { EditionEditorEntity } from '../../entities/rates/EditionEditorEntity'
import { EditionEntity } from '../../entities/rates/EditionEntity'
import { RateBookEntity } from '../../entities/rates/RateBookEntity'
import { RateEntity } from '../../entities/rates/RateEntity'
import { AppError } from '../../errors'
import { hasRole, requireRole, type SignedIn } from '../session/signedIn'
import { blockRatesOf } from './blockRates'
import { toRate } from './rateRow'

/** States of an edition that has once been published: it is fixed, and every surveyor may read it. */
const FIXED: readonly EditionState[] = ['published', 'superseded', 'withdrawn']

const readableStates = (who: SignedIn): readonly EditionState[] =>
  hasRole(who, 'estimator') ? ['draft', 'checked', ...FIXED] : FIXED

/** Ids of the editions, of those asked for, that somebody compiled or changed. */
async function ownWork(
  db: EntityManager,
  who: Pick<SignedIn, 'firmId' | 'personId'>,
  ids: readonly string[],
): Promise<Set<string>> {
  const { firmId, personId } = who
  const rows = ids.length === 0 ? [] : await db.findBy(EditionEditorEntity, { firmId, personId, editionId: In([...ids]) })
  return new Set(rows.map(({ editionId }) => editionId))
}

function toEdition(row: EditionEntity, { region, currency }: RateBookEntity, isOwnWork: boolean): Edition {
  const { id, bookId, number, state, baseDate, validUntil, compiledBy, checkedBy, taxBasis, note } = row
  const { holdsOverheads, reason, corrects, stateReason, version } = row
  const facts = { baseDate, validUntil, compiledBy, checkedBy, taxBasis, note, holdsOverheads, reason, corrects, stateReason }
  return { id, bookId, region, currency, number, state, ...facts, isOwnWork, version }
}

/** The firm's rate books in the order of their regions, each with the editions the reader may see, newest first. */
export async function listRateBooks(db: EntityManager, who: SignedIn): Promise<RateBook[]> {
  requireRole(who, 'surveyor', 'estimator')
  const books = await db.find(RateBookEntity, { where: { firmId: who.firmId }, order: { region: 'ASC' }, take: 200 })
  const editions = await db.find(EditionEntity, {
    where: { firmId: who.firmId, state: In([...readableStates(who)]) },
    order: { number: 'DESC' },
    take: 2000,
  })
  const own = await ownWork(
    db,
    who,
    editions.map(({ id }) => id),
  )
  return books.map((book) => ({
    id: book.id,
    region: book.region,
    currency: book.currency,
    editions: editions.filter(({ bookId }) => bookId === book.id).map((row) => toEdition(row, book, own.has(row.id))),
  }))
}

/**
 * An edition of the firm with its rates in the order of their items; null when the firm has none such.
 * @param personId - whose own work it may be; absent: nobody asks
 */
export async function findEdition(
  db: EntityManager,
  firmId: string,
  id: string,
  personId?: string,
): Promise<EditionWithRates | null> {
  const row = await db.findOneBy(EditionEntity, { firmId, id })
  if (row === null) return null
  const book = await db.findOneByOrFail(RateBookEntity, { firmId, id: row.bookId })
  const rates = await db.find(RateEntity, { where: { firmId, editionId: id }, order: { item: 'ASC' } })
  const own = personId === undefined ? new Set() : await ownWork(db, { firmId, personId }, [id])
  const blockRates = await blockRatesOf(db, { firmId, editionId: id }, rates, book.currency)
  return { ...toEdition(row, book, own.has(id)), rates: rates.map(toRate), blockRates }
}

/** An edition without its rates, as a person sees it. @throws AppError `not_found` */
export async function requireOneEdition(db: EntityManager, { firmId, personId }: SignedIn, id: string): Promise<Edition> {
  const row = await db.findOneBy(EditionEntity, { firmId, id })
  if (row === null) throw new AppError('not_found')
  const book = await db.findOneByOrFail(RateBookEntity, { firmId, id: row.bookId })
  const own = await ownWork(db, { firmId, personId }, [id])
  return toEdition(row, book, own.has(id))
}

/** @throws AppError `not_found`, also for a draft when the reader is no estimator */
export async function readEdition(db: EntityManager, who: SignedIn, id: string): Promise<EditionWithRates> {
  requireRole(who, 'surveyor', 'estimator')
  const edition = await findEdition(db, who.firmId, id, who.personId)
  if (edition === null || !readableStates(who).includes(edition.state)) throw new AppError('not_found')
  return edition
}
