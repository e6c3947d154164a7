import type { DataSource } from 'typeorm'
import type { OutboxEntity } from './entities/dispatch/OutboxEntity'
import type { Env } from './env'
import type { Log } from './log'
import type { PdfPrinter } from './reports/pdfPrinter'
import { dispatchPdf, frozenOf, reportName } from './services/dispatch/dispatchReport'
import { startLocalInbox, type LocalInbox } from './mail/localInbox'
import { createMailTransport, type Attachment } from './mail/mailTransport'
import { startOutboxWorker } from './mail/outboxWorker'

export interface MailSettings {
  readonly db: DataSource
  readonly env: Pick<Env, 'smtpUrl' | 'mailFrom' | 'localMailFolder'>
  readonly log: Log
  readonly printer: PdfPrinter
}

/** Mail of this process: the worker that empties the outbox and, in the local set-up, the server that takes it. */
export interface Mail {
  readonly inbox: LocalInbox | undefined
  stop(): Promise<void>
}

/** The report goes with the mail of a dispatch; other mails have nothing with them. */
async function attachmentsOf({ db, printer }: MailSettings, { firmId, dispatchId }: OutboxEntity): Promise<Attachment[]> {
  if (dispatchId === null) return []
  const key = { firmId, id: dispatchId }
  const content = await dispatchPdf(db.manager, printer, key)
  const name = reportName(await frozenOf(db.manager, key))
    .replace(/[^\p{L}\p{N} .,_-]/gu, ' ')
    .trim()
  return [{ filename: `${name}.pdf`, content, contentType: 'application/pdf' }]
}

/** @throws RangeError when `MAIL_FROM` is not one mailbox; Error when there is neither a mail server nor a folder for local mail */
export async function startMail(settings: MailSettings): Promise<Mail> {
  const { db, env, log } = settings
  const inbox = env.localMailFolder === null ? undefined : await startLocalInbox(env.localMailFolder)
  const smtpUrl = inbox?.smtpUrl ?? env.smtpUrl
  if (smtpUrl === null) throw new Error('There is no mail server: set SMTP_URL.')
  const transport = createMailTransport(smtpUrl, env.mailFrom)
  const worker = startOutboxWorker({ db, transport, log, attachmentsOf: (mail) => attachmentsOf(settings, mail) })
  return {
    inbox,
    async stop() {
      await worker.stop()
      transport.close()
      await inbox?.close()
    },
  }
}
