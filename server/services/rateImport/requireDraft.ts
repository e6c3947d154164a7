import type { EntityManager } from 'typeorm'
import { EditionEntity } from '../../entities/rates/EditionEntity'
import { AppError } from '../../errors'
import type { InEdition } from '../rates/buildUpPricesOf'

/** @throws AppError `conflict` when the edition is no draft any more */
export async function requireDraft(db: EntityManager, { firmId, editionId }: InEdition): Promise<void> {
  const { state } = await db.findOneByOrFail(EditionEntity, { firmId, id: editionId })
  if (state !== 'draft') throw new AppError('conflict', `This edition is ${state}. Prices change in a draft only.`)
}
