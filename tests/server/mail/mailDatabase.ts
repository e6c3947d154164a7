import type { DataSource } from 'typeorm'
import { v7 } from 'uuid'
import { createDataSource, POOL_LIMITS } from '../../../server/dataSource'
import type { DatabaseSettings } from '../../../server/env'
import { FirmEntity } from '../../../server/entities/firm/FirmEntity'
import { OutboxEntity } from '../../../server/entities/dispatch/OutboxEntity'
import { queueMail } from '../../../server/mail/queueMail'
import { makeDatabase, testDatabaseSettings } from '../../support/testDatabase'

/** A database of the mail tests alone: a worker takes every mail of a database, whoever queued it. */
export async function openMailDatabase(name: string): Promise<{ db: DataSource; settings: DatabaseSettings; firmId: string }> {
  const settings = testDatabaseSettings(`_${name}`)
  await makeDatabase(settings)
  const db = await createDataSource(settings, { ...POOL_LIMITS, queryMs: 20_000 }).initialize()
  await db.runMigrations({ transaction: 'none' })
  const firmId = v7()
  await db.manager.insert(FirmEntity, { id: firmId, name: 'Testfield Surveyors', isDemo: false, createdAt: new Date() })
  return { db, settings, firmId }
}

/** Queues a mail with this subject in a transaction of its own. @returns its Message-ID */
export async function queue(db: DataSource, firmId: string, subject: string): Promise<string> {
  const mail = {
    firmId,
    toName: 'Cleo Client',
    toEmail: 'cleo@example.test',
    subject,
    text: `${subject} text`,
    html: `<p>${subject}</p>`,
  }
  return await db.manager.transaction((tx) => queueMail(tx, mail))
}

/** The outbox row with this subject. */
export async function rowOf(db: DataSource, subject: string): Promise<OutboxEntity> {
  return await db.manager.findOneByOrFail(OutboxEntity, { subject })
}

/** Waits until `isSo` holds. @throws Error after `mostMs` */
export async function until(isSo: () => boolean | Promise<boolean>, mostMs = 20_000): Promise<void> {
  for (const end = Date.now() + mostMs; !(await isSo());) {
    if (Date.now() > end) throw new Error('what was waited for did not come about in time')
    await new Promise((resolve) => setTimeout(resolve, 20))
  }
}
