import { createDataSource, POOL_LIMITS } from '../../../server/dataSource'
import type { DatabaseSettings } from '../../../server/env'
import { createLog } from '../../../server/log'
import { createMailTransport } from '../../../server/mail/mailTransport'
import { startOutboxWorker } from '../../../server/mail/outboxWorker'

/** A worker in a process of its own, to be killed: settings come as JSON in the first argument. */
const { settings, url, leaseMs } = JSON.parse(process.argv[2] ?? '') as {
  settings: DatabaseSettings
  url: string
  leaseMs: number
}
const db = await createDataSource(settings, { ...POOL_LIMITS, queryMs: 60_000 }).initialize()
startOutboxWorker({
  db,
  transport: createMailTransport(url, 'Bothways <bothways@example.test>'),
  attachmentsOf: () => Promise.resolve([]),
  log: createLog('silent'),
  leaseMs,
  pollMs: 50,
})
