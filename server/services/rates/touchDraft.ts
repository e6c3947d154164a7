import type { EntityManager } from 'typeorm'
import { EditionEditorEntity } from '../../entities/rates/EditionEditorEntity'
import { EditionEntity } from '../../entities/rates/EditionEntity'
import { AppError } from '../../errors'
import { requireRole, type SignedIn } from '../session/signedIn'

/**
 * Says that an estimator changes a draft with this transaction: holds its row until the end, so that checking and editing cannot cross,
 * and notes who it was, since nobody checks work of their own.
 * @throws AppError `forbidden`, `not_found`, the same for another firm's, `conflict` when the edition is no draft
 */
export async function touchDraft(tx: EntityManager, who: SignedIn, editionId: string): Promise<void> {
  requireRole(who, 'estimator')
  const { firmId, personId } = who
  const edition = await tx.findOne(EditionEntity, { where: { firmId, id: editionId }, lock: { mode: 'pessimistic_write' } })
  if (edition === null) throw new AppError('not_found')
  if (edition.state !== 'draft') {
    throw new AppError('conflict', `This edition is ${edition.state}. Prices change in a draft only; begin a new edition.`)
  }
  await tx.upsert(EditionEditorEntity, { firmId, editionId, personId }, ['firmId', 'editionId', 'personId'])
}
