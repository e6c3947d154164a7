import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { z } from 'zod'
import type { ItemCode } from '../../shared/contracts/appraisal'
import { contact, dispatch, type Contact, type Dispatch } from '../../shared/contracts/dispatch'
import { storedLevel, storedScheme, project, type Project } from '../../shared/contracts/project'
import { DispatchEntity } from '../../server/entities/dispatch/DispatchEntity'
import { OutboxEntity } from '../../server/entities/dispatch/OutboxEntity'
import { RateEntity } from '../../server/entities/rates/RateEntity'
import { EditionEntity } from '../../server/entities/rates/EditionEntity'
import { frozenComparison } from '../../server/reports/frozenComparison'
import { clientOf, makeEdition, makePerson, signedIn, type TestPerson } from '../support/factories'
import { sampleLevel, sampleProject, sampleRibbed, sampleSolid } from '../support/sampleProject'
import type { TestClient } from '../support/testClient'
import { openTestServer, type TestServer } from '../support/testServer'

let server: TestServer
beforeAll(async () => {
  server = await openTestServer()
})
afterAll(() => server.close())

interface Ready {
  readonly firmId: string
  readonly client: TestClient
  readonly person: TestPerson
  readonly project: Project
  readonly contact: Contact
  readonly input: { contactId: string; ribbedSchemeId: string; solidSchemeId: string; note: string }
}

/** A firm with a priced project of one level, both schemes and a contact. */
async function readyProject(
  change: { name?: string; hasLevel?: boolean; hasEdition?: boolean; withoutRate?: ItemCode } = {},
): Promise<Ready> {
  const { firmId, person, client } = await signedIn(server, 'surveyor')
  const editionId = await makeEdition(server, firmId, 'draft')
  if (change.withoutRate) await server.db.manager.delete(RateEntity, { firmId, editionId, item: change.withoutRate })
  await server.db.manager.update(EditionEntity, { firmId, id: editionId }, { state: 'published' })
  const typed = sampleProject({
    ...(change.name === undefined ? {} : { name: change.name }),
    editionId: change.hasEdition === false ? null : editionId,
  })
  const made = (await client.post('/api/projects', typed)).as(project)
  if (change.hasLevel !== false) (await client.post(`/api/projects/${made.id}/levels`, sampleLevel())).as(storedLevel)
  const ribbed = (await client.post(`/api/projects/${made.id}/schemes`, sampleRibbed())).as(storedScheme)
  const solid = (await client.post(`/api/projects/${made.id}/schemes`, sampleSolid())).as(storedScheme)
  const known = (await client.post(`/api/projects/${made.id}/contacts`, { name: 'Cleo Client', email: 'cleo@example.test' })).as(
    contact,
  )
  const input = { contactId: known.id, ribbedSchemeId: ribbed.id, solidSchemeId: solid.id, note: 'As agreed.' }
  return { firmId, client, person, project: made, contact: known, input }
}

async function send({ client, project: { id }, input }: Ready, key?: string): Promise<Dispatch> {
  const answer = await client.post(`/api/projects/${id}/dispatches`, input, key === undefined ? {} : { key })
  expect(answer.status, JSON.stringify(answer.body)).toBe(201)
  return answer.as(dispatch)
}

describe('contacts', () => {
  it('are listed by name, and refused when the address is taken or no single address', async () => {
    const { client, project: made } = await readyProject()
    const path = `/api/projects/${made.id}/contacts`
    expect((await client.post(path, { name: 'Abe', email: 'ABE@example.test' })).as(contact).email).toBe('abe@example.test')
    expect((await client.get(path)).as(z.array(contact)).map(({ name }) => name)).toEqual(['Abe', 'Cleo Client'])
    const twice = await client.post(path, { name: 'Abe', email: 'abe@example.test' })
    expect([twice.status, twice.error.issues?.[0]?.path]).toEqual([409, 'email'])
    for (const email of ['a@b.test, c@d.test', 'a@b.test\r\nBcc: c@d.test', 'group:a@b.test;', '"x y"@b.test', '<a@b.test>']) {
      const refused = await client.post(path, { name: 'X', email })
      expect([email, refused.status, refused.error.issues?.[0]?.path]).toEqual([email, 400, 'email'])
    }
  })

  it("answer 404 for another firm's project and 403 without the role", async () => {
    const { project: made, firmId } = await readyProject()
    const other = await signedIn(server, 'surveyor')
    expect((await other.client.get(`/api/projects/${made.id}/contacts`)).status).toBe(404)
    expect((await other.client.post(`/api/projects/${made.id}/contacts`, { name: 'X', email: 'x@example.test' })).status).toBe(
      404,
    )
    const estimator = await clientOf(server, await makePerson(server, firmId, ['estimator']))
    expect((await estimator.get(`/api/projects/${made.id}/contacts`)).status).toBe(403)
  })
})

describe('sending a comparison', () => {
  it('freezes what was compared and queues the mail with it', async () => {
    const ready = await readyProject()
    const sent = await send(ready)
    expect(sent).toMatchObject({ state: 'queued', tries: 0, between: ['R1', 'S1'], contact: ready.contact, sentAt: null })
    const key = { firmId: ready.firmId, dispatchId: sent.id }
    const mail = await server.db.manager.findOneByOrFail(OutboxEntity, key)
    expect(mail).toMatchObject({ state: 'queued', toEmail: 'cleo@example.test', messageId: sent.messageId })
    const row = await server.db.manager.findOneOrFail(DispatchEntity, {
      select: { firmId: true, id: true, frozen: true },
      where: { firmId: ready.firmId, id: sent.id },
    })
    const frozen = frozenComparison.parse(row.frozen)
    expect(frozen.project.name).toBe('Alder Row')
    expect(frozen.floor).toEqual({ areaM2: 60, floorCount: 2, panelCount: 2 })
    expect(frozen.calculations).toHaveLength(2)
    const kept = JSON.stringify({ ...frozen, calculations: undefined })
    for (const secret of ['"rate"', '"rates"', '"amount"', '"percent"', '"lines"', '1.62', '4.45']) {
      expect([secret, kept.includes(secret)]).toEqual([secret, false])
    }
  })

  it('keeps the report as it was when the project changes afterwards', async () => {
    const ready = await readyProject()
    const sent = await send(ready)
    const before = await ready.client.get(`/api/dispatches/${sent.id}/report.html`)
    const changed = await ready.client.put(
      `/api/projects/${ready.project.id}`,
      { ...sampleProject({ name: 'Renamed' }), reference: ready.project.reference },
      ready.project.version,
    )
    expect(changed.status).toBe(200)
    expect((await ready.client.get(`/api/dispatches/${sent.id}/report.html`)).body).toBe(before.body)
    expect(before.body).toContain('Alder Row')
  })

  it('makes one dispatch and one mail of fifty requests under one key, and refuses another request under it', async () => {
    const ready = await readyProject()
    const sent = await Promise.all(Array.from({ length: 50 }, () => send(ready, 'once')))
    expect(new Set(sent.map(({ id }) => id)).size).toBe(1)
    expect(await server.db.manager.countBy(OutboxEntity, { firmId: ready.firmId })).toBe(1)
    const path = `/api/projects/${ready.project.id}/dispatches`
    expect((await ready.client.post(path, { ...ready.input, note: 'another' }, { key: 'once' })).status).toBe(422)
  })

  it('refuses schemes and contacts that are not the project’s, naming the field', async () => {
    const ready = await readyProject()
    const other = await readyProject()
    const path = `/api/projects/${ready.project.id}/dispatches`
    const wrong: [string, object][] = [
      ['contactId', { contactId: other.contact.id }],
      ['ribbedSchemeId', { ribbedSchemeId: ready.input.solidSchemeId }],
      ['solidSchemeId', { solidSchemeId: other.input.solidSchemeId }],
      ['note', { note: 'x'.repeat(2001) }],
      ['extra', { extra: true }],
    ]
    for (const [field, change] of wrong) {
      const refused = await ready.client.post(path, { ...ready.input, ...change })
      expect([field, refused.status, refused.error.issues?.[0]?.path]).toEqual([field, 400, field])
    }
    expect(await server.db.manager.countBy(OutboxEntity, { firmId: ready.firmId })).toBe(0)
  })

  it('refuses a project without panels, without prices, or with an item that has no rate, saying which', async () => {
    const bare = await readyProject({ hasLevel: false })
    const unpriced = await readyProject({ hasEdition: false })
    const partly = await readyProject({ withoutRate: 'curing.area' })
    const answers = await Promise.all(
      [bare, unpriced, partly].map(({ client, project: { id }, input }) => client.post(`/api/projects/${id}/dispatches`, input)),
    )
    expect(answers.map(({ status, error }) => [status, error.issues?.[0]?.path])).toEqual([
      [422, 'levels'],
      [422, 'project.editionId'],
      [422, 'rates.items.curing.area'],
    ])
  })

  it('stops at the mails of a day', async () => {
    const ready = await readyProject()
    const row = {
      firmId: ready.firmId,
      toName: 'X',
      toEmail: 'x@example.test',
      subject: 's',
      text: '',
      html: '',
      dispatchId: null,
    }
    const now = new Date()
    const rows = Array.from({ length: 200 }, () => ({
      ...row,
      id: crypto.randomUUID(),
      messageId: crypto.randomUUID(),
      state: 'sent' as const,
      dueAt: now,
      createdAt: now,
    }))
    await server.db.manager.insert(OutboxEntity, rows)
    const refused = await ready.client.post(`/api/projects/${ready.project.id}/dispatches`, ready.input)
    expect([refused.status, refused.error.code]).toEqual([429, 'limited'])
    expect(await server.db.manager.countBy(DispatchEntity, { firmId: ready.firmId })).toBe(0)
  })
})

describe('who may read what was sent', () => {
  it('lists a client only what was sent to their address, across projects, without what mail servers said', async () => {
    const ready = await readyProject()
    const sent = await send(ready)
    await server.db.manager.update(DispatchEntity, { firmId: ready.firmId, id: sent.id }, { lastAnswer: '451 later' })
    const cleo = await clientOf(server, await makePerson(server, ready.firmId, ['client'], { email: 'cleo@example.test' }))
    const other = await clientOf(server, await makePerson(server, ready.firmId, ['client']))
    const listed = (await cleo.get('/api/dispatches')).as(z.array(dispatch))
    expect(listed.map(({ id, lastAnswer }) => [id, lastAnswer])).toEqual([[sent.id, null]])
    expect((await other.get('/api/dispatches')).as(z.array(dispatch))).toEqual([])
    expect((await cleo.get(`/api/dispatches/${sent.id}/report.html`)).status).toBe(200)
    expect((await other.get(`/api/dispatches/${sent.id}/report.html`)).status).toBe(404)
    expect((await cleo.get(`/api/projects/${ready.project.id}/dispatches`)).status).toBe(403)
  })

  it('answers the same 404 to another firm, even to a client of the same address', async () => {
    const ready = await readyProject()
    const sent = await send(ready)
    const stranger = await signedIn(server, 'surveyor')
    const namesake = await clientOf(server, await makePerson(server, stranger.firmId, ['client'], { email: 'cleo@example.test' }))
    expect((await namesake.get('/api/dispatches')).as(z.array(dispatch))).toEqual([])
    for (const reader of [stranger.client, namesake]) {
      for (const ending of ['html', 'pdf']) {
        const theirs = await reader.get(`/api/dispatches/${sent.id}/report.${ending}`)
        const missing = await reader.get(`/api/dispatches/${crypto.randomUUID()}/report.${ending}`)
        expect([theirs.status, { ...theirs.error, requestId: '' }]).toEqual([404, { ...missing.error, requestId: '' }])
      }
    }
    expect((await stranger.client.get(`/api/projects/${ready.project.id}/dispatches`)).status).toBe(404)
    expect((await stranger.client.post(`/api/projects/${ready.project.id}/dispatches`, ready.input)).status).toBe(404)
  })

  it('hands the report out in a sandbox, under a safe name, the PDF the same each time', async () => {
    const ready = await readyProject({ name: 'Tarn "Court" <img src=x onerror=alert(1)> Ä/1' })
    const sent = await send(ready)
    const page = await ready.client.get(`/api/dispatches/${sent.id}/report.html`)
    expect(page.headers['content-security-policy']).toMatch(/^sandbox; default-src 'none'; style-src 'sha256-/)
    expect(page.headers['x-content-type-options']).toBe('nosniff')
    expect(page.body).toContain('&lt;img src=x onerror=alert(1)&gt;')
    expect(page.body).not.toContain('<img')
    const pdf = await ready.client.get(`/api/dispatches/${sent.id}/report.pdf`)
    expect([pdf.status, pdf.headers['content-type']]).toEqual([200, 'application/pdf'])
    expect(pdf.headers['content-disposition']).toMatch(
      /^attachment; filename="[\x20-\x7e]+\.pdf"; filename\*=UTF-8''[\w%.~!-]+\.pdf$/,
    )
    const stored = await server.db.manager.findOneOrFail(DispatchEntity, {
      select: { firmId: true, id: true, pdf: true },
      where: { firmId: ready.firmId, id: sent.id },
    })
    expect(stored.pdf?.subarray(0, 5).toString()).toBe('%PDF-')
    expect(Number(pdf.headers['content-length'])).toBe(stored.pdf?.length)
  })

  it('refuses everybody who is not signed in, and wants a proper id', async () => {
    const { client } = await signedIn(server, 'surveyor')
    expect((await client.get('/api/dispatches/1/report.pdf')).status).toBe(400)
    const admin = await signedIn(server, 'admin')
    expect((await admin.client.get('/api/dispatches')).status).toBe(403)
  })
})

describe('local mail', () => {
  it('is not there without the local set-up', async () => {
    const { client } = await signedIn(server, 'admin')
    const answer = await client.get('/mail')
    expect([answer.status, answer.error.code]).toEqual([404, 'not_found'])
  })
})
