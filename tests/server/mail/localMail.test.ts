import { mkdtempSync, readdirSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import express, { type Express } from 'express'
import request from 'supertest'
import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { AppError, STATUS } from '../../../server/errors'
import { startLocalInbox, type LocalInbox } from '../../../server/mail/localInbox'
import { createMailTransport } from '../../../server/mail/mailTransport'
import { localMailRoutes } from '../../../server/routes/localMailRoutes'

let folder: string
let inbox: LocalInbox
let app: Express

beforeEach(async () => {
  folder = mkdtempSync(join(tmpdir(), 'bothways-mail-'))
  inbox = await startLocalInbox(join(folder, 'mail'))
  app = express()
  app.use('/mail', localMailRoutes(inbox, 'http://127.0.0.1:4280'))
  app.use(((error: unknown, _request, response, next) => {
    if (!(error instanceof AppError)) return next(error)
    response.status(STATUS[error.code]).json({ code: error.code })
  }) satisfies express.ErrorRequestHandler)
})
afterEach(async () => {
  await inbox.close()
  rmSync(folder, { recursive: true })
})

async function send(subject: string, html = '<p>Hello</p>', filename = 'Tarn Court.pdf'): Promise<void> {
  await createMailTransport(inbox.smtpUrl, 'Bothways <bothways@example.test>').send({
    messageId: `<${crypto.randomUUID()}@mail.bothways>`,
    toName: 'Cleo',
    toEmail: 'cleo@example.test',
    subject,
    text: 'as text <b>',
    html,
    date: new Date('2026-03-14T09:30:00Z'),
    attachments: [{ filename, content: Buffer.from('%PDF-1.4 x'), contentType: 'application/pdf' }],
  })
}

const get = (path: string) => request(app).get(path)

describe('the local inbox', () => {
  it('shows nothing until something arrives over SMTP, then the newest first', async () => {
    expect((await get('/mail')).text).toContain('No mail yet')
    await send('first')
    await send('second')
    const page = (await get('/mail')).text
    expect(page).toContain('2 mails arrived')
    expect(page.indexOf('second')).toBeLessThan(page.indexOf('first'))
    expect(readdirSync(join(folder, 'mail')).filter((name) => name.endsWith('.eml'))).toHaveLength(2)
  })

  it('shows a mail with its header, its text escaped and its HTML in a frame that may run nothing', async () => {
    await send('<img src=x onerror=alert(1)>', '<script>alert(1)</script><p>Hello</p>')
    const [id] = await inbox.list()
    const page = await get(`/mail/${id}`)
    expect(page.text).toContain('&lt;img src=x onerror=alert(1)&gt;')
    expect(page.text).not.toMatch(/<img|<script/)
    expect(page.text).toContain('as text &lt;b&gt;')
    expect(page.text).toContain('14 March 2026')
    expect(page.text).toMatch(new RegExp(`<iframe src="/mail/${id}/html" sandbox title=`))
    expect(page.headers['content-security-policy']).toMatch(/^default-src 'none'; style-src 'self'/)
    const html = await get(`/mail/${id}/html`)
    expect(html.headers['content-security-policy']).toMatch(/^sandbox; default-src 'none'/)
    expect(html.text).toContain('<p>Hello</p>')
  })

  it('hands attachments out for saving, whatever their name', async () => {
    await send('with a file', '<p></p>', 'a"b\\..//Ä; x=1.pdf')
    const [id] = await inbox.list()
    const file = await get(`/mail/${id}/attachments/0`).buffer()
    expect(file.status).toBe(200)
    expect(file.headers['content-type']).toMatch(/^application\/pdf/)
    expect(file.headers['content-disposition']).toMatch(/^attachment; filename="[^"\\/;]+\.pdf"; filename\*=UTF-8''[^;"]+\.pdf$/)
    expect((await get(`/mail/${id}/attachments/1`)).status).toBe(404)
    expect((await get(`/mail/${id}/attachments/x`)).status).toBe(400)
  })

  it('reads nothing outside its folder', async () => {
    for (const id of ['..%2f..%2fetc%2fpasswd', '1', '0000000000000-../../../../../../../etc/passwd']) {
      expect([400, 404]).toContain((await get(`/mail/${id}`)).status)
    }
    expect((await get(`/mail/1234567890123-${crypto.randomUUID()}`)).status).toBe(404)
  })

  it('answers under our own host name only', async () => {
    expect((await get('/mail').set('Host', 'evil.example.test')).status).toBe(404)
    expect((await get('/mail').set('Host', '127.0.0.1:4280')).status).toBe(200)
  })

  it('answers this machine only, whatever host name is asked for', async () => {
    const reached = express()
    let from = '192.0.2.7'
    reached.use((asked, _response, next) => {
      Object.defineProperty(asked.socket, 'remoteAddress', { get: () => from, configurable: true })
      next()
    }, app)
    expect((await request(reached).get('/mail').set('Host', '127.0.0.1:4280')).status).toBe(404)
    from = '::ffff:127.0.0.1'
    expect((await request(reached).get('/mail').set('Host', '127.0.0.1:4280')).status).toBe(200)
  })

  it('serves its own style sheet and fonts', async () => {
    expect((await get('/mail/style.css')).headers['content-type']).toMatch(/^text\/css/)
    const font = await get('/mail/fonts/400.woff2').buffer()
    expect(font.headers['content-type']).toBe('font/woff2')
    expect((await get('/mail/fonts/500.woff2')).status).toBe(400)
  })
})
