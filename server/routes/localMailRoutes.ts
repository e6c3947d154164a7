import { Router, type Response } from 'express'
import { z } from 'zod'
import { AppError, parse } from '../errors'
import type { LocalInbox } from '../mail/localInbox'
import { LOCAL_MAIL_STYLE, localMailList, localMailMessage, type ArrivedMail } from '../mail/localMailPage'
import { attachmentHeader } from '../middleware/attachmentHeader'
import { latinFont } from '../reports/reportFonts'

const MOST_LISTED = 200
const PAGE_POLICY = [
  "default-src 'none'",
  "style-src 'self'",
  "font-src 'self'",
  "frame-src 'self'",
  "base-uri 'none'",
  "form-action 'none'",
  "frame-ancestors 'none'",
].join('; ')
/** A mail's own HTML carries its styles within; it may load, run, send and open nothing. */
const MAIL_POLICY = "sandbox; default-src 'none'; style-src 'unsafe-inline'; img-src data:; frame-ancestors 'self'"
const FILE_POLICY = "sandbox; default-src 'none'"

const LOOPBACK = /^(127\.|::1$|::ffff:127\.)/

const mailId = z.string().regex(/^\d{13}-[0-9a-f-]{36}$/, 'expected the id of a mail')
const place = z.string().regex(/^\d{1,3}$/, 'expected the place of an attachment')
const weight = z.enum(['300', '400', '600'])

async function arrived(inbox: LocalInbox, id: unknown): Promise<ArrivedMail> {
  const known = parse(mailId, id, 'id')
  const mail = await inbox.read(known)
  if (mail === null) throw new AppError('not_found')
  return { id: known, mail }
}

async function newest(inbox: LocalInbox, ids: readonly string[]): Promise<ArrivedMail[]> {
  const mails: ArrivedMail[] = []
  for (const id of ids.slice(0, MOST_LISTED)) {
    const mail = await inbox.read(id)
    if (mail !== null) mails.push({ id, mail })
  }
  return mails
}

function sendPage(response: Response, page: string): void {
  response.set('Content-Security-Policy', PAGE_POLICY).set('Cache-Control', 'no-store').type('text/html').send(page)
}

/**
 * `/mail` of the local set-up: shows what arrived over SMTP, and nothing else. Answers this machine only, since a mail may carry a
 * link that opens an account, and under our own host name only, so that no other site's name can be pointed at it to read the mail.
 * @param origin - scheme, host and port by which browsers reach us
 */
export function localMailRoutes(inbox: LocalInbox, origin: string): Router {
  const ownHost = new URL(origin).hostname
  const router = Router()
    .use((request, _response, next) => {
      const isOurs = LOOPBACK.test(request.socket.remoteAddress ?? '')
      if (!isOurs || request.hostname !== ownHost) throw new AppError('not_found')
      next()
    })
    .get('/', async (_request, response) => {
      const ids = await inbox.list()
      sendPage(response, localMailList(await newest(inbox, ids), ids.length))
    })
    .get('/style.css', (_request, response) => {
      response.type('text/css').send(LOCAL_MAIL_STYLE)
    })
    .get('/fonts/:weight.woff2', (request, response) => {
      response.type('font/woff2').send(latinFont(Number(parse(weight, request.params.weight, 'weight')) as 300 | 400 | 600))
    })
  addMails(router, inbox)
  return router
}

function addMails(router: Router, inbox: LocalInbox): void {
  router
    .get('/:id', async (request, response) => {
      sendPage(response, localMailMessage(await arrived(inbox, request.params.id)))
    })
    .get('/:id/html', async (request, response) => {
      const { mail } = await arrived(inbox, request.params.id)
      if (typeof mail.html !== 'string') throw new AppError('not_found')
      response.set('Content-Security-Policy', MAIL_POLICY).set('Cache-Control', 'no-store').type('text/html').send(mail.html)
    })
    .get('/:id/attachments/:place', async (request, response) => {
      const { mail } = await arrived(inbox, request.params.id)
      const attachment = mail.attachments[Number(parse(place, request.params.place, 'place'))]
      if (!attachment) throw new AppError('not_found')
      const [, stem, ending] = /^(.*?)(?:\.([A-Za-z0-9]{1,8}))?$/s.exec(attachment.filename ?? 'file') ?? []
      response
        .set('Content-Security-Policy', FILE_POLICY)
        .set('Cache-Control', 'no-store')
        .set('Content-Disposition', attachmentHeader('attachment', stem || 'file', ending ?? 'bin'))
        .type(attachment.contentType)
        .send(attachment.content)
    })
}
