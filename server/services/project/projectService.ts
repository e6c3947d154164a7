import { markups as markupsContract, type Markups } from '#shared/contracts/appraisal'
import type { Project, ProjectInput, ProjectSheet } from '#shared/contracts/project'
import type { EntityManager } from 'typeorm'
import { v7 } from 'uuid'
import { EditionEntity } from '../../entities/rates/EditionEntity'
import { LevelEntity } from '../../entities/project/LevelEntity'
import { ProjectEntity } from '../../entities/project/ProjectEntity'
import { SchemeEntity } from '../../entities/project/SchemeEntity'
import { AppError, refuse } from '../../errors'
import { recordEvent } from '../auditLog'
import { createOnce, type CreatingRequest } from '../createOnce'
import { findEdition } from '../rates/editionService'
import { requireRole, type SignedIn } from '../session/signedIn'
import { duplicateIndex, inTransaction } from '../transaction'
import { updateVersioned } from '../versionedUpdate'
import { overridesOf } from './overrideService'
import { requireProject, toProject, toStoredLevel, toStoredScheme } from './projectRows'

function rethrowDuplicate(error: unknown): never {
  if (duplicateIndex(error) !== 'uq_project_reference') throw error
  throw new AppError('conflict', undefined, [{ path: 'reference', message: 'another project of the firm has this reference' }])
}

/** Refuses an edition that the firm has not published. One that the project has already may stay when it is superseded. */
async function requireEdition(tx: EntityManager, who: SignedIn, input: ProjectInput, present: string | null): Promise<void> {
  const { editionId } = input
  if (editionId === null) return
  await requireOverheadsOnce(tx, who, editionId, input.markups)
  if (editionId === present) return
  const isPublished = await tx.existsBy(EditionEntity, { firmId: who.firmId, id: editionId, state: 'published' })
  if (!isPublished) throw refuse('editionId', 'expected a published edition of the firm')
}

/** Overheads and profit stand in the rates or among the markups, never in both. */
async function requireOverheadsOnce(tx: EntityManager, who: SignedIn, editionId: string, markups: Markups): Promise<void> {
  if (!/[1-9]/.test(markups.overheadsAndProfitPercent)) return
  const holds = await tx.existsBy(EditionEntity, { firmId: who.firmId, id: editionId, holdsOverheads: true })
  if (holds) throw refuse('markups.overheadsAndProfitPercent', 'expected 0: the rates of the edition hold overheads and profit')
}

/** @throws AppError `conflict` when the reference is taken, `invalid_request` for an edition that is not published */
export async function createProject(
  db: EntityManager,
  who: SignedIn,
  input: ProjectInput,
  request: CreatingRequest,
): Promise<Project> {
  requireRole(who, 'surveyor')
  return await createOnce(db, who, request, async (tx) => {
    await requireEdition(tx, who, input, null)
    const now = new Date()
    const row = { ...input, firmId: who.firmId, id: v7(), totals: [], createdAt: now, updatedAt: now, updatedBy: who.personId }
    await tx.insert(ProjectEntity, row).catch(rethrowDuplicate)
    return await toProject(tx, await requireProject(tx, who.firmId, row.id))
  })
}

/** Everything a surveyor's sheets need, as of one moment. @throws AppError `not_found` */
export async function readProjectSheet(db: EntityManager, who: SignedIn, id: string): Promise<ProjectSheet> {
  requireRole(who, 'surveyor')
  return await inTransaction(db, (tx) => sheetOf(tx, who.firmId, id))
}

/** The sheet without a question of rights: the caller has asked it. @throws AppError `not_found` */
export async function sheetOf(tx: EntityManager, firmId: string, id: string): Promise<ProjectSheet> {
  const row = await requireProject(tx, firmId, id)
  const own = { where: { firmId, projectId: id }, order: { position: 'ASC' } } as const
  const levels = await tx.find(LevelEntity, own)
  const schemes = await tx.find(SchemeEntity, own)
  return {
    project: await toProject(tx, row),
    levels: levels.map(toStoredLevel),
    schemes: schemes.map(toStoredScheme),
    edition: row.editionId === null ? null : await findEdition(tx, firmId, row.editionId),
    overrides: await overridesOf(tx, firmId, id),
  }
}

/** @throws AppError `not_found`, `stale`, `conflict` when the reference is taken, `invalid_request` for an unpublished edition */
export async function changeProject(
  db: EntityManager,
  who: SignedIn,
  id: string,
  version: number,
  input: ProjectInput,
): Promise<Project> {
  requireRole(who, 'surveyor')
  return await inTransaction(db, async (tx) => {
    const before = await requireProject(tx, who.firmId, id)
    await requireEdition(tx, who, input, before.editionId)
    const change = { ...input, contentVersion: () => 'content_version + 1', updatedAt: new Date(), updatedBy: who.personId }
    await updateVersioned(tx, ProjectEntity, { firmId: who.firmId, id }, version, change).catch(rethrowDuplicate)
    await recordPriceChange(tx, who, before, input)
    return await toProject(tx, await requireProject(tx, who.firmId, id))
  })
}

async function recordPriceChange(tx: EntityManager, who: SignedIn, before: ProjectEntity, after: ProjectInput): Promise<void> {
  const from = { editionId: before.editionId, markups: markupsContract.parse(before.markups), scope: before.scope ?? [] }
  const to = { editionId: after.editionId, markups: after.markups, scope: after.scope }
  if (JSON.stringify(from) === JSON.stringify(to)) return
  const detail = { projectId: before.id, from, to }
  await recordEvent(tx, { event: 'project.pricesChanged', firmId: who.firmId, personId: who.personId, detail })
}
