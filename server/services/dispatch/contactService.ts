import type { Contact, ContactInput } from '#shared/contracts/dispatch'
import type { EntityManager } from 'typeorm'
import { v7 } from 'uuid'
import { ContactEntity } from '../../entities/dispatch/ContactEntity'
import { AppError } from '../../errors'
import { createOnce, type CreatingRequest } from '../createOnce'
import { requireProject } from '../project/projectRows'
import { requireRole, type SignedIn } from '../session/signedIn'
import { duplicateIndex } from '../transaction'

/** Contacts that a project may have. */
const MOST_CONTACTS = 200

const toContact = ({ id, name, email }: ContactEntity): Contact => ({ id, name, email })

function rethrowDuplicate(error: unknown): never {
  if (duplicateIndex(error) !== 'uq_contact_email') throw error
  throw new AppError('conflict', undefined, [{ path: 'email', message: 'another contact of the project has this address' }])
}

/** Contacts of a project, by name. @throws AppError `not_found`, the same for another firm's project */
export async function listContacts(db: EntityManager, who: SignedIn, projectId: string): Promise<Contact[]> {
  requireRole(who, 'surveyor')
  await requireProject(db, who.firmId, projectId)
  const rows = await db.find(ContactEntity, { where: { firmId: who.firmId, projectId }, order: { name: 'ASC', id: 'ASC' } })
  return rows.map(toContact)
}

/** @throws AppError `not_found`, `conflict` when the project has this address already, `limited` at the 201st */
export async function createContact(
  db: EntityManager,
  who: SignedIn,
  projectId: string,
  input: ContactInput,
  request: CreatingRequest,
): Promise<Contact> {
  requireRole(who, 'surveyor')
  return await createOnce(db, who, request, async (tx) => {
    await requireProject(tx, who.firmId, projectId)
    if ((await tx.countBy(ContactEntity, { firmId: who.firmId, projectId })) >= MOST_CONTACTS) {
      throw new AppError('limited', `A project has at most ${MOST_CONTACTS} contacts.`)
    }
    const row = { ...input, firmId: who.firmId, id: v7(), projectId, createdAt: new Date() }
    await tx.insert(ContactEntity, row).catch(rethrowDuplicate)
    return toContact(row)
  })
}
