import { MoreThan, type EntityManager } from 'typeorm'
import { FirmEntity } from '../entities/firm/FirmEntity'
import { OutboxEntity } from '../entities/dispatch/OutboxEntity'
import { AppError } from '../errors'

/** Mails that one firm may queue within 24 hours. */
export const MAILS_A_DAY = 200
const DAY_MS = 86_400_000

/**
 * Holds the firm's row until the transaction ends, so that mails queued side by side are counted one after the other.
 * @throws AppError `limited` when the firm has queued `MAILS_A_DAY` mails within the last 24 hours
 */
export async function requireMailAllowance(tx: EntityManager, firmId: string, now = new Date()): Promise<void> {
  await tx.findOne(FirmEntity, { select: { id: true }, where: { id: firmId }, lock: { mode: 'pessimistic_write' } })
  const queued = await tx.countBy(OutboxEntity, { firmId, createdAt: MoreThan(new Date(now.getTime() - DAY_MS)) })
  if (queued < MAILS_A_DAY) return
  throw new AppError(
    'limited',
    `Your firm has sent ${MAILS_A_DAY} e-mails within a day. Send the next one tomorrow.`,
    undefined,
    3_600,
  )
}
