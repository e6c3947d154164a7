import type { Gang, GangInput, RateMove } from '#shared/contracts/resource'
import { In, type EntityManager } from 'typeorm'
import { GangEntity } from '../../entities/rates/GangEntity'
import { ResourceEntity } from '../../entities/rates/ResourceEntity'
import { AppError, refuse } from '../../errors'
import { createOnce, type CreatingRequest } from '../createOnce'
import { requireRole, type SignedIn } from '../session/signedIn'
import { duplicateIndex, inTransaction } from '../transaction'
import { deleteVersioned, updateVersioned } from '../versionedUpdate'
import type { InEdition } from './buildUpPricesOf'
import { followChange } from './followChange'
import { movesWith } from './rateMoves'
import { readableEdition } from './readableEdition'
import { MOST_GANGS } from './resourceList'
import { toGang } from './resourceRows'
import type { PricePlace } from './resourceService'
import { requireNothingRests, restingOnGang } from './restingOn'
import { touchDraft } from './touchDraft'

function rethrowDuplicate(error: unknown): never {
  if (duplicateIndex(error) !== 'PRIMARY') throw error
  throw new AppError('conflict', undefined, [{ path: 'code', message: 'another gang of the edition has this code' }])
}

/** @throws AppError `invalid_request` where a member is no labour resource of the edition */
async function requireMembers(db: EntityManager, of: InEdition, { members }: GangInput): Promise<void> {
  const codes = members.map(({ resource }) => resource)
  const rows = await db.findBy(ResourceEntity, { ...of, code: In(codes) })
  const kinds = new Map(rows.map(({ code, kind }) => [code, kind]))
  const issues = members.flatMap(({ resource }, index) => {
    const kind = kinds.get(resource)
    if (kind === 'labour') return []
    const got = kind === undefined ? 'the edition has no such resource' : `it is ${kind}`
    const message = `expected the code of a labour resource, got ${JSON.stringify(resource)}: ${got}`
    return [{ path: `members.${index}.resource`, message }]
  })
  if (issues.length > 0) throw new AppError('invalid_request', undefined, issues)
}

async function readGang(db: EntityManager, of: InEdition, code: string): Promise<Gang> {
  const row = await db.findOneBy(GangEntity, { ...of, code })
  if (row === null) throw new AppError('not_found')
  return toGang(row)
}

/** @throws AppError `not_found`, `conflict` when the code is taken or the edition is no draft, `invalid_request`, also for the 501st */
export async function createGang(
  db: EntityManager,
  who: SignedIn,
  editionId: string,
  input: GangInput,
  request: CreatingRequest,
): Promise<Gang> {
  requireRole(who, 'estimator')
  const of = { firmId: who.firmId, editionId }
  return await createOnce(db, who, request, async (tx) => {
    await touchDraft(tx, who, editionId)
    if ((await tx.countBy(GangEntity, of)) >= MOST_GANGS)
      throw refuse('code', `expected at most ${MOST_GANGS} gangs in an edition`)
    await requireMembers(tx, of, input)
    await tx.insert(GangEntity, { ...input, ...of }).catch(rethrowDuplicate)
    await followChange(tx, who, editionId, { what: 'gang', how: 'created', code: input.code })
    return await readGang(tx, of, input.code)
  })
}

/** Changes a gang and every rate that rests on it. @throws AppError `not_found`, `stale`, `conflict`, `invalid_request` */
export async function changeGang(
  db: EntityManager,
  who: SignedIn,
  { editionId, code }: PricePlace,
  version: number,
  input: GangInput,
): Promise<Gang> {
  requireRole(who, 'estimator')
  const of = { firmId: who.firmId, editionId }
  return await inTransaction(db, async (tx) => {
    await touchDraft(tx, who, editionId)
    await updateVersioned(tx, GangEntity, { ...of, code }, version, { description: input.description, members: input.members })
    requireSameCode(input, code)
    await requireMembers(tx, of, input)
    await followChange(tx, who, editionId, { what: 'gang', how: 'changed', code })
    return await readGang(tx, of, code)
  })
}

/** @throws AppError `not_found`, `stale`, `conflict` that names the rates that rest on it */
export async function removeGang(
  db: EntityManager,
  who: SignedIn,
  { editionId, code }: PricePlace,
  version: number,
): Promise<void> {
  requireRole(who, 'estimator')
  const of = { firmId: who.firmId, editionId }
  await inTransaction(db, async (tx) => {
    await touchDraft(tx, who, editionId)
    await deleteVersioned(tx, GangEntity, { ...of, code }, version)
    requireNothingRests(await restingOnGang(tx, of, code), 'code')
    await followChange(tx, who, editionId, { what: 'gang', how: 'removed', code })
  })
}

/** Which rates a changed gang would move, and by how much, without saving. */
export async function previewGang(
  db: EntityManager,
  who: SignedIn,
  { editionId, code }: PricePlace,
  input: GangInput,
): Promise<RateMove[]> {
  await readableEdition(db, who, editionId)
  const of = { firmId: who.firmId, editionId }
  await readGang(db, of, code)
  requireSameCode(input, code)
  await requireMembers(db, of, input)
  return await movesWith(db, of, { gangs: new Map([[code, input]]) })
}

function requireSameCode(input: GangInput, code: string): void {
  if (input.code !== code) throw refuse('code', `expected ${code}: a code stays; make another gang instead`)
}
