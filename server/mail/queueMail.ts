import { randomUUID } from 'node:crypto'
import type { EntityManager } from 'typeorm'
import { OutboxEntity } from '../entities/dispatch/OutboxEntity'
import { requireAddress, requireLine } from './mailAddress'

/** A mail to one person of, or known to, a firm. Both bodies say the same; `html` needs nothing from outside. */
export interface QueuedMail {
  readonly firmId: string
  readonly toName: string
  readonly toEmail: string
  readonly subject: string
  readonly text: string
  readonly html: string
  /** The dispatch whose printed report goes with it, and whose state follows the mail's. */
  readonly dispatchId?: string
}

/** Right-hand side of our Message-IDs. RFC 5322, 3.6.4 asks that the whole be unique: the left-hand side is a random UUID. */
const MESSAGE_ID_DOMAIN = 'mail.bothways'

/**
 * Writes a mail into the outbox, in the caller's transaction: it is sent when, and only when, that is committed.
 * Recipients come from the database, never from a request.
 * @returns its Message-ID, which stays the same however often it must be tried
 * @throws RangeError when the address, the name or the subject could alter the header of the mail
 */
export async function queueMail(tx: EntityManager, mail: QueuedMail): Promise<string> {
  const messageId = `<${randomUUID()}@${MESSAGE_ID_DOMAIN}>`
  const now = new Date()
  await tx.insert(OutboxEntity, {
    firmId: mail.firmId,
    id: randomUUID(),
    dispatchId: mail.dispatchId ?? null,
    messageId,
    toName: requireLine(mail.toName),
    toEmail: requireAddress(mail.toEmail),
    subject: requireLine(mail.subject),
    text: mail.text,
    html: mail.html,
    state: 'queued',
    tries: 0,
    dueAt: now,
    claim: null,
    lastAnswer: null,
    createdAt: now,
    sentAt: null,
  })
  return messageId
}
