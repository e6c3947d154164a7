import { setTimeout as rest } from 'node:timers/promises'
import type { DataSource } from 'typeorm'
import type { OutboxEntity } from '../entities/dispatch/OutboxEntity'
import type { Log } from '../log'
import { mailFailure, type MailFailure } from './mailFailure'
import type { Attachment, MailTransport } from './mailTransport'
import { claimMail, markMail, type Outcome } from './outboxClaim'
import { OutboxSignal } from './outboxSignal'
import { RETRY_PLAN, retryDelayMs, type RetryPlan } from './retryDelay'

export interface OutboxWorkerSettings {
  readonly db: DataSource
  readonly transport: MailTransport
  /** What goes with a mail; printed now, when it was not yet. */
  readonly attachmentsOf: (mail: OutboxEntity) => Promise<readonly Attachment[]>
  readonly log: Log
  readonly retry?: RetryPlan
  /** Longer than printing and every timeout of the transport together, ms. */
  readonly leaseMs?: number
  readonly pollMs?: number
  /** Mails on their way at once. */
  readonly lanes?: number
}

export interface OutboxWorker {
  /** Ends after the mails on their way; claims no further one. */
  stop(): Promise<void>
}

const LEASE_MS = 300_000
const POLL_MS = 2_000
const LANES = 3
const MARK_PAUSE_MS = 500
const NOT_PRINTED: MailFailure = { isForGood: false, answer: 'The report that goes with it could not be printed yet.' }

/** A pause that ends early when it is woken; a call while nobody waits shortens the next pause to nothing. */
class Pause {
  private isWoken = false
  private end: (() => void) | null = null

  wake(): void {
    this.isWoken = true
    this.end?.()
  }

  async wait(ms: number): Promise<void> {
    if (!this.isWoken) {
      await new Promise<void>((resolve) => {
        const timer = setTimeout(resolve, ms)
        this.end = () => {
          clearTimeout(timer)
          resolve()
        }
      })
    }
    this.end = null
    this.isWoken = false
  }
}

async function outcomeOf(mail: OutboxEntity, settings: OutboxWorkerSettings): Promise<Outcome> {
  const plan = settings.retry ?? RETRY_PLAN
  let isPrinted = false
  try {
    const attachments = await settings.attachmentsOf(mail)
    isPrinted = true
    await settings.transport.send({ ...mail, date: mail.createdAt, attachments })
    return { state: 'sent' }
  } catch (error) {
    const { isForGood, answer } = isPrinted ? mailFailure(error) : NOT_PRINTED
    settings.log.warn({ mailId: mail.id, tries: mail.tries, isForGood, err: error }, 'a mail was not accepted')
    if (isForGood) return { state: 'refused', answer }
    if (mail.tries >= plan.mostTries) return { state: 'failed', answer }
    return { state: 'queued', answer, retryAt: new Date(Date.now() + retryDelayMs(mail.tries, plan)) }
  }
}

/** Marks the mail, again and again while the database is away and the lease lasts: an unmarked mail would be sent twice. */
async function markWhileLeased(settings: OutboxWorkerSettings, mail: OutboxEntity, outcome: Outcome): Promise<boolean> {
  for (;;) {
    try {
      return await markMail(settings.db.manager, mail, outcome)
    } catch (error) {
      if (Date.now() + MARK_PAUSE_MS >= mail.dueAt.getTime()) throw error
      settings.log.error({ mailId: mail.id, err: error }, 'a mail could not be marked yet')
      await rest(MARK_PAUSE_MS)
    }
  }
}

/** Claims, sends and marks one mail. @returns false when none was due */
async function deliverOne(settings: OutboxWorkerSettings): Promise<boolean> {
  const { db, log, leaseMs = LEASE_MS } = settings
  const mail = await claimMail(db.manager, leaseMs)
  if (mail === null) return false
  const outcome = await outcomeOf(mail, settings)
  const isMarked = await markWhileLeased(settings, mail, outcome)
  if (!isMarked) log.warn({ mailId: mail.id }, 'the lease of a mail ran out before it was marked')
  else log.info({ mailId: mail.id, state: outcome.state, tries: mail.tries }, 'a mail was handled')
  return true
}

/**
 * Sends what stands in the outbox: at once after a commit in this process, else within `pollMs`. Several workers share the
 * work; a mail is never lost, and repeated only when a worker is killed between the server's yes and its own mark.
 */
export function startOutboxWorker(settings: OutboxWorkerSettings): OutboxWorker {
  const { db, log, pollMs = POLL_MS, lanes = LANES } = settings
  const pauses = Array.from({ length: lanes }, () => new Pause())
  const wake = () => pauses.forEach((pause) => pause.wake())
  const signal = new OutboxSignal(wake)
  db.subscribers.push(signal)
  let isStopping = false

  const runLane = async (pause: Pause): Promise<void> => {
    while (!isStopping) {
      const found = await deliverOne(settings).catch((error: unknown) => {
        log.error({ err: error }, 'the outbox could not be worked on')
        return false
      })
      if (!found && !isStopping) await pause.wait(pollMs)
    }
  }
  const running = pauses.map(runLane)

  return {
    async stop() {
      isStopping = true
      wake()
      await Promise.all(running)
      const place = db.subscribers.indexOf(signal)
      if (place !== -1) db.subscribers.splice(place, 1)
    },
  }
}
