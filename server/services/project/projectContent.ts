import type { EntityManager } from 'typeorm'
import { ProjectEntity } from '../../entities/project/ProjectEntity'
import { AppError } from '../../errors'
import type { SignedIn } from '../session/signedIn'

/**
 * Says that the project's content changes with this transaction, and holds its row until the end, so that counts and positions
 * taken in between stay true.
 * @throws AppError `not_found`, the same for another firm's project
 */
export async function touchProject(tx: EntityManager, who: SignedIn, projectId: string): Promise<void> {
  const { affected } = await tx.update(
    ProjectEntity,
    { firmId: who.firmId, id: projectId },
    { contentVersion: () => 'content_version + 1', updatedAt: new Date(), updatedBy: who.personId },
  )
  if (affected !== 1) throw new AppError('not_found')
}
