import type { EntityManager } from 'typeorm'
import { v7 } from 'uuid'
import { AuditEntity } from '../entities/AuditEntity'

/** What is recorded: who and what, by ids and codes; never a password, a token or the text of a mail. */
export interface AuditEvent {
  readonly event:
    | 'signIn.accepted'
    | 'signIn.refused'
    | 'signIn.limited'
    | 'session.ended'
    | 'session.reused'
    | 'passwordReset.asked'
    | 'passwordReset.done'
    | 'invitation.sent'
    | 'invitation.accepted'
    | 'person.changed'
    | 'request.refused'
    | 'project.pricesChanged'
    | 'project.readersChanged'
    | 'project.rateOverridden'
    | 'block.changed'
    | 'rateBook.made'
    | 'edition.begun'
    | 'edition.discarded'
    | 'edition.stepped'
    | 'edition.pricesChanged'
    | 'edition.imported'
    | 'edition.importUndone'
    | 'firm.made'
  readonly firmId: string | null
  readonly personId: string | null
  readonly detail: Readonly<Record<string, unknown>>
}

/** Adds one row to the audit log, with the transaction of what it records. */
export async function recordEvent(db: EntityManager, event: AuditEvent): Promise<void> {
  await db.insert(AuditEntity, { ...event, id: v7(), at: new Date(), detail: event.detail as object })
}
