import type { EntityManager } from 'typeorm'
import { EditionEntity } from '../../entities/rates/EditionEntity'
import { AppError } from '../../errors'
import { hasRole, requireRole, type SignedIn } from '../session/signedIn'

/**
 * An edition that the reader may look into: any of the firm for an estimator, one that was once published for a surveyor. Nobody else
 * sees what rates are made of.
 * @throws AppError `forbidden`, or `not_found`, the same for another firm's
 */
export async function readableEdition(db: EntityManager, who: SignedIn, id: string): Promise<EditionEntity> {
  requireRole(who, 'surveyor', 'estimator')
  const row = await db.findOneBy(EditionEntity, { firmId: who.firmId, id })
  const isFixed = row !== null && row.state !== 'draft' && row.state !== 'checked'
  if (row === null || !(isFixed || hasRole(who, 'estimator'))) throw new AppError('not_found')
  return row
}
