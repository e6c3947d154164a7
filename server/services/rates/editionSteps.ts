import type { Edition, EditionState, EditionStep } from '#shared/contracts/rateBook'
import type { EntityManager } from 'typeorm'
import { EditionEditorEntity } from '../../entities/rates/EditionEditorEntity'
import { EditionEntity } from '../../entities/rates/EditionEntity'
import { RateBookEntity } from '../../entities/rates/RateBookEntity'
import { RateEntity } from '../../entities/rates/RateEntity'
import { AppError } from '../../errors'
import { recordEvent } from '../auditLog'
import { requireRole, type SignedIn } from '../session/signedIn'
import { inTransaction } from '../transaction'
import { updateVersioned } from '../versionedUpdate'
import { requireOneEdition } from './editionService'

/** States that each step may be taken from. */
const FROM = {
  check: ['draft'],
  return: ['checked'],
  publish: ['checked'],
  withdraw: ['published', 'superseded'],
} as const satisfies Record<EditionStep['step'], readonly EditionState[]>

const TO = { check: 'checked', return: 'draft', publish: 'published', withdraw: 'withdrawn' } as const satisfies Record<
  EditionStep['step'],
  EditionState
>

/** Nobody checks or publishes work of their own. */
async function requireOther(tx: EntityManager, { firmId, personId }: SignedIn, editionId: string): Promise<void> {
  if (await tx.existsBy(EditionEditorEntity, { firmId, editionId, personId }))
    throw new AppError('conflict', 'You compiled this edition or changed a price in it: somebody else must check and publish it.')
}

/** An edition is checked once every rate has a price and says where it comes from. */
async function requireSources(tx: EntityManager, firmId: string, editionId: string): Promise<void> {
  const rates = await tx.findBy(RateEntity, { firmId, editionId })
  if (rates.length === 0) throw new AppError('conflict', 'This edition has no rate yet.')
  const without = rates.filter(({ source, buildUp }) => source === '' && buildUp === null).map(({ item }) => item)
  if (without.length > 0) throw new AppError('conflict', `These rates do not say where they come from: ${without.join(', ')}.`)
}

/** The edition that was published before gives way, under a lock on the book, so that one is published at a time. */
async function supersede(tx: EntityManager, { firmId, bookId, number }: EditionEntity): Promise<void> {
  await tx.findOneOrFail(RateBookEntity, { where: { firmId, id: bookId }, lock: { mode: 'pessimistic_write' } })
  const before = await tx.findOne(EditionEntity, {
    where: { firmId, bookId, state: 'published' },
    lock: { mode: 'pessimistic_write' },
  })
  if (before === null) return
  if (before.number > number)
    throw new AppError('conflict', `Edition ${before.number} is published already. Begin a new edition from this one.`)
  await updateVersioned(tx, EditionEntity, { firmId, id: before.id }, before.version, { state: 'superseded' })
}

/**
 * Takes a step in the life of an edition as it was seen. Checking and publishing are for an estimator who neither compiled it nor
 * changed anything in it; publishing supersedes the edition before.
 * @throws AppError `forbidden`, `not_found`, `stale`, `conflict` saying what stands against it
 */
export async function takeStep(
  db: EntityManager,
  who: SignedIn,
  id: string,
  version: number,
  { step, reason }: EditionStep,
): Promise<Edition> {
  requireRole(who, 'estimator')
  const { firmId, personId } = who
  return await inTransaction(db, async (tx) => {
    const row = await tx.findOne(EditionEntity, { where: { firmId, id }, lock: { mode: 'pessimistic_write' } })
    if (row === null) throw new AppError('not_found')
    if (row.version !== version) throw new AppError('stale')
    const from: readonly EditionState[] = FROM[step]
    if (!from.includes(row.state)) throw new AppError('conflict', `This edition is ${row.state}; expected ${from.join(' or ')}.`)
    if (step === 'check' || step === 'publish') await requireOther(tx, who, id)
    if (step === 'check') await requireSources(tx, firmId, id)
    if (step === 'publish') await supersede(tx, row)
    const checkedBy = { check: who.name, return: null, publish: row.checkedBy, withdraw: row.checkedBy }[step]
    const stateReason = step === 'return' || step === 'withdraw' ? reason : ''
    const change = step === 'withdraw' ? { state: TO[step], stateReason } : { state: TO[step], stateReason, checkedBy }
    await updateVersioned(tx, EditionEntity, { firmId, id }, version, change)
    await recordEvent(tx, { event: 'edition.stepped', firmId, personId, detail: { editionId: id, step, reason } })
    return await requireOneEdition(tx, who, id)
  })
}
