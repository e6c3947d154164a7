import type { DraftInput, Edition, EditionInput } from '#shared/contracts/rateBook'
import type { EntityManager } from 'typeorm'
import { v7 } from 'uuid'
import { EditionEditorEntity } from '../../entities/rates/EditionEditorEntity'
import { EditionEntity } from '../../entities/rates/EditionEntity'
import { GangEntity } from '../../entities/rates/GangEntity'
import { QuotationEntity } from '../../entities/rates/QuotationEntity'
import { RateBookEntity } from '../../entities/rates/RateBookEntity'
import { RateEntity } from '../../entities/rates/RateEntity'
import { ResourceEntity } from '../../entities/rates/ResourceEntity'
import { AppError, refuse } from '../../errors'
import { recordEvent } from '../auditLog'
import { createOnce, type CreatingRequest } from '../createOnce'
import { requireRole, type SignedIn } from '../session/signedIn'
import { inTransaction } from '../transaction'
import { copyEdition } from './copyEdition'
import { requireOneEdition } from './editionService'
import { touchDraft } from './touchDraft'

/** The edition that a draft begins from: of the firm, in the same money; put right only what was published, in its own book. */
async function sourceOf(
  tx: EntityManager,
  book: RateBookEntity,
  { from, isCorrection }: DraftInput,
): Promise<EditionEntity | null> {
  if (from === null) return null
  const source = await tx.findOneBy(EditionEntity, { firmId: book.firmId, id: from })
  const home = source && (await tx.findOneBy(RateBookEntity, { firmId: book.firmId, id: source.bookId }))
  if (!source || home?.currency !== book.currency) throw refuse('from', `expected an edition of the firm in ${book.currency}`)
  if (isCorrection && (source.bookId !== book.id || source.state === 'draft' || source.state === 'checked'))
    throw refuse('from', 'expected an edition of this book that was published')
  return source
}

/**
 * A new draft with the next number of its book. Its maker counts as its compiler and may not check it.
 * @throws AppError `forbidden`, `not_found`, `invalid_request` for an edition that cannot be copied
 */
export async function createDraft(
  db: EntityManager,
  who: SignedIn,
  bookId: string,
  input: DraftInput,
  request: CreatingRequest,
): Promise<Edition> {
  requireRole(who, 'estimator')
  const { firmId, personId } = who
  return await createOnce(db, who, request, async (tx) => {
    const book = await tx.findOne(RateBookEntity, { where: { firmId, id: bookId }, lock: { mode: 'pessimistic_write' } })
    if (book === null) throw new AppError('not_found')
    const source = await sourceOf(tx, book, input)
    const last = await tx.maximum(EditionEntity, 'number', { firmId, bookId })
    const id = v7()
    await tx.insert(EditionEntity, {
      ...{ ...input.particulars, firmId, id, bookId, number: (last ?? 0) + 1, state: 'draft', compiledBy: who.name },
      ...{ checkedBy: null, reason: input.reason, corrects: input.isCorrection && source ? source.number : null },
    })
    await tx.insert(EditionEditorEntity, { firmId, editionId: id, personId })
    if (source) await copyEdition(tx, { firmId, from: source.id, to: id })
    await recordEvent(tx, { event: 'edition.begun', firmId, personId, detail: { editionId: id, bookId, from: input.from } })
    return await requireOneEdition(tx, who, id)
  })
}

/** Rates made for overheads in them, in an edition that leaves them to projects, would count them twice. */
async function requireNoneBuiltIn(tx: EntityManager, who: SignedIn, editionId: string): Promise<void> {
  const rates = await tx.findBy(RateEntity, { firmId: who.firmId, editionId })
  const holding = rates.filter(({ buildUp }) => buildUp && Number(buildUp.overheadsPercent) + Number(buildUp.profitPercent) > 0)
  if (holding.length === 0) return
  const items = holding.map(({ item }) => item).join(', ')
  throw refuse('holdsOverheads', `expected no overheads or profit in the build-ups of ${items}`)
}

/** Changes what a compiler states of a draft. @throws AppError `forbidden`, `not_found`, `stale`, `conflict` for no draft */
export async function changeEdition(
  db: EntityManager,
  who: SignedIn,
  id: string,
  version: number,
  input: EditionInput,
): Promise<Edition> {
  requireRole(who, 'estimator')
  return await inTransaction(db, async (tx) => {
    await touchDraft(tx, who, id, version)
    if (!input.holdsOverheads) await requireNoneBuiltIn(tx, who, id)
    await tx.update(EditionEntity, { firmId: who.firmId, id }, input)
    return await requireOneEdition(tx, who, id)
  })
}

/** Throws a draft away with all that is in it. @throws AppError `forbidden`, `not_found`, `stale`, `conflict` for no draft */
export async function discardDraft(db: EntityManager, who: SignedIn, id: string, version: number): Promise<void> {
  requireRole(who, 'estimator')
  const { firmId, personId } = who
  await inTransaction(db, async (tx) => {
    await touchDraft(tx, who, id, version)
    for (const held of [RateEntity, QuotationEntity, GangEntity, ResourceEntity]) await tx.delete(held, { firmId, editionId: id })
    await tx.delete(EditionEntity, { firmId, id })
    await recordEvent(tx, { event: 'edition.discarded', firmId, personId, detail: { editionId: id } })
  })
}
