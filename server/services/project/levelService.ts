import type { LevelInput, StoredLevel } from '#shared/contracts/project'
import type { EntityManager } from 'typeorm'
import { v7 } from 'uuid'
import { LevelEntity } from '../../entities/project/LevelEntity'
import { AppError } from '../../errors'
import { createOnce, type CreatingRequest } from '../createOnce'
import { requireRole, type SignedIn } from '../session/signedIn'
import { duplicateIndex, inTransaction } from '../transaction'
import { deleteVersioned, updateVersioned } from '../versionedUpdate'
import { requireSoundFloor } from './floorCheck'
import { nextPosition } from './nextPosition'
import { touchProject } from './projectContent'
import { toStoredLevel } from './projectRows'

const MOST_LEVELS = 100

function rethrowDuplicate(error: unknown): never {
  if (duplicateIndex(error) !== 'uq_level_mark') throw error
  throw new AppError('conflict', undefined, [{ path: 'mark', message: 'another level of the project has this mark' }])
}

async function readLevel(tx: EntityManager, firmId: string, id: string): Promise<StoredLevel> {
  return toStoredLevel(await tx.findOneByOrFail(LevelEntity, { firmId, id }))
}

/** @throws AppError `not_found`, `conflict` when the mark is taken, `invalid_request` for a floor that cannot be, or the 101st level */
export async function createLevel(
  db: EntityManager,
  who: SignedIn,
  projectId: string,
  input: LevelInput,
  request: CreatingRequest,
): Promise<StoredLevel> {
  requireRole(who, 'surveyor')
  requireSoundFloor(input)
  return await createOnce(db, who, request, async (tx) => {
    await touchProject(tx, who, projectId)
    const position = await nextPosition(tx, LevelEntity, { firmId: who.firmId, projectId }, MOST_LEVELS)
    const row = { ...input, firmId: who.firmId, id: v7(), projectId, position }
    await tx.insert(LevelEntity, row).catch(rethrowDuplicate)
    return await readLevel(tx, who.firmId, row.id)
  })
}

/** Where a level is: in which project, by which id. */
export interface LevelPlace {
  readonly projectId: string
  readonly id: string
}

/** @throws AppError `not_found`, `stale`, `conflict` when the mark is taken, `invalid_request` for a floor that cannot be */
export async function changeLevel(
  db: EntityManager,
  who: SignedIn,
  { projectId, id }: LevelPlace,
  version: number,
  input: LevelInput,
): Promise<StoredLevel> {
  requireRole(who, 'surveyor')
  requireSoundFloor(input)
  return await inTransaction(db, async (tx) => {
    await touchProject(tx, who, projectId)
    await updateVersioned(tx, LevelEntity, { firmId: who.firmId, projectId, id }, version, input).catch(rethrowDuplicate)
    return await readLevel(tx, who.firmId, id)
  })
}

/** @throws AppError `not_found`, `stale` */
export async function removeLevel(
  db: EntityManager,
  who: SignedIn,
  { projectId, id }: LevelPlace,
  version: number,
): Promise<void> {
  requireRole(who, 'surveyor')
  await inTransaction(db, async (tx) => {
    await touchProject(tx, who, projectId)
    await deleteVersioned(tx, LevelEntity, { firmId: who.firmId, projectId, id }, version)
  })
}
