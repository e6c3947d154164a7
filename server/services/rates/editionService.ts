import type { CatalogueBlock } from '#shared/contracts/blockCatalogue'
import type { Edition, EditionState, EditionWithRates, Rate, RateBook } from '#shared/contracts/rateBook'
import { In, type EntityManager } from 'typeorm'
import { BlockEntity } from '../../entities/rates/BlockEntity'
import { EditionEntity } from '../../entities/rates/EditionEntity'
import { RateBookEntity } from '../../entities/rates/RateBookEntity'
import { RateEntity } from '../../entities/rates/RateEntity'
import { AppError } from '../../errors'
import { plainDecimal } from '../decimalText'
import { hasRole, requireRole, type SignedIn } from '../session/signedIn'

/** States of an edition that has once been published: it is fixed, and every surveyor may read it. */
const FIXED: readonly EditionState[] = ['published', 'superseded', 'withdrawn']

const readableStates = (who: SignedIn): readonly EditionState[] =>
  hasRole(who, 'estimator') ? ['draft', 'checked', ...FIXED] : FIXED

function toEdition(row: EditionEntity, { region, currency }: RateBookEntity): Edition {
  const { id, bookId, number, state, baseDate, validUntil, compiledBy, checkedBy, taxBasis, note, version } = row
  return { id, bookId, region, currency, number, state, baseDate, validUntil, compiledBy, checkedBy, taxBasis, note, version }
}

function toRate({ item, description, unit, low, likely, high, source }: RateEntity): Rate {
  return { item, description, unit, low: plainDecimal(low), likely: plainDecimal(likely), high: plainDecimal(high), source }
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
  return books.map((book) => ({
    id: book.id,
    region: book.region,
    currency: book.currency,
    editions: editions.filter(({ bookId }) => bookId === book.id).map((row) => toEdition(row, book)),
  }))
}

/** An edition of the firm with its rates in the order of their items; null when the firm has none such. */
export async function findEdition(db: EntityManager, firmId: string, id: string): Promise<EditionWithRates | null> {
  const row = await db.findOneBy(EditionEntity, { firmId, id })
  if (row === null) return null
  const book = await db.findOneByOrFail(RateBookEntity, { firmId, id: row.bookId })
  const rates = await db.find(RateEntity, { where: { firmId, editionId: id }, order: { item: 'ASC' } })
  return { ...toEdition(row, book), rates: rates.map(toRate) }
}

/** @throws AppError `not_found`, also for a draft when the reader is no estimator */
export async function readEdition(db: EntityManager, who: SignedIn, id: string): Promise<EditionWithRates> {
  requireRole(who, 'surveyor', 'estimator')
  const edition = await findEdition(db, who.firmId, id)
  if (edition === null || !readableStates(who).includes(edition.state)) throw new AppError('not_found')
  return edition
}

/** The firm's block catalogue in the order of its codes. */
export async function listBlocks(db: EntityManager, who: SignedIn): Promise<CatalogueBlock[]> {
  requireRole(who, 'surveyor', 'estimator')
  const rows = await db.find(BlockEntity, { where: { firmId: who.firmId }, order: { code: 'ASC' }, take: 1000 })
  return rows.map(({ id, code, name, material, length, width, height, mass, supplier, palletCount, breakagePercent }) => ({
    id,
    code,
    name,
    material,
    length,
    width,
    height,
    mass,
    supplier,
    palletCount,
    breakagePercent: plainDecimal(breakagePercent),
  }))
}
