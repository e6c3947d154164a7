import { randomUUID } from 'node:crypto'
import type { EntityManager } from 'typeorm'
import { DispatchEntity } from '../entities/dispatch/DispatchEntity'
import { OutboxEntity } from '../entities/dispatch/OutboxEntity'

/** What became of a claimed mail; `retryAt` is given exactly when it stays queued. */
export type Outcome =
  | { readonly state: 'sent' }
  | { readonly state: 'refused' | 'failed'; readonly answer: string }
  | { readonly state: 'queued'; readonly answer: string; readonly retryAt: Date }

/**
 * Takes the mail that has been due longest, in a transaction of its own: other workers skip it while it is taken, and get it
 * when `leaseMs` pass without a mark, because this worker was killed.
 * @returns null when nothing is due
 */
export async function claimMail(db: EntityManager, leaseMs: number): Promise<OutboxEntity | null> {
  return await db.transaction(async (tx) => {
    const mail = await tx
      .createQueryBuilder(OutboxEntity, 'mail')
      .where('mail.state = :state AND mail.dueAt <= :now', { state: 'queued', now: new Date() })
      .orderBy('mail.dueAt')
      .take(1)
      .setLock('pessimistic_write')
      .setOnLocked('skip_locked')
      .getOne()
    if (mail === null) return null
    const claimed = { claim: randomUUID(), tries: mail.tries + 1, dueAt: new Date(Date.now() + leaseMs) }
    await tx.update(OutboxEntity, { firmId: mail.firmId, id: mail.id }, claimed)
    return { ...mail, ...claimed }
  })
}

/**
 * Writes the outcome on the mail and on its dispatch, together. A mail that was accepted loses its bodies, since it may carry a
 * link that opens an account; so does one that is given up and belongs to no dispatch.
 * @returns false when another worker has claimed it meanwhile: the outcome is then that worker's to tell
 */
export async function markMail(db: EntityManager, mail: OutboxEntity, outcome: Outcome): Promise<boolean> {
  return await db.transaction(async (tx) => {
    const isSent = outcome.state === 'sent'
    const change = {
      state: outcome.state,
      lastAnswer: isSent ? null : outcome.answer,
      sentAt: isSent ? new Date() : null,
    }
    const isOver = isSent || (outcome.state !== 'queued' && mail.dispatchId === null)
    const { affected } = await tx.update(
      OutboxEntity,
      { firmId: mail.firmId, id: mail.id, claim: mail.claim!, state: 'queued' },
      { ...change, ...(outcome.state === 'queued' ? { dueAt: outcome.retryAt } : {}), ...(isOver ? { text: '', html: '' } : {}) },
    )
    if (affected !== 1) return false
    if (mail.dispatchId !== null) {
      const mirrored = { ...change, tries: mail.tries, version: () => 'version + 1' }
      await tx.update(DispatchEntity, { firmId: mail.firmId, id: mail.dispatchId }, mirrored)
    }
    return true
  })
}
