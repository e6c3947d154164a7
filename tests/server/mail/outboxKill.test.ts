import { spawn, type ChildProcess } from 'node:child_process'
import { once } from 'node:events'
import { fileURLToPath } from 'node:url'
import type { DataSource } from 'typeorm'
import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest'
import type { DatabaseSettings } from '../../../server/env'
import { openMailDatabase, queue, rowOf, until } from './mailDatabase'
import { startSmtpStandIn, type SmtpStandIn } from './smtpStandIn'

const PROGRAM = fileURLToPath(new URL('./outboxProcess.ts', import.meta.url))
const LEASE_MS = 3_000
/** Two processes are started in turn: on a busy machine that takes a while. */
const TIME_MS = 120_000

let db: DataSource
let settings: DatabaseSettings
let firmId: string
const children: ChildProcess[] = []
const servers: SmtpStandIn[] = []

beforeAll(async () => {
  ;({ db, settings, firmId } = await openMailDatabase('kill'))
})
afterEach(async () => {
  await Promise.all(children.splice(0).map(kill))
  await Promise.all(servers.splice(0).map((server) => server.close()))
})
afterAll(() => db.destroy())

function startWorker(url: string): ChildProcess {
  const child = spawn(process.execPath, ['--import', 'tsx', PROGRAM, JSON.stringify({ settings, url, leaseMs: LEASE_MS })], {
    stdio: ['ignore', 'ignore', 'inherit'],
  })
  children.push(child)
  return child
}

async function kill(child: ChildProcess): Promise<void> {
  if (child.exitCode !== null || child.signalCode !== null) return
  const ended = once(child, 'exit')
  child.kill('SIGKILL')
  await ended
}

const idsOf = ({ taken }: SmtpStandIn) => taken.map(({ source }) => /Message-ID: (\S+)/.exec(source)?.[1])

describe('a worker that is killed', { timeout: TIME_MS }, () => {
  it('between the yes of the server and its mark leads to one repetition, under the same Message-ID', async () => {
    const holder = db.createQueryRunner()
    let holds = 0
    const server = await startSmtpStandIn({
      onMail: async () => {
        if (holds++ > 0) return
        await holder.startTransaction()
        await holder.query('SELECT id FROM outbox WHERE subject = ? FOR UPDATE', ['accepted'])
      },
    })
    servers.push(server)
    const messageId = await queue(db, firmId, 'accepted')
    const child = startWorker(server.url)
    await until(() => server.taken.length === 1, TIME_MS)
    await new Promise((resolve) => setTimeout(resolve, 300))
    expect((await rowOf(db, 'accepted')).state).toBe('queued')
    await kill(child)
    await holder.rollbackTransaction()
    await holder.release()
    startWorker(server.url)
    await until(async () => (await rowOf(db, 'accepted')).state === 'sent', TIME_MS)
    expect(idsOf(server)).toEqual([messageId, messageId])
  })

  it('before the server has said yes loses nothing and repeats nothing', async () => {
    let arrivals = 0
    const server = await startSmtpStandIn({
      onMail: () => (++arrivals === 1 ? new Promise<void>(() => undefined) : Promise.resolve()),
    })
    servers.push(server)
    const messageId = await queue(db, firmId, 'not yet')
    const child = startWorker(server.url)
    await until(() => arrivals === 1, TIME_MS)
    await kill(child)
    expect((await rowOf(db, 'not yet')).state).toBe('queued')
    startWorker(server.url)
    await until(async () => (await rowOf(db, 'not yet')).state === 'sent', TIME_MS)
    expect(idsOf(server)).toEqual([messageId])
  })
})
