import type { ItemCode } from '#shared/contracts/appraisal'
import { itemCode } from '#shared/contracts/appraisal'
import type { RateOverride, RateOverrideInput } from '#shared/contracts/rateOverride'
import { In, type EntityManager } from 'typeorm'
import { PersonEntity } from '../../entities/firm/PersonEntity'
import { RateOverrideEntity } from '../../entities/project/RateOverrideEntity'
import { AppError } from '../../errors'
import { recordEvent } from '../auditLog'
import { createOnce, type CreatingRequest } from '../createOnce'
import { plainDecimal } from '../decimalText'
import { requireRole, type SignedIn } from '../session/signedIn'
import { duplicateIndex, inTransaction } from '../transaction'
import { deleteVersioned, updateVersioned } from '../versionedUpdate'
import { touchProject } from './projectContent'

/** Which item of which project. */
export interface OverridePlace {
  readonly projectId: string
  readonly item: ItemCode
}

function rethrowDuplicate(error: unknown): never {
  if (duplicateIndex(error) !== 'PRIMARY') throw error
  throw new AppError('conflict', undefined, [
    { path: 'item', message: 'the project has a rate of its own for this item already' },
  ])
}

/** Rates of a project's own, in the order of the items. */
export async function overridesOf(db: EntityManager, firmId: string, projectId: string): Promise<RateOverride[]> {
  const rows = await db.findBy(RateOverrideEntity, { firmId, projectId })
  if (rows.length === 0) return []
  const people = await db.findBy(PersonEntity, { firmId, id: In(rows.map(({ changedBy }) => changedBy)) })
  const nameOf = (id: string) => people.find((person) => person.id === id)?.name ?? ''
  return rows
    .map(({ item, rate, reason, changedBy, changedAt, version }) => ({
      item,
      rate: plainDecimal(rate),
      reason,
      author: nameOf(changedBy),
      changedAt: changedAt.toISOString(),
      version,
    }))
    .sort((a, b) => itemCode.options.indexOf(a.item) - itemCode.options.indexOf(b.item))
}

async function readOverride(tx: EntityManager, who: SignedIn, { projectId, item }: OverridePlace): Promise<RateOverride> {
  const found = (await overridesOf(tx, who.firmId, projectId)).find((each) => each.item === item)
  if (found === undefined) throw new AppError('not_found')
  return found
}

async function record(tx: EntityManager, who: SignedIn, place: OverridePlace, input: RateOverrideInput | null): Promise<void> {
  const detail = { ...place, ...(input ?? { rate: null }) }
  await recordEvent(tx, { event: 'project.rateOverridden', firmId: who.firmId, personId: who.personId, detail })
}

/** Prices an item of a project by a rate of its own. @throws AppError `not_found`, `conflict` where it has one already */
export async function createOverride(
  db: EntityManager,
  who: SignedIn,
  place: OverridePlace,
  input: RateOverrideInput,
  request: CreatingRequest,
): Promise<RateOverride> {
  requireRole(who, 'surveyor')
  return await createOnce(db, who, request, async (tx) => {
    await touchProject(tx, who, place.projectId)
    const row = { ...input, ...place, firmId: who.firmId, changedBy: who.personId, changedAt: new Date() }
    await tx.insert(RateOverrideEntity, row).catch(rethrowDuplicate)
    await record(tx, who, place, input)
    return await readOverride(tx, who, place)
  })
}

/** @throws AppError `not_found`, `stale` */
export async function changeOverride(
  db: EntityManager,
  who: SignedIn,
  place: OverridePlace,
  version: number,
  input: RateOverrideInput,
): Promise<RateOverride> {
  requireRole(who, 'surveyor')
  return await inTransaction(db, async (tx) => {
    await touchProject(tx, who, place.projectId)
    const change = { ...input, changedBy: who.personId, changedAt: new Date() }
    await updateVersioned(tx, RateOverrideEntity, { ...place, firmId: who.firmId }, version, change)
    await record(tx, who, place, input)
    return await readOverride(tx, who, place)
  })
}

/** Goes back to the rate of the edition. @throws AppError `not_found`, `stale` */
export async function removeOverride(db: EntityManager, who: SignedIn, place: OverridePlace, version: number): Promise<void> {
  requireRole(who, 'surveyor')
  await inTransaction(db, async (tx) => {
    await touchProject(tx, who, place.projectId)
    await deleteVersioned(tx, RateOverrideEntity, { ...place, firmId: who.firmId }, version)
    await record(tx, who, place, null)
  })
}
