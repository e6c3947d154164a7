import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { randomUUID } from 'node:crypto'
import { AuditEntity } from '../../server/entities/AuditEntity'
import { sha256 } from '../../server/services/sha256'
import { session } from '../../shared/contracts/session'
import { makeFirm, makePerson, PASSWORD, sessionCookie, signedIn } from '../support/factories'
import { cookieHeader, cookiesOf, signInSomebody } from '../support/signInSomebody'
import { TestClient } from '../support/testClient'
import { openTestServer, type TestServer } from '../support/testServer'

let server: TestServer
let nobody: TestClient
beforeAll(async () => {
  server = await openTestServer()
  nobody = new TestClient(server.app)
})
afterAll(() => server.close())

describe('signing in', () => {
  it('answers who is signed in and sets two cookies that scripts cannot read', async () => {
    const { person, answer } = await signInSomebody(server)
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
    const { person } = await signInSomebody(server)
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
    const { person } = await signInSomebody(server)
    await nobody.post('/api/session', { email: person.email, password: 'wrong wrong wrong' })
    const accepted = await server.db.manager.findBy(AuditEntity, { personId: person.id, event: 'signIn.accepted' })
    expect(accepted).toHaveLength(1)
    const refused = await server.db.manager.findBy(AuditEntity, { event: 'signIn.refused' })
    expect(refused.filter(({ detail }) => detail['email'] === sha256(person.email))).toHaveLength(1)
    expect(JSON.stringify(refused)).not.toContain(person.email)
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
