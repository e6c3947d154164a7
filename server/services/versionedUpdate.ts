import type { EntityManager, EntityTarget, FindOptionsWhere, ObjectLiteral, UpdateResult } from 'typeorm'
import type { QueryDeepPartialEntity } from 'typeorm/query-builder/QueryPartialEntity.js'
import { AppError } from '../errors'

interface Versioned extends ObjectLiteral {
  firmId: string
  version: number
}

async function rethrowMiss<T extends Versioned>(
  tx: EntityManager,
  entity: EntityTarget<T>,
  row: FindOptionsWhere<T>,
): Promise<never> {
  throw new AppError((await tx.existsBy(entity, row)) ? 'stale' : 'not_found')
}

/**
 * Changes the row `row` (a firm's, by its key) where it still has `version`, and raises its version by one.
 * @throws AppError `not_found` when there is no such row, `stale` when it has another version
 */
export async function updateVersioned<T extends Versioned>(
  tx: EntityManager,
  entity: EntityTarget<T>,
  row: FindOptionsWhere<T> & { firmId: string },
  version: number,
  change: QueryDeepPartialEntity<T>,
): Promise<void> {
  const next = { ...change, version: () => 'version + 1' } as QueryDeepPartialEntity<T>
  const { affected }: UpdateResult = await tx.update(entity, { ...row, version }, next)
  if (affected !== 1) await rethrowMiss(tx, entity, row)
}

/** Removes the row where it still has `version`. @throws AppError `not_found` or `stale` */
export async function deleteVersioned<T extends Versioned>(
  tx: EntityManager,
  entity: EntityTarget<T>,
  row: FindOptionsWhere<T> & { firmId: string },
  version: number,
): Promise<void> {
  const { affected } = await tx.delete(entity, { ...row, version })
  if (affected !== 1) await rethrowMiss(tx, entity, row)
}
