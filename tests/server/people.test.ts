import { randomUUID } from 'node:crypto'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { AuditEntity } from '../../server/entities/AuditEntity'
import { OutboxEntity } from '../../server/entities/dispatch/OutboxEntity'
import { PersonEntity } from '../../server/entities/firm/PersonEntity'
import { SingleUseTokenEntity } from '../../server/entities/session/SingleUseTokenEntity'
import { person, type Person } from '../../shared/contracts/person'
import { clientOf, makePerson, PASSWORD, signedIn } from '../support/factories'
import { TestClient } from '../support/testClient'
import { openTestServer, type TestServer } from '../support/testServer'

let server: TestServer
let nobody: TestClient
beforeAll(async () => {
  server = await openTestServer()
  nobody = new TestClient(server.app)
})
afterAll(() => server.close())

/** Token of the newest mail to this address. */
async function mailedToken(email: string, page: 'invitation' | 'reset'): Promise<string> {
  const [mail] = await server.db.manager.find(OutboxEntity, { where: { toEmail: email }, order: { createdAt: 'DESC' }, take: 1 })
  const link = `${server.env.origin}/${page}#`
  expect(mail!.text).toContain(link)
  expect(mail!.html).toContain(link)
  return mail!.text.split(link)[1]!.trim()
}

async function invite(roles = ['surveyor']) {
  const admin = await signedIn(server, 'admin')
  const email = `${randomUUID()}@example.test`
  const answer = await admin.client.post('/api/people', { name: 'Nora <New>', email, roles })
  return { ...admin, email, answer, invited: answer.as(person) }
}
const fresh = () => `${randomUUID()} marigold`

describe('an invitation', () => {
  it('makes an invited person and a mail with a link that sets the first password', async () => {
    const { email, answer, invited, firmId } = await invite(['surveyor', 'estimator'])
    expect(answer.status).toBe(201)
    expect(invited).toMatchObject({ email, state: 'invited', version: 1, roles: ['surveyor', 'estimator'] })
    const token = await mailedToken(email, 'invitation')
    expect(token).toMatch(/^[\w-]{43}$/)
    const stored = await server.db.manager.findBy(SingleUseTokenEntity, { firmId })
    expect(JSON.stringify(stored)).not.toContain(token)
    const password = fresh()
    expect((await nobody.post('/api/invitations/redeem', { token, name: 'Nora New', password })).status).toBe(204)
    const signIn = await nobody.post('/api/session', { email, password })
    expect(signIn.body).toMatchObject({ person: { name: 'Nora New', roles: ['surveyor', 'estimator'] } })
    const again = await nobody.post('/api/invitations/redeem', { token, name: 'N', password: fresh() })
    expect(again.error.issues?.[0]?.path).toBe('token')
  })

  it('keeps what was typed as text in the mail', async () => {
    const { email } = await invite()
    const mail = await server.db.manager.findOneByOrFail(OutboxEntity, { toEmail: email })
    expect(mail.html).toContain('Nora &lt;New&gt;')
    expect(mail.html).not.toContain('<New>')
  })

  it('sent again, makes the earlier link stop working', async () => {
    const { client, email, invited } = await invite()
    const first = await mailedToken(email, 'invitation')
    expect((await client.post(`/api/people/${invited.id}/invitation`)).status).toBe(200)
    const second = await mailedToken(email, 'invitation')
    expect((await nobody.post('/api/invitations/redeem', { token: first, name: 'N', password: fresh() })).status).toBe(400)
    expect((await nobody.post('/api/invitations/redeem', { token: second, name: 'N', password: fresh() })).status).toBe(204)
    expect((await client.post(`/api/people/${invited.id}/invitation`)).error.code).toBe('conflict')
  })

  it('runs out after seven days', async () => {
    const { email, firmId } = await invite()
    const token = await mailedToken(email, 'invitation')
    const [row] = await server.db.manager.findBy(SingleUseTokenEntity, { firmId })
    expect(row!.expiresAt.getTime() - row!.createdAt.getTime()).toBe(7 * 24 * 3600 * 1000)
    await server.db.manager.update(SingleUseTokenEntity, { firmId }, { expiresAt: new Date(Date.now() - 1) })
    expect((await nobody.post('/api/invitations/redeem', { token, name: 'N', password: fresh() })).status).toBe(400)
  })

  it('does nothing for somebody switched off meanwhile', async () => {
    const { client, email, invited } = await invite()
    const token = await mailedToken(email, 'invitation')
    await client.put(`/api/people/${invited.id}`, { roles: ['surveyor'], state: 'off' }, 1)
    expect((await nobody.post('/api/invitations/redeem', { token, name: 'N', password: fresh() })).status).toBe(400)
  })

  it('is used by one of two who try it at the same moment', async () => {
    const { email } = await invite()
    const token = await mailedToken(email, 'invitation')
    const tries = await Promise.all(
      [1, 2, 3].map(() => nobody.post('/api/invitations/redeem', { token, name: 'N', password: fresh() })),
    )
    expect(tries.map(({ status }) => status).sort()).toEqual([204, 400, 400])
  })

  it.each([
    'a@example.test, b@example.test',
    'a@example.test\r\nBcc: b@example.test',
    'x:a@example.test;',
    '<a@example.test>',
    '"a"@example.test',
  ])('is refused for the address %j', async (email) => {
    const { client } = await signedIn(server, 'admin')
    const answer = await client.post('/api/people', { name: 'N', email, roles: ['surveyor'] })
    expect(answer.error.issues?.[0]?.path).toBe('email')
  })

  it('is refused for an address that the firm has, whatever its case', async () => {
    const { client, email } = await invite()
    const answer = await client.post('/api/people', { name: 'N', email: email.toUpperCase(), roles: ['surveyor'] })
    expect(answer.error).toMatchObject({ code: 'conflict', issues: [{ path: 'email' }] })
  })
})

describe('a new password', () => {
  it.each([
    ['short one', 'fourteen chars'],
    ['aaaaaaaaaaaaaaaaaaaa', 'aaaaaaaaaaaaaaaaaaaa'],
    ['repeated piece', 'qwertqwertqwertqwert'],
    ['run of digits', '1234567890123456'],
    ['common phrase', 'Correct horse battery staple!'],
    ['the firm’s name', 'Testfield-Surveyors-1'],
    ['129 characters', `${'x1'.repeat(64)}y`],
  ])('is refused when it is a %s', async (_what, password) => {
    const { email } = await invite()
    const token = await mailedToken(email, 'invitation')
    const answer = await nobody.post('/api/invitations/redeem', { token, name: 'Nora', password })
    expect(answer.error.issues?.[0]?.path).toBe('password')
    expect(JSON.stringify(answer.body)).not.toContain(password)
    expect((await nobody.post('/api/invitations/redeem', { token, name: 'Nora', password: fresh() })).status).toBe(204)
  })

  it('may hold any characters, spaces and other scripts, unchanged', async () => {
    const { email } = await invite()
    const token = await mailedToken(email, 'invitation')
    const password = '  δρόμος 横断 🏗️ mørk skov  '
    expect((await nobody.post('/api/invitations/redeem', { token, name: 'Nora', password })).status).toBe(204)
    expect((await nobody.post('/api/session', { email, password: password.trim() })).status).toBe(401)
    expect((await nobody.post('/api/session', { email, password })).status).toBe(201)
  })
})

describe('a password reset', () => {
  const mailsTo = (email: string) => server.db.manager.countBy(OutboxEntity, { toEmail: email })

  it('answers alike for every address and mails a link to those it knows', async () => {
    const { firmId } = await signedIn(server, 'admin')
    const { email } = await makePerson(server, firmId, ['surveyor'], { password: PASSWORD })
    const off = await makePerson(server, firmId, ['surveyor'], { password: PASSWORD, state: 'off' })
    const addresses = [email, `${randomUUID()}@example.test`, off.email]
    const answers = await Promise.all(addresses.map((address) => nobody.post('/api/password-resets', { email: address })))
    for (const { status, body } of answers) expect({ status, body }).toEqual({ status: 202, body: {} })
    await expect.poll(() => mailsTo(email)).toBe(1)
    expect(await mailsTo(addresses[1]!)).toBe(0)
    expect(await mailsTo(off.email)).toBe(0)
  })

  it('sets the password once, within ten minutes, and ends every session', async () => {
    const { firmId } = await signedIn(server, 'admin')
    const somebody = await makePerson(server, firmId, ['surveyor'], { password: PASSWORD })
    const client = await clientOf(server, somebody)
    await nobody.post('/api/password-resets', { email: somebody.email })
    await expect.poll(() => mailsTo(somebody.email)).toBe(1)
    const token = await mailedToken(somebody.email, 'reset')
    const [row] = await server.db.manager.findBy(SingleUseTokenEntity, { personId: somebody.id })
    expect(row!.expiresAt.getTime() - row!.createdAt.getTime()).toBe(600_000)
    expect((await nobody.post('/api/invitations/redeem', { token, name: 'N', password: fresh() })).status).toBe(400)
    const password = fresh()
    expect((await nobody.post('/api/password-resets/redeem', { token, password })).status).toBe(204)
    expect((await nobody.post('/api/password-resets/redeem', { token, password: fresh() })).status).toBe(400)
    expect((await client.get('/api/session')).status).toBe(401)
    expect((await nobody.post('/api/session', { email: somebody.email, password: PASSWORD })).status).toBe(401)
    expect((await nobody.post('/api/session', { email: somebody.email, password })).status).toBe(201)
  })

  it('is not taken after ten minutes', async () => {
    const { firmId } = await signedIn(server, 'admin')
    const somebody = await makePerson(server, firmId, ['surveyor'], { password: PASSWORD })
    await nobody.post('/api/password-resets', { email: somebody.email })
    await expect.poll(() => mailsTo(somebody.email)).toBe(1)
    await server.db.manager.update(SingleUseTokenEntity, { personId: somebody.id }, { expiresAt: new Date(Date.now() - 1) })
    const token = await mailedToken(somebody.email, 'reset')
    expect((await nobody.post('/api/password-resets/redeem', { token, password: fresh() })).status).toBe(400)
  })

  it('mails one address at most five times an hour, and says nothing of it', async () => {
    const { firmId } = await signedIn(server, 'admin')
    const { email } = await makePerson(server, firmId, ['surveyor'], { password: PASSWORD })
    for (let run = 0; run < 7; run++) expect((await nobody.post('/api/password-resets', { email })).status).toBe(202)
    await expect.poll(() => mailsTo(email)).toBe(5)
  })

  it.each(['x', 'A'.repeat(43), "' OR 1=1 -- ".padEnd(43, 'x'), null, 5, { $ne: '' }])(
    'is refused with the token %j',
    async (token) => {
      const answer = await nobody.post('/api/password-resets/redeem', { token, password: fresh() })
      expect(answer.status).toBe(400)
      expect(answer.error.issues?.[0]?.path).toBe('token')
    },
  )

  it('links to the configured address, whatever Host the request names', async () => {
    const { firmId } = await signedIn(server, 'admin')
    const { email } = await makePerson(server, firmId, ['surveyor'], { password: PASSWORD })
    await nobody.post(
      '/api/password-resets',
      { email },
      { headers: { Host: 'evil.example', 'X-Forwarded-Host': 'evil.example' } },
    )
    await expect.poll(() => mailsTo(email)).toBe(1)
    expect(await mailedToken(email, 'reset')).toMatch(/^[\w-]{43}$/)
  })
})

describe('changing a person', () => {
  const read = async (client: TestClient, id: string): Promise<Person> =>
    (await client.get('/api/people')).as(person.array()).find((somebody) => somebody.id === id)!

  it('sets roles and state by version, and records the change', async () => {
    const { client, firmId, person: admin } = await signedIn(server, 'admin')
    const somebody = await makePerson(server, firmId, ['surveyor'], { password: PASSWORD })
    const changed = await client.put(`/api/people/${somebody.id}`, { roles: ['estimator', 'estimator'], state: 'active' }, 1)
    expect(changed.as(person)).toMatchObject({ roles: ['estimator'], version: 2 })
    expect((await client.put(`/api/people/${somebody.id}`, { roles: ['admin'], state: 'active' }, 1)).status).toBe(412)
    expect(await read(client, somebody.id)).toEqual(changed.as(person))
    const [event] = await server.db.manager.findBy(AuditEntity, { firmId, event: 'person.changed' })
    expect(event).toMatchObject({ personId: admin.id, detail: { changed: somebody.id, from: { roles: ['surveyor'] } } })
  })

  it('ends the sessions of whoever is switched off', async () => {
    const { client, firmId } = await signedIn(server, 'admin')
    const somebody = await makePerson(server, firmId, ['surveyor'], { password: PASSWORD })
    const theirs = await clientOf(server, somebody)
    await client.put(`/api/people/${somebody.id}`, { roles: ['surveyor'], state: 'off' }, 1)
    expect((await theirs.get('/api/session')).status).toBe(401)
    await client.put(`/api/people/${somebody.id}`, { roles: ['surveyor'], state: 'active' }, 2)
    expect((await theirs.get('/api/session')).status).toBe(401)
  })

  it('never leaves the firm without an admin who can sign in', async () => {
    const { client, firmId, person: admin } = await signedIn(server, 'admin')
    await makePerson(server, firmId, ['admin'], { state: 'invited' })
    await makePerson(server, firmId, ['admin'], { state: 'off', password: PASSWORD })
    await server.db.manager.update(PersonEntity, { firmId, id: admin.id }, { passwordHash: 'x' })
    for (const change of [
      { roles: ['surveyor'], state: 'active' },
      { roles: ['admin'], state: 'off' },
    ]) {
      expect((await client.put(`/api/people/${admin.id}`, change, 1)).error.code).toBe('conflict')
    }
    expect((await client.get('/api/people')).status).toBe(200)
  })

  it('keeps one of two admins who remove each other at the same moment', async () => {
    const { client, firmId, person: one } = await signedIn(server, 'admin')
    const two = await makePerson(server, firmId, ['admin'], { password: PASSWORD })
    await server.db.manager.update(PersonEntity, { firmId, id: one.id }, { passwordHash: 'x' })
    const off = { roles: ['admin'], state: 'off' }
    const answers = await Promise.all([
      client.put(`/api/people/${two.id}`, off, 1),
      (await clientOf(server, two)).put(`/api/people/${one.id}`, off, 1),
    ])
    const active = await server.db.manager.countBy(PersonEntity, { firmId, state: 'active' })
    expect(active).toBe(1)
    expect(answers.filter(({ status }) => status === 200)).toHaveLength(1)
  })

  it('makes nobody active who has no password yet, nor invited who has', async () => {
    const { client, invited, firmId } = await invite()
    const early = await client.put(`/api/people/${invited.id}`, { roles: ['surveyor'], state: 'active' }, 1)
    expect(early.error.issues?.[0]?.path).toBe('state')
    const somebody = await makePerson(server, firmId, ['surveyor'], { password: PASSWORD })
    const late = await client.put(`/api/people/${somebody.id}`, { roles: ['surveyor'], state: 'invited' }, 1)
    expect(late.error.issues?.[0]?.path).toBe('state')
  })

  it.each([
    { roles: [], state: 'active' },
    { roles: ['owner'], state: 'active' },
    { roles: ['admin'] },
    { roles: 'admin', state: 'active' },
  ])('is refused as %j', async (change) => {
    const { client, invited } = await invite()
    expect((await client.put(`/api/people/${invited.id}`, change, 1)).status).toBe(400)
  })
})
