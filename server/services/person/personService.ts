import type { InvitationInput, Person, PersonChange, Role } from '#shared/contracts/person'
import { Not, type EntityManager } from 'typeorm'
import { v7 } from 'uuid'
import { FirmEntity } from '../../entities/firm/FirmEntity'
import { PersonEntity } from '../../entities/firm/PersonEntity'
import { PersonRoleEntity } from '../../entities/firm/PersonRoleEntity'
import { AppError, refuse } from '../../errors'
import { requireMailAllowance } from '../../mail/mailAllowance'
import { queueMail } from '../../mail/queueMail'
import { recordEvent } from '../auditLog'
import { createOnce, type CreatingRequest } from '../createOnce'
import { endSessions } from '../session/sessionService'
import { requireRole, type SignedIn } from '../session/signedIn'
import { issueToken } from '../session/singleUseToken'
import { duplicateIndex, inTransaction } from '../transaction'
import { updateVersioned } from '../versionedUpdate'
import { invitationMail } from './linkMail'

function toPerson({ id, name, email, state, version, createdAt }: PersonEntity, roles: readonly Role[]): Person {
  return { id, name, email, roles: [...roles], state, version, createdAt: createdAt.toISOString() }
}

async function requirePerson(tx: EntityManager, firmId: string, id: string): Promise<PersonEntity> {
  const row = await tx.findOneBy(PersonEntity, { firmId, id })
  if (row === null) throw new AppError('not_found')
  return row
}

async function readPerson(tx: EntityManager, firmId: string, id: string): Promise<Person> {
  const roles = await tx.findBy(PersonRoleEntity, { firmId, personId: id })
  return toPerson(
    await requirePerson(tx, firmId, id),
    roles.map(({ role }) => role),
  )
}

async function setRoles(tx: EntityManager, firmId: string, personId: string, roles: readonly Role[]): Promise<void> {
  await tx.delete(PersonRoleEntity, { firmId, personId })
  await tx.insert(
    PersonRoleEntity,
    [...new Set(roles)].map((role) => ({ firmId, personId, role })),
  )
}

/** People of the firm by name, at most 1,000. */
export async function listPeople(db: EntityManager, who: SignedIn): Promise<Person[]> {
  requireRole(who, 'admin')
  const { firmId } = who
  const people = await db.find(PersonEntity, { where: { firmId }, order: { name: 'ASC', id: 'ASC' }, take: 1000 })
  const roles = await db.findBy(PersonRoleEntity, { firmId })
  return people.map((row) =>
    toPerson(
      row,
      roles.filter(({ personId }) => personId === row.id).map(({ role }) => role),
    ),
  )
}

/** Puts a person into the firm, invited, and the mail to them into the outbox, with the caller's transaction. */
export async function addInvited(tx: EntityManager, firmId: string, origin: string, input: InvitationInput): Promise<string> {
  const { name, email, roles } = input
  const id = v7()
  await requireMailAllowance(tx, firmId)
  await tx
    .insert(PersonEntity, { firmId, id, name, email, passwordHash: null, state: 'invited', createdAt: new Date() })
    .catch((error: unknown) => {
      if (duplicateIndex(error) !== 'uq_person_email') throw error
      throw new AppError('conflict', undefined, [{ path: 'email', message: 'somebody of the firm has this address already' }])
    })
  await setRoles(tx, firmId, id, roles)
  await sendInvitation(tx, firmId, origin, { id, name, email })
  return id
}

async function sendInvitation(
  tx: EntityManager,
  firmId: string,
  origin: string,
  { id, name, email }: Pick<PersonEntity, 'id' | 'name' | 'email'>,
): Promise<void> {
  const firm = await tx.findOneByOrFail(FirmEntity, { id: firmId })
  const token = await issueToken(tx, { firmId, personId: id }, 'invitation')
  await queueMail(tx, { firmId, toName: name, toEmail: email, ...invitationMail(origin, firm.name, name, token) })
  await recordEvent(tx, { event: 'invitation.sent', firmId, personId: id, detail: {} })
}

/** @throws AppError `conflict` when somebody of the firm has the address, `limited` when the firm has sent too many mails */
export async function invitePerson(
  db: EntityManager,
  who: SignedIn,
  origin: string,
  input: InvitationInput,
  request: CreatingRequest,
): Promise<Person> {
  requireRole(who, 'admin')
  return await createOnce(db, who, request, async (tx) => {
    const id = await addInvited(tx, who.firmId, origin, input)
    return await readPerson(tx, who.firmId, id)
  })
}

/** Sends the invitation again, with a new link; the earlier one stops working. @throws AppError `not_found`, `conflict` when accepted */
export async function repeatInvitation(db: EntityManager, who: SignedIn, origin: string, id: string): Promise<Person> {
  requireRole(who, 'admin')
  return await inTransaction(db, async (tx) => {
    const person = await requirePerson(tx, who.firmId, id)
    if (person.state !== 'invited') throw new AppError('conflict', 'This person is not waiting for an invitation.')
    await requireMailAllowance(tx, who.firmId)
    await sendInvitation(tx, who.firmId, origin, person)
    return await readPerson(tx, who.firmId, id)
  })
}

/** Holds the firm's row to the end of the transaction. To be the first read of it, so that all others see what came before. */
async function holdFirm(tx: EntityManager, firmId: string): Promise<void> {
  await tx.findOne(FirmEntity, { where: { id: firmId }, lock: { mode: 'pessimistic_write' } })
}

/** Refuses to leave the firm without an admin who can sign in. The firm's row is held, so that two admins cannot remove each other. */
async function requireOtherAdmin(tx: EntityManager, firmId: string, id: string): Promise<void> {
  const admins = await tx.findBy(PersonRoleEntity, { firmId, role: 'admin', personId: Not(id) })
  for (const { personId } of admins) if (await tx.existsBy(PersonEntity, { firmId, id: personId, state: 'active' })) return
  throw new AppError('conflict', 'The firm would be left without an admin.', [
    { path: 'roles', message: 'expected another active admin in the firm first' },
  ])
}

function requireReachableState(row: PersonEntity, { state }: PersonChange): void {
  const hasPassword = row.passwordHash !== null
  if (state === 'active' && !hasPassword)
    throw refuse('state', 'expected invited or off, since the invitation is not accepted yet')
  if (state === 'invited' && hasPassword) throw refuse('state', 'expected active or off, since the invitation is accepted')
}

/** Changes what somebody may do; it holds from their next request. @throws AppError `not_found`, `stale`, `conflict` for the last admin */
export async function changePerson(
  db: EntityManager,
  who: SignedIn,
  id: string,
  version: number,
  input: PersonChange,
): Promise<Person> {
  requireRole(who, 'admin')
  const { firmId } = who
  return await inTransaction(db, async (tx) => {
    await holdFirm(tx, firmId)
    const before = await readPerson(tx, firmId, id)
    requireReachableState(await requirePerson(tx, firmId, id), input)
    const staysAdmin = input.state === 'active' && input.roles.includes('admin')
    if (before.state === 'active' && before.roles.includes('admin') && !staysAdmin) await requireOtherAdmin(tx, firmId, id)
    await updateVersioned(tx, PersonEntity, { firmId, id }, version, { state: input.state })
    await setRoles(tx, firmId, id, input.roles)
    if (input.state === 'off') await endSessions(tx, { firmId, personId: id })
    const detail = { changed: id, from: { roles: before.roles, state: before.state }, to: input }
    await recordEvent(tx, { event: 'person.changed', firmId, personId: who.personId, detail })
    return await readPerson(tx, firmId, id)
  })
}
