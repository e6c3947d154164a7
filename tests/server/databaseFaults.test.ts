import { once } from 'node:events'
import { mkdtempSync, rmSync } from 'node:fs'
import { connect, createServer, type Server, type Socket } from 'node:net'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import type { DataSource } from 'typeorm'
import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { createApp } from '../../server/app'
import { createDataSource, POOL_LIMITS, type PoolLimits } from '../../server/dataSource'
import { createLog } from '../../server/log'
import { createAppraisalPool } from '../../server/services/appraisal/appraisalPool'
import { inTransaction } from '../../server/services/transaction'
import { isUnavailable } from '../../server/services/unavailable'
import { signedIn } from '../support/factories'
import type { TestClient } from '../support/testClient'
import { openTestDatabase, testDatabaseSettings } from '../support/testDatabase'
import { testEnv } from '../support/testServer'

/** A line to the database that can be cut, or whose present connections can be left open with nothing coming through. */
class Line {
  readonly folder = mkdtempSync(join(tmpdir(), 'bothways-line-'))
  readonly path = join(this.folder, 'db.sock')
  private readonly sockets = new Set<Socket>()
  private silent: { isSilent: boolean } = { isSilent: false }
  private server: Server | undefined

  constructor(private readonly target: string) {}

  async open(): Promise<void> {
    this.server = createServer((near) => {
      const far = connect(this.target)
      const state = this.silent
      for (const socket of [near, far]) {
        this.sockets.add(socket)
        socket.on('error', () => socket.destroy()).on('close', () => this.sockets.delete(socket))
      }
      near.on('data', (bytes) => state.isSilent || far.write(bytes)).on('end', () => far.end())
      far.on('data', (bytes) => state.isSilent || near.write(bytes)).on('end', () => near.end())
    }).listen(this.path)
    await once(this.server, 'listening')
  }

  /** Nothing comes through any connection made so far; later ones work. */
  silence(): void {
    this.silent.isSilent = true
    this.silent = { isSilent: false }
  }

  async cut(): Promise<void> {
    for (const socket of this.sockets) socket.destroy()
    this.server?.close()
    if (this.server?.listening) await once(this.server, 'close')
  }
}

describe('the database', () => {
  let line: Line
  let db: DataSource
  let client: TestClient
  let close: () => Promise<void>

  async function open(limits: Partial<PoolLimits> = {}): Promise<void> {
    await (await openTestDatabase()).destroy()
    const settings = testDatabaseSettings()
    line = new Line(settings.socketPath!)
    await line.open()
    db = await createDataSource({ ...settings, socketPath: line.path }, { ...POOL_LIMITS, ...limits }).initialize()
    const env = testEnv()
    const appraisals = createAppraisalPool()
    const app = createApp({ db, env, appraisals, log: createLog('silent') })
    ;({ client } = await signedIn({ app, db, env, close: () => Promise.resolve() }, 'surveyor'))
    close = async () => {
      await db.destroy()
      await appraisals.close()
    }
  }
  beforeEach(() => open())
  afterEach(async () => {
    await close()
    await line.cut()
    rmSync(line.folder, { recursive: true, force: true })
  })

  const timed = async (path: string) => {
    const begun = performance.now()
    const answer = await client.get(path)
    return { answer, tookMs: performance.now() - begun }
  }

  it('gone is answered 503 within 2 s, and 200 again once it is back, without a restart', async () => {
    expect((await client.get('/readyz')).status).toBe(200)
    await line.cut()
    for (const path of ['/api/projects', '/readyz']) {
      const { answer, tookMs } = await timed(path)
      expect(answer.status).toBe(503)
      expect(answer.error.code).toBe('unavailable')
      expect(answer.headers['retry-after']).toBe('1')
      expect(tookMs).toBeLessThan(2_000)
    }
    expect((await client.get('/livez')).status).toBe(200)
    await line.open()
    await expect.poll(async () => (await client.get('/api/projects')).status, { timeout: 5_000 }).toBe(200)
  })

  it('that no longer answers is given up after the time limit, and its connections are not used again', async () => {
    await Promise.all(Array.from({ length: 20 }, () => client.get('/api/projects')))
    line.silence()
    const { answer, tookMs } = await timed('/api/projects')
    expect(answer.status).toBe(503)
    expect(tookMs).toBeLessThan(POOL_LIMITS.queryMs + 1_000)
    await Promise.all(Array.from({ length: 30 }, () => client.get('/api/projects')))
    const many = await Promise.all(Array.from({ length: 30 }, () => client.get('/api/projects')))
    expect(new Set(many.map(({ status }) => status))).toEqual(new Set([200]))
  })

  it('busy with slow queries turns away what does not fit into the queue', async () => {
    await close()
    await line.cut()
    await open({ connections: 2, waiting: 3, queryMs: 5_000 })
    const slow = [1, 2].map(() => db.query('SELECT SLEEP(1)'))
    const crowd = await Promise.all(Array.from({ length: 10 }, () => client.get('/readyz')))
    const statuses = crowd.map(({ status }) => status)
    expect(statuses.filter((status) => status === 200)).toHaveLength(3)
    expect(statuses.filter((status) => status === 503)).toHaveLength(7)
    await Promise.all(slow)
  })

  it('is told apart from a fault of ours', async () => {
    const fault = await db.query('SELECT nonsense FROM nowhere').catch((error: unknown) => error)
    expect(isUnavailable(fault)).toBe(false)
    expect(isUnavailable(new TypeError('x is not a function'))).toBe(false)
  })
})

describe('a transaction', () => {
  let db: DataSource
  beforeEach(async () => {
    db = await openTestDatabase()
    await db.query('CREATE TABLE IF NOT EXISTS trial (id int PRIMARY KEY, n int NOT NULL)')
    await db.query('REPLACE INTO trial VALUES (1, 0), (2, 0)')
  })
  afterEach(() => db.destroy())

  it('that lost a deadlock is run again as a whole', async () => {
    let runs = 0
    const add = (first: number, second: number) =>
      inTransaction(db.manager, async (tx) => {
        runs++
        await tx.query('UPDATE trial SET n = n + 1 WHERE id = ?', [first])
        await new Promise((resolve) => setTimeout(resolve, 150))
        await tx.query('UPDATE trial SET n = n + 1 WHERE id = ?', [second])
      })
    await Promise.all([add(1, 2), add(2, 1)])
    expect(await db.query('SELECT n FROM trial ORDER BY id')).toEqual([{ n: 2 }, { n: 2 }])
    expect(runs).toBe(3)
  })

  it('that fails leaves nothing half written, and is not run again for an error of ours', async () => {
    let runs = 0
    const broken = inTransaction(db.manager, async (tx) => {
      runs++
      await tx.query('UPDATE trial SET n = 7 WHERE id = 1')
      throw new Error('no')
    })
    await expect(broken).rejects.toThrow('no')
    expect(await db.query('SELECT n FROM trial WHERE id = 1')).toEqual([{ n: 0 }])
    expect(runs).toBe(1)
  })
})
