import type { EntityManager } from 'typeorm'
import { EditionEditorEntity } from '../../entities/rates/EditionEditorEntity'
import { EditionEntity } from '../../entities/rates/EditionEntity'
import { AppError } from '../../errors'
import { requireRole, type SignedIn } from '../session/signedIn'

/**
 * Says that an estimator changes a draft with this transaction: holds its row until the end and raises its version, so that nobody
 * checks what they have not seen, and notes who it was, since nobody checks work of their own.
 * @param seen - version of the edition that the change rests on; absent: of what is in it, which has a version of its own
 * @throws AppError `forbidden`, `not_found`, the same for another firm's, `conflict` when the edition is no draft, `stale`
 */
export async function touchDraft(tx: EntityManager, who: SignedIn, editionId: string, seen?: number): Promise<void> {
  requireRole(who, 'estimator')
  const { firmId, personId } = who
  const edition = await tx.findOne(EditionEntity, { where: { firmId, id: editionId }, lock: { mode: 'pessimistic_write' } })
  if (edition === null) throw new AppError('not_found')
  if (edition.state !== 'draft') {
    throw new AppError('conflict', `This edition is ${edition.state}. Prices change in a draft only; begin a new edition.`)
  }
  if (seen !== undefined && seen !== edition.version) throw new AppError('stale')
  await tx.increment(EditionEntity, { firmId, id: editionId }, 'version', 1)
  await tx.upsert(EditionEditorEntity, { firmId, editionId, personId }, ['firmId', 'editionId', 'personId'])
}
