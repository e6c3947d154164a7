import { createServer, type Server } from 'node:http'
import { createApp } from './app'
import { createDataSource } from './dataSource'
import { EnvError, readEnv, type Env } from './env'
import { createLog } from './log'
import { startMail } from './startMail'
import { createPdfPrinter } from './reports/pdfPrinter'
import { createAppraisalPool } from './services/appraisal/appraisalPool'

const DRAIN_MS = 10_000

/** Told to whoever started the server, without a stack. */
class StartError extends Error {}

async function listen(server: Server, { host, port }: Env): Promise<void> {
  await new Promise<void>((resolve, reject) => {
    server.once('error', (cause: NodeJS.ErrnoException) => {
      const reason =
        cause.code === 'EADDRINUSE' ? 'is taken by another program; choose another PORT' : `cannot be used: ${cause.message}`
      reject(new StartError(`Port ${port} of ${host} ${reason}.`))
    })
    server.listen(port, host, resolve)
  })
}

/** Lets running requests end, then closes what is left. */
async function drain(server: Server): Promise<void> {
  const late = setTimeout(() => server.closeAllConnections(), DRAIN_MS)
  await new Promise<void>((resolve) => {
    server.close(() => resolve())
    server.closeIdleConnections()
  })
  clearTimeout(late)
}

async function main(): Promise<void> {
  const env = readEnv(process.env)
  const log = createLog(env.logLevel)
  const db = createDataSource(env.database)
  await db.initialize()
  const appraisals = createAppraisalPool()
  const printer = createPdfPrinter(env.chromiumPath)
  const mail = await startMail({ db, env, log, printer })
  let isDraining = false
  const server = createServer(createApp({ db, env, log, appraisals, printer, inbox: mail.inbox, isDraining: () => isDraining }))
  server.requestTimeout = 30_000
  await listen(server, env)
  log.info({ origin: env.origin, port: env.port }, 'listening')
  const stop = async () => {
    if (isDraining) return
    isDraining = true
    await drain(server)
    await mail.stop()
    await printer.close()
    await appraisals.close()
    await db.destroy()
    process.exit(0)
  }
  for (const signal of ['SIGTERM', 'SIGINT'] as const) process.on(signal, () => void stop())
}

main().catch((cause: unknown) => {
  const isTold = cause instanceof StartError || cause instanceof EnvError
  process.stderr.write(`${isTold ? cause.message : cause instanceof Error ? cause.stack : String(cause)}\n`)
  process.exit(1)
})
