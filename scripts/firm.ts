import { existsSync } from 'node:fs'
import { resolve } from 'node:path'
import { fileURLToPath } from 'node:url'
import { emailAddress, line } from '#shared/contracts/primitives'
import { readableIssues } from '#shared/readableIssues'
import { z } from 'zod'
import { createDataSource, POOL_LIMITS } from '../server/dataSource'
import { EnvError, readDatabaseEnv } from '../server/env'
import { migrate } from '../server/migrate'
import { makeFirm } from '../server/services/person/makeFirm'
import { openLocalConnection, type LocalConnection } from './localConnection'

const ROOT = new URL('../', import.meta.url)
const USAGE = 'npm run firm -- NAME EMAIL    as: npm run firm -- "Alder Surveyors" admin@example.com'
const words = z.tuple([line(120), emailAddress])

/** What the caller can put right; told without a stack, exit status 2. */
class UsageError extends Error {}

function readWords(given: readonly string[]): [string, string] {
  if (given.length !== 2) throw new UsageError(`expected a NAME and an EMAIL\n${USAGE}`)
  const read = words.safeParse(given)
  if (read.success) return read.data
  const names = ['NAME', 'EMAIL']
  const lines = readableIssues(read.error.issues, given).map(({ path, message }) => `${names[Number(path)]}: ${message}`)
  throw new UsageError(`${lines.join('\n')}\n${USAGE}`)
}

/** The database that `.env` or the surroundings name, else the local one. */
async function openConnection(): Promise<LocalConnection> {
  const settings = new URL('.env', ROOT)
  if (existsSync(settings)) process.loadEnvFile(settings)
  const isNamed = process.env['DATABASE_URL'] !== undefined || process.env['DATABASE_SOCKET'] !== undefined
  if (isNamed) return { variables: {}, stop: () => Promise.resolve() }
  return await openLocalConnection(resolve(process.env['DATA_FOLDER'] ?? fileURLToPath(new URL('.data', ROOT))))
}

/** Makes a firm and invites its first admin. */
async function firm(): Promise<void> {
  const [name, email] = readWords(process.argv.slice(2))
  const { variables, stop } = await openConnection()
  const { database, origin } = readDatabaseEnv({ ...variables, ...process.env })
  const db = createDataSource(database, { ...POOL_LIMITS, queryMs: 120_000 })
  try {
    await db.initialize()
    await migrate(db)
    await makeFirm(db.manager, origin, name, email)
  } finally {
    if (db.isInitialized) await db.destroy()
    await stop()
  }
  process.stdout.write(`${name} is made. Its admin is invited at ${email}; the mail leaves while Bothways runs.\n`)
}

firm().catch((cause: unknown) => {
  const isTold = cause instanceof UsageError || cause instanceof EnvError
  process.stderr.write(`${isTold ? cause.message : cause instanceof Error ? cause.stack : String(cause)}\n`)
  process.exit(isTold ? 2 : 1)
})
