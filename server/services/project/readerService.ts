import type { ProjectReaders, ProjectReadersInput } from '#shared/contracts/projectReaders'
import { In, Not, type EntityManager } from 'typeorm'
import { PersonEntity } from '../../entities/firm/PersonEntity'
import { PersonRoleEntity } from '../../entities/firm/PersonRoleEntity'
import { ProjectEntity } from '../../entities/project/ProjectEntity'
import { ProjectShareEntity } from '../../entities/project/ProjectShareEntity'
import { AppError } from '../../errors'
import { recordEvent } from '../auditLog'
import { requireRole, type SignedIn } from '../session/signedIn'
import { inTransaction } from '../transaction'
import { requireProject } from './projectRows'

/** Developers and engineers of the firm who have not been switched off, in the order of their names. */
async function candidatesOf(tx: EntityManager, firmId: string) {
  const roles = await tx.findBy(PersonRoleEntity, { firmId })
  const reading = roles.filter(({ role }) => role === 'developer' || role === 'engineer')
  const people = await tx.find(PersonEntity, {
    where: { firmId, id: In(reading.map(({ personId }) => personId)), state: Not('off') },
    order: { name: 'ASC', id: 'ASC' },
    take: 1000,
  })
  return people.map(({ id, name, email }) => ({
    id,
    name,
    email,
    roles: roles.filter(({ personId }) => personId === id).map(({ role }) => role),
  }))
}

async function readersOf(tx: EntityManager, firmId: string, projectId: string): Promise<ProjectReaders> {
  const { readersVersion } = await requireProject(tx, firmId, projectId)
  const shares = await tx.findBy(ProjectShareEntity, { firmId, projectId })
  const reading = new Set(shares.map(({ personId }) => personId))
  const people = await candidatesOf(tx, firmId)
  return { version: readersVersion, people: people.map((person) => ({ ...person, isReader: reading.has(person.id) })) }
}

/** @throws AppError `not_found` */
export async function readReaders(db: EntityManager, who: SignedIn, projectId: string): Promise<ProjectReaders> {
  requireRole(who, 'surveyor')
  return await inTransaction(db, (tx) => readersOf(tx, who.firmId, projectId))
}

/** @throws AppError `not_found`, `stale`, `invalid_request` for anybody who is no developer or engineer of the firm */
export async function changeReaders(
  db: EntityManager,
  who: SignedIn,
  projectId: string,
  version: number,
  { personIds }: ProjectReadersInput,
): Promise<ProjectReaders> {
  requireRole(who, 'surveyor')
  const { firmId } = who
  return await inTransaction(db, async (tx) => {
    const { affected } = await tx.update(
      ProjectEntity,
      { firmId, id: projectId, readersVersion: version },
      { readersVersion: () => 'readers_version + 1' },
    )
    if (affected !== 1) throw new AppError((await tx.existsBy(ProjectEntity, { firmId, id: projectId })) ? 'stale' : 'not_found')
    const known = new Set((await candidatesOf(tx, firmId)).map(({ id }) => id))
    const issues = personIds.flatMap((id, index) =>
      known.has(id) ? [] : [{ path: `personIds.${index}`, message: 'expected a developer or an engineer of the firm' }],
    )
    if (issues.length > 0) throw new AppError('invalid_request', undefined, issues)
    await tx.delete(ProjectShareEntity, { firmId, projectId })
    if (personIds.length > 0)
      await tx.insert(
        ProjectShareEntity,
        personIds.map((personId) => ({ firmId, projectId, personId })),
      )
    await recordEvent(tx, { event: 'project.readersChanged', firmId, personId: who.personId, detail: { projectId, personIds } })
    return await readersOf(tx, firmId, projectId)
  })
}
