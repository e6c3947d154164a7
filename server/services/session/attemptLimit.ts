import type { EntityManager } from 'typeorm'
import { AppError } from '../../errors'
import { sha256 } from '../sha256'

/** At most `most` attempts of this kind by this subject within `windowS` seconds. */
export interface AttemptRule {
  readonly kind: string
  readonly subject: string
  readonly most: number
  readonly windowS: number
}

const keyOf = ({ kind, subject }: AttemptRule) => sha256(`${kind}\n${subject}`)

/** This attempt's own place in the count: attempts at the same moment get different ones. */
async function countOne(db: EntityManager, rule: AttemptRule, now: Date): Promise<{ count: number; windowStart: Date }> {
  const oldest = new Date(now.getTime() - rule.windowS * 1000)
  const rows: { count: number; windowStart: Date }[] = await db.query(
    `INSERT INTO attempt (subject, window_start, count) VALUES (?, ?, 1)
     ON DUPLICATE KEY UPDATE count = IF(window_start <= ?, 1, count + 1), window_start = IF(window_start <= ?, ?, window_start)
     RETURNING count, window_start AS windowStart`,
    [keyOf(rule), now, oldest, oldest, now],
  )
  return rows[0]!
}

/**
 * Counts one attempt for every rule before it is made, so that attempts at the same moment are counted too.
 * @throws AppError `limited` with the seconds to wait when a rule is exceeded
 */
export async function countAttempt(db: EntityManager, rules: readonly AttemptRule[]): Promise<void> {
  const now = new Date()
  for (const rule of rules) {
    const { count, windowStart } = await countOne(db, rule, now)
    if (count <= rule.most) continue
    const waitS = Math.ceil((windowStart.getTime() + rule.windowS * 1000 - now.getTime()) / 1000)
    throw new AppError('limited', undefined, undefined, Math.max(1, waitS))
  }
}

/** Takes a counted attempt back: it succeeded. */
export async function returnAttempt(db: EntityManager, rules: readonly AttemptRule[]): Promise<void> {
  for (const rule of rules) {
    await db.query('UPDATE attempt SET count = count - 1 WHERE subject = ? AND count > 0', [keyOf(rule)])
  }
}
