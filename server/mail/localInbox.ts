import { randomUUID } from 'node:crypto'
import { createWriteStream } from 'node:fs'
import { mkdir, readdir, readFile, rename, rm } from 'node:fs/promises'
import { join } from 'node:path'
import { pipeline } from 'node:stream/promises'
import { simpleParser, type ParsedMail } from 'mailparser'
import { SMTPServer, type SMTPServerDataStream } from 'smtp-server'

const HOST = '127.0.0.1'
const MOST_BYTES = 26_214_400
const FILE = /^(\d{13}-[0-9a-f-]{36})\.eml$/

/** The mail server of the local set-up: takes whatever arrives over SMTP and keeps it as files; sends nothing on. */
export interface LocalInbox {
  readonly smtpUrl: string
  /** Ids of what has arrived, newest first. */
  list(): Promise<readonly string[]>
  /** A mail as it arrived, parsed; null when there is none of this id. */
  read(id: string): Promise<ParsedMail | null>
  close(): Promise<void>
}

async function store(stream: SMTPServerDataStream, folder: string): Promise<void> {
  const name = `${Date.now()}-${randomUUID()}.eml`
  const unfinished = join(folder, `${name}.part`)
  try {
    await pipeline(stream, createWriteStream(unfinished, { mode: 0o600 }))
    if (stream.sizeExceeded) throw Object.assign(new Error('Message exceeds fixed maximum message size'), { responseCode: 552 })
    await rename(unfinished, join(folder, name))
  } finally {
    await rm(unfinished, { force: true })
  }
}

/** Listens on a free port of the loopback address and keeps what arrives in `folder`, which is made if need be. */
export async function startLocalInbox(folder: string): Promise<LocalInbox> {
  await mkdir(folder, { recursive: true, mode: 0o700 })
  const server = new SMTPServer({
    disabledCommands: ['AUTH', 'STARTTLS'],
    disableReverseLookup: true,
    size: MOST_BYTES,
    onData(stream, _session, callback) {
      store(stream, folder).then(
        () => callback(),
        (error: Error) => callback(error),
      )
    },
  })
  const port = await new Promise<number>((resolve, reject) => {
    server.once('error', reject)
    const listening = server.listen(0, HOST, () => {
      const address = listening.address()
      if (address !== null && typeof address === 'object') resolve(address.port)
      else reject(new Error('The local mail server has no port.'))
    })
  })
  return {
    smtpUrl: `smtp://${HOST}:${port}`,
    async list() {
      const ids = (await readdir(folder)).flatMap((name) => FILE.exec(name)?.[1] ?? [])
      return ids.sort().reverse()
    },
    async read(id) {
      if (!FILE.test(`${id}.eml`)) return null
      const source = await readFile(join(folder, `${id}.eml`)).catch((error: NodeJS.ErrnoException) => {
        if (error.code === 'ENOENT') return null
        throw error
      })
      return source && (await simpleParser(source, { skipHtmlToText: true, skipTextToHtml: true, skipImageLinks: true }))
    },
    close: () => new Promise((resolve) => server.close(resolve)),
  }
}
