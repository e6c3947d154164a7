import type { SchemeInput, StoredScheme } from '#shared/contracts/project'
import type { EntityManager } from 'typeorm'
import { v7 } from 'uuid'
import { SchemeEntity } from '../../entities/project/SchemeEntity'
import { BlockEntity } from '../../entities/rates/BlockEntity'
import { AppError, refuse } from '../../errors'
import { createOnce, type CreatingRequest } from '../createOnce'
import { requireRole, type SignedIn } from '../session/signedIn'
import { duplicateIndex, inTransaction } from '../transaction'
import { deleteVersioned, updateVersioned } from '../versionedUpdate'
import { nextPosition } from './nextPosition'
import { touchProject } from './projectContent'
import { toStoredScheme } from './projectRows'

const MOST_SCHEMES = 20

function rethrowDuplicate(error: unknown): never {
  if (duplicateIndex(error) !== 'uq_scheme_mark') throw error
  throw new AppError('conflict', undefined, [
    { path: 'specification.mark', message: 'another scheme of the project has this mark' },
  ])
}

async function requireBlock(tx: EntityManager, who: SignedIn, { blockId, specification }: SchemeInput): Promise<void> {
  if (blockId === null) return
  if (specification.kind === 'solid') throw refuse('blockId', 'expected null, since a solid scheme has no blocks')
  const isOurs = await tx.existsBy(BlockEntity, { firmId: who.firmId, id: blockId })
  if (!isOurs) throw refuse('blockId', "expected a block of the firm's catalogue")
}

async function readScheme(tx: EntityManager, firmId: string, id: string): Promise<StoredScheme> {
  return toStoredScheme(await tx.findOneByOrFail(SchemeEntity, { firmId, id }))
}

/** @throws AppError `not_found`, `conflict` when the mark is taken, `invalid_request` for an unknown block or the 21st scheme */
export async function createScheme(
  db: EntityManager,
  who: SignedIn,
  projectId: string,
  input: SchemeInput,
  request: CreatingRequest,
): Promise<StoredScheme> {
  requireRole(who, 'surveyor')
  return await createOnce(db, who, request, async (tx) => {
    await touchProject(tx, who, projectId)
    await requireBlock(tx, who, input)
    const position = await nextPosition(tx, SchemeEntity, { firmId: who.firmId, projectId }, MOST_SCHEMES)
    const row = { ...input, firmId: who.firmId, id: v7(), projectId, position, mark: input.specification.mark }
    await tx.insert(SchemeEntity, row).catch(rethrowDuplicate)
    return await readScheme(tx, who.firmId, row.id)
  })
}

/** Where a scheme is: in which project, by which id. */
export interface SchemePlace {
  readonly projectId: string
  readonly id: string
}

/** @throws AppError `not_found`, `stale`, `conflict` when the mark is taken, `invalid_request` for an unknown block */
export async function changeScheme(
  db: EntityManager,
  who: SignedIn,
  { projectId, id }: SchemePlace,
  version: number,
  input: SchemeInput,
): Promise<StoredScheme> {
  requireRole(who, 'surveyor')
  return await inTransaction(db, async (tx) => {
    await touchProject(tx, who, projectId)
    await requireBlock(tx, who, input)
    const change = { ...input, mark: input.specification.mark }
    await updateVersioned(tx, SchemeEntity, { firmId: who.firmId, projectId, id }, version, change).catch(rethrowDuplicate)
    return await readScheme(tx, who.firmId, id)
  })
}

/** @throws AppError `not_found`, `stale` */
export async function removeScheme(
  db: EntityManager,
  who: SignedIn,
  { projectId, id }: SchemePlace,
  version: number,
): Promise<void> {
  requireRole(who, 'surveyor')
  await inTransaction(db, async (tx) => {
    await touchProject(tx, who, projectId)
    await deleteVersioned(tx, SchemeEntity, { firmId: who.firmId, projectId, id }, version)
  })
}
