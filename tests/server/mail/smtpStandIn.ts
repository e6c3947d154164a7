import { SMTPServer, type SMTPServerOptions } from 'smtp-server'

/** A mail as the server took it: envelope and source. */
export interface TakenMail {
  readonly from: string
  readonly to: readonly string[]
  readonly source: string
}

export interface SmtpStandIn {
  readonly url: string
  readonly port: number
  /** What was accepted, in order. */
  readonly taken: readonly TakenMail[]
  close(): Promise<void>
}

interface Behaviour {
  /** Called when a mail is in, before the server says yes: an error becomes its answer. */
  readonly onMail?: (mail: TakenMail) => Promise<void>
  readonly options?: SMTPServerOptions
}

/** An answer of the server. */
export function smtpAnswer(code: number, text: string): Error {
  return Object.assign(new Error(text), { responseCode: code })
}

/** A mail server of the tests on a free port of the loopback address. */
export async function startSmtpStandIn({ onMail, options = {} }: Behaviour = {}): Promise<SmtpStandIn> {
  const taken: TakenMail[] = []
  const server = new SMTPServer({
    disabledCommands: ['AUTH', 'STARTTLS'],
    disableReverseLookup: true,
    closeTimeout: 100,
    ...options,
    onData(stream, { envelope }, callback) {
      const chunks: Buffer[] = []
      stream.on('data', (chunk: Buffer) => chunks.push(chunk))
      stream.on('end', () => {
        const from = envelope.mailFrom ? envelope.mailFrom.address : ''
        const mail = { from, to: envelope.rcptTo.map(({ address }) => address), source: Buffer.concat(chunks).toString() }
        void (onMail?.(mail) ?? Promise.resolve()).then(
          () => {
            taken.push(mail)
            callback()
          },
          (error: Error) => callback(error),
        )
      })
    },
  })
  const port = await new Promise<number>((resolve) => {
    const listening = server.listen(0, '127.0.0.1', () => {
      const address = listening.address()
      resolve(typeof address === 'object' && address ? address.port : 0)
    })
  })
  return {
    url: `smtp://127.0.0.1:${port}`,
    port,
    taken,
    close: () => new Promise((resolve) => server.close(() => resolve())),
  }
}
