import type { DataSource } from 'typeorm'
import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it } from 'vitest'
import { OutboxEntity } from '../../../server/entities/dispatch/OutboxEntity'
import { createLog } from '../../../server/log'
import { createMailTransport } from '../../../server/mail/mailTransport'
import { claimMail, markMail } from '../../../server/mail/outboxClaim'
import { startOutboxWorker, type OutboxWorker } from '../../../server/mail/outboxWorker'
import { openMailDatabase, queue, rowOf, until } from './mailDatabase'
import { smtpAnswer, startSmtpStandIn, type SmtpStandIn } from './smtpStandIn'

const RETRY = { mostTries: 3, firstMs: 10, growth: 1, mostMs: 10 }
const NEVER_MS = 600_000

let db: DataSource
let firmId: string
const running: OutboxWorker[] = []
const servers: SmtpStandIn[] = []

beforeAll(async () => {
  ;({ db, firmId } = await openMailDatabase('outbox'))
})
beforeEach(() => db.manager.deleteAll(OutboxEntity))
afterEach(async () => {
  await Promise.all(running.splice(0).map((worker) => worker.stop()))
  await Promise.all(servers.splice(0).map((server) => server.close()))
})
afterAll(() => db.destroy())

async function smtp(behaviour?: Parameters<typeof startSmtpStandIn>[0]): Promise<SmtpStandIn> {
  const server = await startSmtpStandIn(behaviour)
  servers.push(server)
  return server
}

function work(url: string, more: { pollMs?: number; leaseMs?: number } = {}): OutboxWorker {
  const transport = createMailTransport(url, 'Bothways <bothways@example.test>')
  const attachmentsOf = () => Promise.resolve([])
  const worker = startOutboxWorker({ db, transport, attachmentsOf, log: createLog('silent'), retry: RETRY, pollMs: 20, ...more })
  running.push(worker)
  return worker
}

describe('the outbox worker', () => {
  it('sends at once after the commit, without waiting for its next look', async () => {
    const server = await smtp()
    work(server.url, { pollMs: NEVER_MS })
    await new Promise((resolve) => setTimeout(resolve, 200))
    const messageId = await queue(db, firmId, 'at once')
    await until(async () => (await rowOf(db, 'at once')).state === 'sent')
    expect(server.taken.map(({ from, to }) => [from, to])).toEqual([['bothways@example.test', ['cleo@example.test']]])
    expect(server.taken[0]?.source).toContain(`Message-ID: ${messageId}`)
    expect(await rowOf(db, 'at once')).toMatchObject({ tries: 1, text: '', html: '', lastAnswer: null })
  })

  it('sends nothing of a transaction that was rolled back', async () => {
    const server = await smtp()
    work(server.url)
    const given = db.manager.transaction(async (tx) => {
      await queue({ manager: tx } as DataSource, firmId, 'rolled back')
      throw new Error('no')
    })
    await expect(given).rejects.toThrow('no')
    await queue(db, firmId, 'committed')
    await until(async () => (await rowOf(db, 'committed')).state === 'sent')
    expect(server.taken).toHaveLength(1)
  })

  it('marks a mail refused at the first 5xx to it, with the words of the server', async () => {
    const server = await smtp({ onMail: () => Promise.reject(smtpAnswer(550, 'no such mailbox here')) })
    work(server.url)
    await queue(db, firmId, 'refused')
    await until(async () => (await rowOf(db, 'refused')).state !== 'queued')
    const row = await rowOf(db, 'refused')
    expect(row).toMatchObject({ state: 'refused', tries: 1, sentAt: null })
    expect(row.lastAnswer).toMatch(/550.*no such mailbox here/)
  })

  it('tries again after a 4xx and sends in the end, under the same Message-ID', async () => {
    let calls = 0
    const seen: string[] = []
    const server = await smtp({
      onMail: ({ source }) => {
        seen.push(/Message-ID: (\S+)/.exec(source)?.[1] ?? '')
        return ++calls < 3 ? Promise.reject(smtpAnswer(451, 'try later')) : Promise.resolve()
      },
    })
    work(server.url)
    const messageId = await queue(db, firmId, 'later')
    await until(async () => (await rowOf(db, 'later')).state === 'sent')
    expect(await rowOf(db, 'later')).toMatchObject({ tries: 3 })
    expect(seen).toEqual([messageId, messageId, messageId])
  })

  it('gives a mail up as failed after the stated tries, and keeps what the server said last', async () => {
    const server = await smtp({ onMail: () => Promise.reject(smtpAnswer(451, 'never today')) })
    work(server.url)
    await queue(db, firmId, 'given up')
    await until(async () => (await rowOf(db, 'given up')).state !== 'queued')
    const row = await rowOf(db, 'given up')
    expect([row.state, row.tries, row.text, /never today/.test(row.lastAnswer ?? '')]).toEqual(['failed', 3, '', true])
  })

  it('keeps mails while no server answers and sends them when one does', async () => {
    const gone = await startSmtpStandIn()
    await gone.close()
    const transport = createMailTransport(gone.url, 'bothways@example.test')
    const none = () => Promise.resolve([])
    const patient = { ...RETRY, mostTries: 1_000 }
    const worker = startOutboxWorker({ db, transport, attachmentsOf: none, log: createLog('silent'), retry: patient, pollMs: 20 })
    await queue(db, firmId, 'patient')
    await until(async () => (await rowOf(db, 'patient')).tries >= 2)
    expect((await rowOf(db, 'patient')).state).toBe('queued')
    await worker.stop()
    const server = await smtp()
    work(server.url)
    await until(async () => (await rowOf(db, 'patient')).state === 'sent')
    expect(server.taken).toHaveLength(1)
  })

  it('shares the work with another worker: every mail goes out once', async () => {
    const server = await smtp()
    const subjects = Array.from({ length: 24 }, (_, index) => `shared ${index}`)
    for (const subject of subjects) await queue(db, firmId, subject)
    work(server.url)
    work(server.url)
    await until(async () => (await db.manager.countBy(OutboxEntity, { state: 'sent' })) === subjects.length)
    const sent = server.taken.map(({ source }) => /Subject: (.*)/.exec(source)?.[1]?.trim())
    expect(sent.sort()).toEqual([...subjects].sort())
  })

  it('stops after the mail on its way, and leaves the rest queued', async () => {
    let open: () => void = () => undefined
    const held = new Promise<void>((resolve) => (open = resolve))
    const server = await smtp({ onMail: () => held })
    for (const subject of ['a', 'b', 'c', 'd', 'e']) await queue(db, firmId, subject)
    const worker = work(server.url)
    await until(async () => (await db.manager.countBy(OutboxEntity, { tries: 1 })) === 3)
    const stopped = worker.stop()
    open()
    await stopped
    expect(await db.manager.countBy(OutboxEntity, { state: 'sent' })).toBe(3)
    expect(await db.manager.countBy(OutboxEntity, { state: 'queued', tries: 0 })).toBe(2)
  })
})

describe('a claim', () => {
  it('is passed over by others until its lease runs out, and then marks nothing any more', async () => {
    await queue(db, firmId, 'leased')
    const first = await claimMail(db.manager, 150)
    expect(await claimMail(db.manager, 150)).toBeNull()
    await new Promise((resolve) => setTimeout(resolve, 200))
    const second = await claimMail(db.manager, 60_000)
    expect([first?.tries, second?.tries, second?.id]).toEqual([1, 2, first?.id])
    expect(await markMail(db.manager, first!, { state: 'failed', answer: 'late' })).toBe(false)
    expect((await rowOf(db, 'leased')).state).toBe('queued')
    expect(await markMail(db.manager, second!, { state: 'sent' })).toBe(true)
    expect((await rowOf(db, 'leased')).state).toBe('sent')
  })

  it('skips a row that another transaction holds, instead of waiting for it', async () => {
    await queue(db, firmId, 'held')
    await queue(db, firmId, 'free')
    const held = await rowOf(db, 'held')
    await db.manager.transaction(async (tx) => {
      await tx.query('SELECT id FROM outbox WHERE firm_id = ? AND id = ? FOR UPDATE', [firmId, held.id])
      expect((await claimMail(db.manager, 60_000))?.subject).toBe('free')
    })
  })
})
