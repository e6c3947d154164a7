import type { CatalogueBlock } from '#shared/contracts/blockCatalogue'
import type { Dispatch, DispatchInput } from '#shared/contracts/dispatch'
import type { StoredScheme } from '#shared/contracts/project'
import type { EntityManager } from 'typeorm'
import { v7 } from 'uuid'
import { ContactEntity } from '../../entities/dispatch/ContactEntity'
import { DispatchEntity } from '../../entities/dispatch/DispatchEntity'
import { PersonEntity } from '../../entities/firm/PersonEntity'
import { BlockEntity } from '../../entities/rates/BlockEntity'
import { refuse } from '../../errors'
import { requireMailAllowance } from '../../mail/mailAllowance'
import { queueMail } from '../../mail/queueMail'
import { comparisonMail } from '../../mail/templates/comparisonMail'
import { freezeComparison } from '../../reports/freezeComparison'
import type { FrozenComparison } from '../../reports/frozenComparison'
import type { AppraisalPool } from '../appraisal/appraisalPool'
import { createOnce, type CreatingRequest } from '../createOnce'
import { requireProject } from '../project/projectRows'
import { sheetOf } from '../project/projectService'
import { hasRole, requireRole, type SignedIn } from '../session/signedIn'
import { compareProject } from './comparedProject'
import { inTurn } from './inTurn'

const MOST_LISTED = 500

async function contactOf(tx: EntityManager, firmId: string, projectId: string, id: string): Promise<ContactEntity> {
  const contact = await tx.findOneBy(ContactEntity, { firmId, projectId, id })
  if (contact === null) throw refuse('contactId', 'expected a contact of this project')
  return contact
}

async function materialOf(
  tx: EntityManager,
  firmId: string,
  { blockId }: StoredScheme,
): Promise<CatalogueBlock['material'] | undefined> {
  if (blockId === null) return undefined
  return (await tx.findOneBy(BlockEntity, { firmId, id: blockId }))?.material
}

async function frozenOf(
  tx: EntityManager,
  pool: AppraisalPool,
  who: SignedIn,
  projectId: string,
  input: DispatchInput,
  contact: ContactEntity,
): Promise<FrozenComparison> {
  const compared = await compareProject(pool, who.firmId, await sheetOf(tx, who.firmId, projectId), input)
  const blockMaterial = await materialOf(tx, who.firmId, compared.schemes[0])
  const sending = {
    firm: { name: who.firmName, isDemo: who.isDemo },
    recipient: { name: contact.name, email: contact.email },
    preparedBy: who.name,
    note: input.note,
  }
  return freezeComparison({ ...compared, blockMaterial }, sending, new Date().toISOString())
}

function newRow(who: SignedIn, contact: ContactEntity, frozen: FrozenComparison) {
  return {
    firmId: who.firmId,
    id: v7(),
    projectId: frozen.project.id,
    projectName: frozen.project.name,
    contactId: contact.id,
    contactName: contact.name,
    contactEmail: contact.email,
    ribbedMark: frozen.ribbed.specification.mark,
    solidMark: frozen.solid.specification.mark,
    note: frozen.note,
    state: 'queued' as const,
    messageId: '',
    sentBy: who.personId,
    createdAt: new Date(frozen.frozenAt),
    frozen: frozen as object,
  }
}

/**
 * Sends the comparison of two schemes, as stored at this moment, to a contact: the dispatch with what is sent, and the mail, are
 * written together. The mail leaves once that is committed.
 * @throws AppError `not_found`, `invalid_request` for a contact or scheme that is not the project's, `out_of_scope` when the
 *   schemes cannot be compared as they stand, `limited` when the firm has sent its mails of the day
 */
export async function createDispatch(
  db: EntityManager,
  pool: AppraisalPool,
  who: SignedIn,
  projectId: string,
  input: DispatchInput,
  request: CreatingRequest,
): Promise<Dispatch> {
  requireRole(who, 'surveyor')
  const create = async (tx: EntityManager): Promise<Dispatch> => {
    await requireProject(tx, who.firmId, projectId)
    const contact = await contactOf(tx, who.firmId, projectId, input.contactId)
    const frozen = await frozenOf(tx, pool, who, projectId, input, contact)
    await requireMailAllowance(tx, who.firmId)
    const row = newRow(who, contact, frozen)
    await tx.insert(DispatchEntity, row)
    const mail = {
      firmId: who.firmId,
      toName: contact.name,
      toEmail: contact.email,
      dispatchId: row.id,
      ...comparisonMail(frozen),
    }
    await tx.update(DispatchEntity, { firmId: who.firmId, id: row.id }, { messageId: await queueMail(tx, mail) })
    return toDispatch(await tx.findOneByOrFail(DispatchEntity, { firmId: who.firmId, id: row.id }), who.name)
  }
  return await inTurn(who.firmId, () => createOnce(db, who, request, create))
}

function toDispatch(row: DispatchEntity, sentBy: string): Dispatch {
  return {
    id: row.id,
    projectId: row.projectId,
    projectName: row.projectName,
    contact: { id: row.contactId, name: row.contactName, email: row.contactEmail },
    between: [row.ribbedMark, row.solidMark],
    note: row.note,
    state: row.state,
    tries: row.tries,
    lastAnswer: row.lastAnswer,
    messageId: row.messageId,
    sentBy,
    createdAt: row.createdAt.toISOString(),
    sentAt: row.sentAt === null ? null : row.sentAt.toISOString(),
    version: row.version,
  }
}

async function listed(
  db: EntityManager,
  where: { firmId: string; projectId?: string; contactEmail?: string },
): Promise<Dispatch[]> {
  const rows = await db.find(DispatchEntity, { where, order: { createdAt: 'DESC', id: 'DESC' }, take: MOST_LISTED })
  const people = await db.findBy(PersonEntity, { firmId: where.firmId })
  const names = new Map(people.map(({ id, name }) => [id, name]))
  return rows.map((row) => toDispatch(row, names.get(row.sentBy) ?? ''))
}

/** What was sent of a project, newest first, at most 500. @throws AppError `not_found`, the same for another firm's project */
export async function listDispatches(db: EntityManager, who: SignedIn, projectId: string): Promise<Dispatch[]> {
  requireRole(who, 'surveyor')
  await requireProject(db, who.firmId, projectId)
  return await listed(db, { firmId: who.firmId, projectId })
}

/** What was sent to the address of the person who asks, newest first, at most 500. What mail servers said is the sender's business. */
export async function listReceived(db: EntityManager, who: SignedIn): Promise<Dispatch[]> {
  requireRole(who, 'client', 'developer', 'engineer', 'surveyor')
  const received = await listed(db, { firmId: who.firmId, contactEmail: who.email })
  return hasRole(who, 'surveyor') ? received : received.map((row) => ({ ...row, lastAnswer: null }))
}
