import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { randomUUID } from 'node:crypto'
import jsonwebtoken from 'jsonwebtoken'
import { AuditEntity } from '../../server/entities/AuditEntity'
import { PersonEntity } from '../../server/entities/firm/PersonEntity'
import { PersonRoleEntity } from '../../server/entities/firm/PersonRoleEntity'
import { RefreshTokenEntity } from '../../server/entities/session/RefreshTokenEntity'
import { SessionEntity } from '../../server/entities/session/SessionEntity'
import { issueAccessToken, tokenKey } from '../../server/services/session/accessToken'
import { sha256 } from '../../server/services/sha256'
import { signedIn } from '../support/factories'
import { cookieHeader, cookiesOf, signInSomebody } from '../support/signInSomebody'
import { TestClient, type Answer } from '../support/testClient'
import { openTestServer, type TestServer } from '../support/testServer'

let server: TestServer
beforeAll(async () => {
  server = await openTestServer()
})
afterAll(() => server.close())

describe('a session', () => {
  it('ends at once when signed out, for every token of it', async () => {
    const { answer } = await signInSomebody(server)
    const client = new TestClient(server.app, cookieHeader(answer))
    const out = await client.delete('/api/session')
    expect(out.status).toBe(204)
    expect([...cookiesOf(out).values()]).toEqual(['', ''])
    expect((await client.get('/api/session')).status).toBe(401)
    expect((await client.post('/api/session/refresh')).status).toBe(401)
  })

  it('follows changes of roles and state on the next request', async () => {
    const { firmId, person, client } = await signedIn(server, 'surveyor')
    expect((await client.get('/api/projects')).status).toBe(200)
    await server.db.manager.delete(PersonRoleEntity, { firmId, personId: person.id })
    expect((await client.get('/api/projects')).status).toBe(403)
    await server.db.manager.update(PersonEntity, { firmId, id: person.id }, { state: 'off' })
    expect((await client.get('/api/projects')).status).toBe(401)
  })

  it('ends when its time is over', async () => {
    const { person, client } = await signedIn(server, 'surveyor')
    await server.db.manager.update(SessionEntity, { personId: person.id }, { expiresAt: new Date(Date.now() - 1000) })
    expect((await client.get('/api/session')).status).toBe(401)
  })
})

describe('an access token', () => {
  const settings = () => ({ secret: server.env.sessionSecret, origin: server.env.origin })
  async function asked(token: string): Promise<number> {
    return (await new TestClient(server.app, `bothways-access=${token}`).get('/api/session')).status
  }
  async function good() {
    const { person } = await signedIn(server, 'surveyor')
    const row = await server.db.manager.findOneByOrFail(SessionEntity, { personId: person.id })
    return { personId: person.id, sessionId: row.id, token: issueAccessToken(settings(), person.id, row.id) }
  }
  const sign = (claims: object, options: jsonwebtoken.SignOptions = {}, key?: jsonwebtoken.Secret) =>
    jsonwebtoken.sign(claims, key ?? tokenKey(server.env.sessionSecret, 'access'), { algorithm: 'HS256', ...options })

  it('is taken when it is ours and fresh', async () => {
    expect(await asked((await good()).token)).toBe(200)
  })

  it.each<[string, (id: { personId: string; sessionId: string }) => string]>([
    [
      'unsigned',
      ({ personId, sessionId }) => {
        const part = (value: object) => Buffer.from(JSON.stringify(value)).toString('base64url')
        const { origin } = settings()
        const exp = Math.floor(Date.now() / 1000) + 600
        return `${part({ alg: 'none', typ: 'JWT' })}.${part({ iss: origin, aud: origin, sub: personId, sid: sessionId, typ: 'access', iat: exp - 600, exp })}.`
      },
    ],
    [
      'signed by the bare secret',
      ({ personId, sessionId }) =>
        sign(
          { sid: sessionId, typ: 'access' },
          { issuer: settings().origin, audience: settings().origin, subject: personId, expiresIn: 600 },
          settings().secret,
        ),
    ],
    [
      'signed by another algorithm',
      ({ personId, sessionId }) =>
        sign(
          { sid: sessionId, typ: 'access' },
          { algorithm: 'HS384', issuer: settings().origin, audience: settings().origin, subject: personId, expiresIn: 600 },
        ),
    ],
    [
      'for another audience',
      ({ personId, sessionId }) =>
        sign(
          { sid: sessionId, typ: 'access' },
          { issuer: settings().origin, audience: 'https://elsewhere.example', subject: personId, expiresIn: 600 },
        ),
    ],
    [
      'of another issuer',
      ({ personId, sessionId }) =>
        sign(
          { sid: sessionId, typ: 'access' },
          { issuer: 'https://elsewhere.example', audience: settings().origin, subject: personId, expiresIn: 600 },
        ),
    ],
    [
      'of another type',
      ({ personId, sessionId }) =>
        sign(
          { sid: sessionId, typ: 'refresh' },
          { issuer: settings().origin, audience: settings().origin, subject: personId, expiresIn: 600 },
        ),
    ],
    [
      'without an end',
      ({ personId, sessionId }) =>
        sign({ sid: sessionId, typ: 'access' }, { issuer: settings().origin, audience: settings().origin, subject: personId }),
    ],
    [
      'run out',
      ({ personId, sessionId }) =>
        sign(
          { sid: sessionId, typ: 'access' },
          { issuer: settings().origin, audience: settings().origin, subject: personId, expiresIn: -1 },
        ),
    ],
    ['of somebody else on this session', ({ sessionId }) => issueAccessToken(settings(), randomUUID(), sessionId)],
    ['of a session that never was', ({ personId }) => issueAccessToken(settings(), personId, randomUUID())],
    ['cut short', () => 'eyJhbGciOiJIUzI1NiJ9'],
    ['no token at all', () => '%00'],
  ])('is refused when %s', async (_what, forge) => {
    const ids = await good()
    expect(await asked(forge(ids))).toBe(401)
  })
})

describe('refreshing', () => {
  const refresh = (token: string) => new TestClient(server.app, `bothways-refresh=${token}`).post('/api/session/refresh')
  const tokenOf = (answer: Answer) => cookiesOf(answer).get('bothways-refresh')!

  it('gives new tokens that work', async () => {
    const { answer } = await signInSomebody(server)
    const next = await refresh(tokenOf(answer))
    expect(next.status).toBe(204)
    expect(tokenOf(next)).not.toBe(tokenOf(answer))
    expect((await new TestClient(server.app, cookieHeader(next)).get('/api/session')).status).toBe(200)
  })

  it('gives the same successor to a second tab within ten seconds, also at the same moment', async () => {
    const { answer } = await signInSomebody(server)
    const token = tokenOf(answer)
    const answers = await Promise.all([refresh(token), refresh(token), refresh(token)])
    expect(answers.map(({ status }) => status)).toEqual([204, 204, 204])
    expect(new Set(answers.map(tokenOf)).size).toBe(1)
  })

  it('ends the whole session when a token comes back after ten seconds', async () => {
    const { person, answer } = await signInSomebody(server)
    const token = tokenOf(answer)
    const next = await refresh(token)
    await server.db.manager.update(RefreshTokenEntity, { tokenHash: sha256(token) }, { usedAt: new Date(Date.now() - 11_000) })
    expect((await refresh(token)).status).toBe(401)
    expect((await refresh(tokenOf(next))).status).toBe(401)
    expect((await new TestClient(server.app, cookieHeader(next)).get('/api/session')).status).toBe(401)
    expect(await server.db.manager.countBy(AuditEntity, { personId: person.id, event: 'session.reused' })).toBe(1)
  })

  it('keeps no token in clear', async () => {
    const { answer } = await signInSomebody(server)
    const rows = await server.db.manager.find(RefreshTokenEntity)
    expect(JSON.stringify(rows)).not.toContain(tokenOf(answer))
    expect(rows.map(({ tokenHash }) => tokenHash)).toContain(sha256(tokenOf(answer)))
  })

  it.each(['', 'x', 'a'.repeat(43), '../../etc/passwd', "' OR 1=1 --"])('answers 401 to the token %j', async (token) => {
    expect((await refresh(encodeURIComponent(token))).status).toBe(401)
  })

  it('does not take an access token', async () => {
    const { answer } = await signInSomebody(server)
    expect((await refresh(cookiesOf(answer).get('bothways-access')!)).status).toBe(401)
  })
})
