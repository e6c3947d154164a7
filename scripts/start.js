import { spawn } from 'node:child_process'
import { once } from 'node:events'
import { existsSync, mkdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs'
import { createServer } from 'node:net'
import { join } from 'node:path'
import { fileURLToPath } from 'node:url'
import { ensureClientBuild } from './clientBuild.js'
import { ensureHostPackages } from './hostPackages.js'
import { freePort, startDatabase } from './localDatabase.js'
import { ensureNpmPackages } from './npmPackages.js'
import { SetUpError, step } from './progress.js'
import { runCommand } from './runCommand.js'
import { ensureSecrets } from './secrets.js'

const root = fileURLToPath(new URL('..', import.meta.url)).replace(/\/$/, '')
const isDevelopment = process.argv.includes('--dev')

/** What is running, newest last: stopped in reverse order. */
const running = []
let isStopping = false

async function stopEverything(status) {
  if (isStopping) return
  isStopping = true
  for (const stop of running.reverse()) await stop()
  process.exit(status)
}

function settings() {
  if (existsSync(join(root, '.env'))) process.loadEnvFile(join(root, '.env'))
  const port = Number(process.env.PORT ?? '4280')
  if (!Number.isInteger(port) || port < 1 || port > 65_535) {
    throw new SetUpError(`PORT: expected a whole number from 1 to 65535, found "${process.env.PORT}".`)
  }
  const isLocal = !process.env.DATABASE_URL
  if (isLocal !== !process.env.SMTP_URL) {
    throw new SetUpError('DATABASE_URL and SMTP_URL go together: set both in .env, or neither for the local set-up.')
  }
  const dataFolder = process.env.DATA_FOLDER ?? join(root, '.data')
  return { port, isLocal, dataFolder }
}

async function requireFreePort(port) {
  const probe = createServer()
  await new Promise((resolve, reject) => {
    probe.once('error', (cause) =>
      reject(
        new SetUpError(
          cause.code === 'EADDRINUSE'
            ? `Port ${port} of 127.0.0.1 is taken. Stop what uses it, or choose another: PORT=${port + 1} npm start`
            : `Port ${port} of 127.0.0.1 cannot be used: ${cause.message}`,
        ),
      ),
    )
    probe.listen(port, '127.0.0.1', () => probe.close(resolve))
  })
}

/** One start a data folder at a time: two servers on one database folder would damage it. */
function holdDataFolder(dataFolder) {
  mkdirSync(dataFolder, { recursive: true, mode: 0o700 })
  const path = join(dataFolder, 'running')
  const holder = existsSync(path) ? Number(readFileSync(path, 'utf8')) : 0
  if (holder !== 0 && holder !== process.pid && existsSync(`/proc/${holder}/cmdline`)) {
    const command = readFileSync(`/proc/${holder}/cmdline`, 'utf8')
    if (command.includes('start.js'))
      throw new SetUpError(`Bothways is running already on ${dataFolder} (process ${holder}). Stop that one first.`)
  }
  writeFileSync(path, String(process.pid), { mode: 0o600 })
  running.push(async () => rmSync(path, { force: true }))
}

/** Starts the local database; commands find it by `connection.json`, which only the owner can read, while it runs. */
async function databaseSettings(dataFolder, origin) {
  const database = await step('Starting MariaDB', () =>
    startDatabase({
      dataFolder: join(dataFolder, 'database'),
      onExit(output) {
        process.stderr.write(`MariaDB ended by itself.\n${output}\n`)
        void stopEverything(1)
      },
    }),
  )
  running.push(database.stop)
  const settings = {
    DATABASE_SOCKET: database.socketPath,
    DATABASE_NAME: database.database,
    DATABASE_USER: database.user,
    DATABASE_PASSWORD: database.password,
  }
  const path = join(dataFolder, 'connection.json')
  rmSync(path, { force: true })
  writeFileSync(path, JSON.stringify({ ...settings, ORIGIN: origin }), { mode: 0o600 })
  running.push(async () => rmSync(path, { force: true }))
  return settings
}

/** Starts a long-lived child that ends with us; its own end stops everything. */
function keep(name, commandArguments, env) {
  const child = spawn('setpriv', ['--pdeathsig', 'TERM', '--', process.execPath, ...commandArguments], {
    cwd: root,
    env,
    stdio: ['ignore', 'ignore', 'inherit'],
    detached: true,
  })
  const ended = once(child, 'exit').then(([status]) => {
    if (isStopping) return
    process.stderr.write(`${name} ended by itself with ${status}.\n`)
    void stopEverything(1)
  })
  running.push(async () => {
    child.kill('SIGTERM')
    const late = setTimeout(() => child.kill('SIGKILL'), 10_000)
    await ended
    clearTimeout(late)
  })
}

async function untilReady(address) {
  for (let waited = 0; waited < 60_000 && !isStopping; waited += 100) {
    const isReady = await fetch(`${address}/readyz`).then(
      (response) => response.ok,
      () => false,
    )
    if (isReady) return
    await new Promise((resolve) => setTimeout(resolve, 100))
  }
  if (!isStopping) throw new SetUpError('The server did not become ready within 60 s.')
}

async function main() {
  const { port, isLocal, dataFolder } = settings()
  await requireFreePort(port)
  holdDataFolder(dataFolder)
  await ensureHostPackages(isLocal ? ['mariadb', 'chromium'] : ['chromium'])
  await ensureNpmPackages(root)
  if (!isDevelopment) await ensureClientBuild(root)
  const address = `http://127.0.0.1:${port}`
  const apiPort = isDevelopment ? await freePort() : port
  const origin = process.env.ORIGIN ?? address
  const env = {
    ...process.env,
    NODE_ENV: process.env.NODE_ENV ?? (isDevelopment ? 'development' : 'production'),
    PORT: String(apiPort),
    ORIGIN: origin,
    SESSION_SECRET: process.env.SESSION_SECRET ?? ensureSecrets(dataFolder).sessionSecret,
    DATA_FOLDER: dataFolder,
    ...(isLocal ? { LOCAL_MAIL_FOLDER: join(dataFolder, 'mail'), ...(await databaseSettings(dataFolder, origin)) } : {}),
  }
  await step('Preparing the database', () =>
    runCommand(process.execPath, ['--import', 'tsx', 'scripts/prepareDatabase.ts'], { cwd: root, env }),
  )
  keep(
    'The server',
    isDevelopment ? ['node_modules/tsx/dist/cli.mjs', 'watch', 'server/main.ts'] : ['--import', 'tsx', 'server/main.ts'],
    env,
  )
  await untilReady(`http://127.0.0.1:${apiPort}`)
  if (isDevelopment) {
    const client = ['node_modules/vite/bin/vite.js', '--host', '127.0.0.1', '--port', String(port), '--strictPort']
    keep('The client builder', client, { ...env, BOTHWAYS_API: `http://127.0.0.1:${apiPort}` })
  }
  process.stdout.write(`Bothways is running at ${address}\n`)
  const signIns = join(dataFolder, 'demo-sign-ins.txt')
  if (isLocal && existsSync(signIns)) process.stdout.write(readFileSync(signIns, 'utf8'))
}

for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(signal, () => void stopEverything(0))
main().catch((cause) => {
  process.stderr.write(`${cause instanceof SetUpError ? cause.message : cause.stack}\n`)
  void stopEverything(1)
})
