import { mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import type { ParsedMail } from 'mailparser'
import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it } from 'vitest'
import { z } from 'zod'
import { contact, dispatch, type Dispatch } from '../../../shared/contracts/dispatch'
import { project, storedScheme } from '../../../shared/contracts/project'
import { DispatchEntity } from '../../../server/entities/dispatch/DispatchEntity'
import { OutboxEntity } from '../../../server/entities/dispatch/OutboxEntity'
import { createLog } from '../../../server/log'
import { createPdfPrinter, type PdfPrinter } from '../../../server/reports/pdfPrinter'
import { startMail, type Mail } from '../../../server/startMail'
import { makeEdition, signedIn } from '../../support/factories'
import { sampleLevel, sampleProject, sampleRibbed, sampleSolid } from '../../support/sampleProject'
import type { TestClient } from '../../support/testClient'
import { openTestServer, type TestServer } from '../../support/testServer'
import { until } from './mailDatabase'
import { smtpAnswer, startSmtpStandIn } from './smtpStandIn'

const MAIL_FROM = 'Bothways <bothways@example.test>'

let server: TestServer
let printer: PdfPrinter
let folder: string
const running: Mail[] = []

beforeAll(async () => {
  server = await openTestServer()
  printer = createPdfPrinter(server.env.chromiumPath)
})
beforeEach(async () => {
  folder = mkdtempSync(join(tmpdir(), 'bothways-mail-'))
  await server.db.manager.update(OutboxEntity, { state: 'queued' }, { state: 'failed' })
})
afterEach(async () => {
  await Promise.all(running.splice(0).map((mail) => mail.stop()))
  rmSync(folder, { recursive: true })
})
afterAll(async () => {
  await printer.close()
  await server.close()
})

async function startMailWith(env: { smtpUrl: string | null; localMailFolder: string | null }): Promise<Mail> {
  const mail = await startMail({ db: server.db, env: { ...env, mailFrom: MAIL_FROM }, log: createLog('silent'), printer })
  running.push(mail)
  return mail
}

/** Sends the comparison of a new project to a client. */
async function sendComparison(): Promise<{ client: TestClient; projectId: string; sent: Dispatch }> {
  const { firmId, client } = await signedIn(server, 'surveyor')
  const typed = sampleProject({ name: 'Møller & Sons <court>', reference: 'MS-1', editionId: await makeEdition(server, firmId) })
  const { id: projectId } = (await client.post('/api/projects', typed)).as(project)
  await client.post(`/api/projects/${projectId}/levels`, sampleLevel())
  const ribbed = (await client.post(`/api/projects/${projectId}/schemes`, sampleRibbed())).as(storedScheme)
  const solid = (await client.post(`/api/projects/${projectId}/schemes`, sampleSolid())).as(storedScheme)
  const known = (await client.post(`/api/projects/${projectId}/contacts`, { name: 'Cleo', email: 'cleo@example.test' })).as(
    contact,
  )
  const input = { contactId: known.id, ribbedSchemeId: ribbed.id, solidSchemeId: solid.id, note: '' }
  const sent = (await client.post(`/api/projects/${projectId}/dispatches`, input)).as(dispatch)
  return { client, projectId, sent }
}

async function stateOf({ client, projectId }: { client: TestClient; projectId: string }): Promise<Dispatch> {
  const [row] = (await client.get(`/api/projects/${projectId}/dispatches`)).as(z.array(dispatch))
  return row!
}

describe('a comparison that is sent', { timeout: 120_000 }, () => {
  it('arrives over SMTP with text, HTML and the PDF that the site hands out, and the project shows it as sent', async () => {
    const { inbox } = await startMailWith({ smtpUrl: null, localMailFolder: join(folder, 'mail') })
    const made = await sendComparison()
    await until(async () => (await stateOf(made)).state === 'sent', 60_000)
    const after = await stateOf(made)
    expect(after).toMatchObject({ tries: 1, lastAnswer: null, messageId: made.sent.messageId })
    expect(after.version).toBeGreaterThan(made.sent.version)
    const ids = await inbox!.list()
    const mail = (await inbox!.read(ids[0]!)) as ParsedMail
    expect([ids.length, mail.messageId, mail.subject]).toEqual([
      1,
      made.sent.messageId,
      'Møller & Sons <court>, MS-1: the floor built both ways',
    ])
    expect(mail.html).toContain('Møller &amp; Sons &lt;court&gt;')
    expect(mail.text).toContain('What each makes')
    const [attached] = mail.attachments
    expect([mail.attachments.length, attached?.contentType, attached?.filename]).toEqual([
      1,
      'application/pdf',
      'Møller   Sons  court  MS-1, built both ways.pdf',
    ])
    const row = await server.db.manager.findOneOrFail(DispatchEntity, {
      select: { firmId: true, id: true, pdf: true },
      where: { id: made.sent.id },
    })
    expect(attached!.content.equals(row.pdf!)).toBe(true)
  })

  it('is shown as refused, with the words of the server, when it says no for good', async () => {
    const standIn = await startSmtpStandIn({
      options: { onRcptTo: (_address, _session, callback) => callback(smtpAnswer(550, 'no such client')) },
    })
    await startMailWith({ smtpUrl: standIn.url, localMailFolder: null })
    const made = await sendComparison()
    await until(async () => (await stateOf(made)).state === 'refused', 60_000)
    expect((await stateOf(made)).lastAnswer).toContain('no such client')
    expect((await stateOf(made)).sentAt).toBeNull()
    await standIn.close()
  })

  it('stays queued, with what went wrong, while the report cannot be printed', async () => {
    const broken = { print: () => Promise.reject(new Error('the printer is out of order')), close: () => Promise.resolve() }
    const mail = await startMail({
      db: server.db,
      env: { smtpUrl: null, localMailFolder: join(folder, 'mail'), mailFrom: MAIL_FROM },
      log: createLog('silent'),
      printer: broken,
    })
    running.push(mail)
    const made = await sendComparison()
    await until(async () => (await stateOf(made)).tries === 1, 60_000)
    expect(await stateOf(made)).toMatchObject({
      state: 'queued',
      lastAnswer: 'The report that goes with it could not be printed yet.',
    })
    expect(await mail.inbox!.list()).toEqual([])
  })
})

describe('mail without a mail server', () => {
  it('refuses to start', async () => {
    await expect(startMailWith({ smtpUrl: null, localMailFolder: null })).rejects.toThrow(/SMTP_URL/)
  })
})
