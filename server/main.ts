import { createServer, type Server } from 'node:http'
import type { DataSource } from 'typeorm'
import { createApp, importDeskOf } from './app'
import { createDataSource } from './dataSource'
import { EnvError, readEnv, type Env } from './env'
import { createLog, type Log } from './log'
import { createPdfPrinter } from './reports/pdfPrinter'
import { createAppraisalPool } from './services/appraisal/appraisalPool'
import { refreshAllTotals } from './services/project/projectTotals'
import { tidyImportFiles } from './services/rateImport/importFiles'
import type { ImportDesk } from './services/rateImport/importDesk'
import { tidyImports } from './services/rateImport/tidyImports'
import { tidy } from './services/tidy'
import { startMail } from './startMail'

const DRAIN_MS = 10_000
const HOUR_MS = 3_600_000

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

async function tidyAll({ manager }: DataSource, { files }: ImportDesk): Promise<void> {
  const now = new Date()
  await tidy(manager, now)
  await tidyImports(manager, now)
  await tidyImportFiles(files, now)
}

function tidyNowAndHourly(db: DataSource, imports: ImportDesk, log: Log): NodeJS.Timeout {
  const run = () => void tidyAll(db, imports).catch((cause: unknown) => log.error({ err: cause }, 'tidying failed'))
  run()
  return setInterval(run, HOUR_MS)
}

async function main(): Promise<void> {
  const env = readEnv(process.env)
  const log = createLog(env.logLevel)
  const db = createDataSource(env.database)
  await db.initialize().catch((cause: Error) => {
    throw new StartError(`The database cannot be reached: ${cause.message}`)
  })
  const imports = importDeskOf({ db, env, log })
  const tidying = tidyNowAndHourly(db, imports, log)
  const appraisals = createAppraisalPool()
  const printer = createPdfPrinter(env.chromiumPath)
  const mail = await startMail({ db, env, log, printer })
  let isDraining = false
  const surroundings = { db, env, log, appraisals, printer, imports, inbox: mail.inbox, isDraining: () => isDraining }
  const server = createServer(createApp(surroundings))
  server.requestTimeout = 30_000
  await listen(server, env)
  log.info({ origin: env.origin, port: env.port }, 'listening')
  refreshAllTotals(db.manager, appraisals, () => isDraining).catch((cause: unknown) => {
    if (!isDraining) log.error({ err: cause }, 'totals not refreshed')
  })
  const stop = async () => {
    if (isDraining) return
    isDraining = true
    clearInterval(tidying)
    await drain(server)
    await imports.close()
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
