import { Writable } from 'node:stream'
import type { DestinationStream } from 'pino'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { createApp } from '../../server/app'
import { createLog } from '../../server/log'
import { createAppraisalPool } from '../../server/services/appraisal/appraisalPool'
import { makeFirm, makePerson, PASSWORD } from '../support/factories'
import { TestClient } from '../support/testClient'
import { openTestServer, type TestServer } from '../support/testServer'

let server: TestServer
const lines: string[] = []
const stream = new Writable({
  write(chunk: Buffer, _encoding, done) {
    lines.push(chunk.toString())
    done()
  },
})
beforeAll(async () => {
  server = await openTestServer()
})
afterAll(() => server.close())

function listening(): TestClient {
  const log = createLog('debug', stream as unknown as DestinationStream as never)
  return new TestClient(createApp({ db: server.db, env: server.env, log, appraisals: createAppraisalPool() }))
}

describe('the log', () => {
  it('has one line a request with id, method, path, status and time', async () => {
    await listening().get('/livez?secret=1')
    const [line] = lines.map((text) => JSON.parse(text) as Record<string, unknown>)
    expect(line).toMatchObject({ req: { method: 'GET', path: '/livez' }, res: { status: 200 } })
    expect(JSON.stringify(line)).not.toContain('secret')
  })

  it('never holds a password, a token, a cookie, an address or a query', async () => {
    const { email } = await makePerson(server, await makeFirm(server), ['surveyor'], { password: PASSWORD })
    const answer = await listening().post('/api/session', { email, password: PASSWORD })
    const cookies = (answer.headers['set-cookie'] as unknown as string[]).map((cookie) => /=([^;]+)/.exec(cookie)![1]!)
    await listening().post('/api/session', { email, password: 'wrong wrong wrong' })
    await listening().post('/api/password-resets/redeem?x=secret', { token: 'T'.repeat(43), password: 'another long password' })
    const text = lines.join('')
    for (const secret of [PASSWORD, 'wrong wrong', 'another long', 'T'.repeat(43), email, 'secret', ...cookies]) {
      expect(text).not.toContain(secret)
    }
  })

  it('tells a fault of ours whole, without the statement and its values, and the caller one neutral sentence', async () => {
    const log = createLog('debug', stream as unknown as DestinationStream as never)
    const broken = { ...server.db, manager: { query: () => Promise.reject(faulty()) } } as unknown as TestServer['db']
    const app = createApp({ db: broken, env: server.env, log, appraisals: createAppraisalPool() })
    const answer = await new TestClient(app).get('/readyz')
    expect(answer.status).toBe(500)
    expect(answer.error.code).toBe('internal')
    expect(JSON.stringify(answer.body)).not.toMatch(/boom|SELECT|at /)
    const logged = lines.map((text) => JSON.parse(text) as Record<string, unknown>).find(({ err }) => err !== undefined)
    expect(logged).toMatchObject({ requestId: answer.error.requestId, err: { type: 'Error', message: 'boom' } })
    expect(JSON.stringify(logged)).not.toContain('hunter2')
  })
})

const faulty = () => Object.assign(new Error('boom'), { sql: "SELECT 'hunter2'", parameters: ['hunter2'] })
