import type { EntityManager, EntityTarget, FindOptionsWhere, ObjectLiteral } from 'typeorm'
import { refuse } from '../../errors'

interface Placed extends ObjectLiteral {
  position: number
}

/** Position after the last of these rows. @throws AppError `invalid_request` when there are `most` of them already */
export async function nextPosition<T extends Placed>(
  tx: EntityManager,
  entity: EntityTarget<T>,
  of: FindOptionsWhere<T>,
  most: number,
): Promise<number> {
  if ((await tx.countBy(entity, of)) >= most) throw refuse('', `expected at most ${most} in one project`)
  return ((await tx.maximum(entity, 'position' as never, of)) ?? -1) + 1
}
