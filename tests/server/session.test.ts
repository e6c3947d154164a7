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
import { session } from '../../shared/contracts/session'
import { makeFirm, makePerson, PASSWORD, sessionCookie, signedIn } from '../support/factories'
import { TestClient, type Answer } from '../support/testClient'
import { openTestServer, type TestServer } from '../support/testServer'

let server: TestServer
let nobody: TestClient
beforeAll(async () => {
  server = await openTestServer()
  nobody = new TestClient(server.app)
})
afterAll(() => server.close())

function cookiesOf({ headers }: Answer): Map<string, string> {
  const lines = headers['set-cookie'] as unknown as string[]
  return new Map(lines.map((line) => [line.slice(0, line.indexOf('=')), line.slice(line.indexOf('=') + 1, line.indexOf(';'))]))
}
const cookieHeader = (answer: Answer) => [...cookiesOf(answer)].map(([name, value]) => `${name}=${value}`).join('; ')

async function signInSomebody() {
  const firmId = await makeFirm(server)
  const person = await makePerson(server, firmId, ['surveyor'], { password: PASSWORD })
  const answer = await nobody.post('/api/session', { email: person.email, password: PASSWORD })
  return { firmId, person, answer }
}

describe('signing in', () => {
  it('answers who is signed in and sets two cookies that scripts cannot read', async () => {
    const { person, answer } = await signInSomebody()
    expect(answer.status).toBe(201)
    expect(answer.as(session).person).toMatchObject({ id: person.id, email: person.email, roles: ['surveyor'] })
    for (const line of answer.headers['set-cookie'] as unknown as string[]) {
      expect(line).toMatch(/^bothways-(access|refresh)=.*; Path=\/; .*HttpOnly; SameSite=Strict$/)
      expect(line).not.toContain('Secure')
    }
    expect(answer.headers['cache-control']).toBe('no-store')
    const read = await new TestClient(server.app, cookieHeader(answer)).get('/api/session')
    expect(read.as(session)).toEqual(answer.as(session))
  })

  it('takes the address in any case and with spaces round it', async () => {
    const { person } = await signInSomebody()
    const answer = await nobody.post('/api/session', { email: `  ${person.email.toUpperCase()} `, password: PASSWORD })
    expect(answer.status).toBe(201)
  })

  it('marks the cookies Secure and __Host- exactly when the configured address is https', async () => {
    const secure = await openTestServer({ origin: 'https://bothways.example', isHttps: true })
    const person = await makePerson(secure, await makeFirm(secure), ['surveyor'], { password: PASSWORD })
    const answer = await new TestClient(secure.app).post('/api/session', { email: person.email, password: PASSWORD })
    expect([...cookiesOf(answer).keys()]).toEqual(['__Host-bothways-access', '__Host-bothways-refresh'])
    for (const line of answer.headers['set-cookie'] as unknown as string[]) expect(line).toContain('; Secure')
    expect(answer.headers['strict-transport-security']).toBeDefined()
    expect(answer.headers['content-security-policy']).toContain('upgrade-insecure-requests')
    await secure.close()
  })

  it('answers alike for a wrong password, an unknown address, and somebody invited or switched off', async () => {
    const firmId = await makeFirm(server)
    const { email } = await makePerson(server, firmId, ['surveyor'], { password: PASSWORD })
    const off = await makePerson(server, firmId, ['surveyor'], { password: PASSWORD, state: 'off' })
    const invited = await makePerson(server, firmId, ['surveyor'], { state: 'invited' })
    const answers = [
      await nobody.post('/api/session', { email, password: 'not the password at all' }),
      await nobody.post('/api/session', { email: `${randomUUID()}@example.test`, password: PASSWORD }),
      await nobody.post('/api/session', { email: off.email, password: PASSWORD }),
      await nobody.post('/api/session', { email: invited.email, password: PASSWORD }),
    ]
    const bodies = answers.map(({ status, error: { code, message }, headers }) => ({
      status,
      code,
      message,
      cookie: headers['set-cookie'],
    }))
    for (const body of bodies) expect(body).toEqual(bodies[0])
    expect(bodies[0]).toMatchObject({ status: 401, code: 'unauthenticated', cookie: undefined })
  })

  it('hashes for an unknown address too, so that the time taken says nothing', async () => {
    const firmId = await makeFirm(server)
    const { email } = await makePerson(server, firmId, ['surveyor'], { password: PASSWORD })
    const took = async (address: string) => {
      const times: number[] = []
      for (let run = 0; run < 7; run++) {
        const begun = performance.now()
        await nobody.post('/api/session', { email: address, password: 'not the password at all' })
        times.push(performance.now() - begun)
      }
      return times.sort((a, b) => a - b)[3]!
    }
    await took(`${randomUUID()}@example.test`)
    const [unknown, known] = [await took(`${randomUUID()}@example.test`), await took(email)]
    expect(unknown).toBeGreaterThan(known * 0.5)
    expect(unknown).toBeLessThan(known * 2)
  })

  it('limits attempts on one account, says how long to wait, and counts those at the same moment too', async () => {
    const firmId = await makeFirm(server)
    const { email } = await makePerson(server, firmId, ['surveyor'], { password: PASSWORD })
    const attempts = Array.from({ length: 14 }, () => nobody.post('/api/session', { email, password: 'wrong wrong wrong' }))
    const statuses = (await Promise.all(attempts)).map(({ status }) => status)
    expect(statuses.filter((status) => status === 401)).toHaveLength(10)
    const limited = await nobody.post('/api/session', { email, password: PASSWORD })
    expect(limited.error.code).toBe('limited')
    expect(Number(limited.headers['retry-after'])).toBeGreaterThan(0)
    expect(Number(limited.headers['retry-after'])).toBeLessThanOrEqual(900)
  })

  it('does not count what succeeded', async () => {
    const firmId = await makeFirm(server)
    const { email } = await makePerson(server, firmId, ['surveyor'], { password: PASSWORD })
    for (let run = 0; run < 12; run++) {
      expect((await nobody.post('/api/session', { email, password: PASSWORD })).status).toBe(201)
    }
  })

  it('signs into the firm whose password was given, where one address stands in two', async () => {
    const email = `${randomUUID()}@example.test`
    const [one, two] = [await makeFirm(server, 'One'), await makeFirm(server, 'Two')]
    await makePerson(server, one, ['surveyor'], { email, password: PASSWORD })
    await makePerson(server, two, ['admin'], { email, password: 'another pass phrase for two' })
    const answer = await nobody.post('/api/session', { email, password: 'another pass phrase for two' })
    expect(answer.as(session).firm.name).toBe('Two')
  })

  it.each([
    [{ email: 'a@b', password: 'x' }, 'email'],
    [{ email: 'a@example.test\nBcc: b@example.test', password: 'x' }, 'email'],
    [{ email: 'a@example.test', password: 5 }, 'password'],
    [{ email: 'a@example.test', password: 'x'.repeat(129) }, 'password'],
    [{ email: 'a@example.test' }, 'password'],
    [{ email: 'a@example.test', password: 'x', admin: true }, 'admin'],
  ])('refuses %j, naming %s', async (body, path) => {
    const { status, error } = await nobody.post('/api/session', body)
    expect(status).toBe(400)
    expect(error.issues?.map((issue) => issue.path)).toContain(path)
  })

  it('never quotes a password back', async () => {
    const { body } = await nobody.post('/api/session', { email: 'a@example.test', password: `verysecret${'x'.repeat(200)}` })
    expect(JSON.stringify(body)).not.toContain('verysecret')
  })

  it('records who signed in, and refusals without the address in clear', async () => {
    const { person } = await signInSomebody()
    await nobody.post('/api/session', { email: person.email, password: 'wrong wrong wrong' })
    const accepted = await server.db.manager.findBy(AuditEntity, { personId: person.id, event: 'signIn.accepted' })
    expect(accepted).toHaveLength(1)
    const refused = await server.db.manager.findBy(AuditEntity, { event: 'signIn.refused' })
    expect(refused.filter(({ detail }) => detail['email'] === sha256(person.email))).toHaveLength(1)
    expect(JSON.stringify(refused)).not.toContain(person.email)
  })
})

describe('a session', () => {
  it('ends at once when signed out, for every token of it', async () => {
    const { answer } = await signInSomebody()
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
    const { answer } = await signInSomebody()
    const next = await refresh(tokenOf(answer))
    expect(next.status).toBe(204)
    expect(tokenOf(next)).not.toBe(tokenOf(answer))
    expect((await new TestClient(server.app, cookieHeader(next)).get('/api/session')).status).toBe(200)
  })

  it('gives the same successor to a second tab within ten seconds, also at the same moment', async () => {
    const { answer } = await signInSomebody()
    const token = tokenOf(answer)
    const answers = await Promise.all([refresh(token), refresh(token), refresh(token)])
    expect(answers.map(({ status }) => status)).toEqual([204, 204, 204])
    expect(new Set(answers.map(tokenOf)).size).toBe(1)
  })

  it('ends the whole session when a token comes back after ten seconds', async () => {
    const { person, answer } = await signInSomebody()
    const token = tokenOf(answer)
    const next = await refresh(token)
    await server.db.manager.update(RefreshTokenEntity, { tokenHash: sha256(token) }, { usedAt: new Date(Date.now() - 11_000) })
    expect((await refresh(token)).status).toBe(401)
    expect((await refresh(tokenOf(next))).status).toBe(401)
    expect((await new TestClient(server.app, cookieHeader(next)).get('/api/session')).status).toBe(401)
    expect(await server.db.manager.countBy(AuditEntity, { personId: person.id, event: 'session.reused' })).toBe(1)
  })

  it('keeps no token in clear', async () => {
    const { answer } = await signInSomebody()
    const rows = await server.db.manager.find(RefreshTokenEntity)
    expect(JSON.stringify(rows)).not.toContain(tokenOf(answer))
    expect(rows.map(({ tokenHash }) => tokenHash)).toContain(sha256(tokenOf(answer)))
  })

  it.each(['', 'x', 'a'.repeat(43), '../../etc/passwd', "' OR 1=1 --"])('answers 401 to the token %j', async (token) => {
    expect((await refresh(encodeURIComponent(token))).status).toBe(401)
  })

  it('does not take an access token', async () => {
    const { answer } = await signInSomebody()
    expect((await refresh(cookiesOf(answer).get('bothways-access')!)).status).toBe(401)
  })
})

describe('a change from another site', () => {
  it('is refused by its Origin, and ours is taken', async () => {
    const { client } = await signedIn(server, 'surveyor')
    const foreign = await client.call('delete', '/api/session', { headers: { Origin: 'https://evil.example' } })
    expect(foreign.error.code).toBe('forbidden')
    const ours = await client.call('delete', '/api/session', { headers: { Origin: server.env.origin } })
    expect(ours.status).toBe(204)
  })

  it.each(['text/plain', 'application/x-www-form-urlencoded', 'multipart/form-data; boundary=x'])(
    'is refused as %s',
    async (type) => {
      const answer = await nobody.call('post', '/api/session', {
        headers: { 'Content-Type': type },
        body: '{"email":"a@example.test"}',
      })
      expect(answer.error.code).toBe('unsupported_media_type')
    },
  )

  it('is refused without a body or type on a POST', async () => {
    const cookie = await sessionCookie(server, (await signedIn(server, 'admin')).person)
    const answer = await new TestClient(server.app, cookie).call('post', '/api/session/refresh')
    expect(answer.status).toBe(415)
  })
})
