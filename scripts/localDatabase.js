import { spawn, spawnSync } from 'node:child_process'
import { randomBytes } from 'node:crypto'
import { once } from 'node:events'
import { existsSync, mkdirSync, mkdtempSync, renameSync, rmSync, writeFileSync } from 'node:fs'
import { connect, createServer } from 'node:net'
import { tmpdir } from 'node:os'
import { join } from 'node:path'

const isRoot = process.getuid?.() === 0

/**
 * Statements run before the first connection is accepted: root is locked away, one user owns the databases named bothways…. The
 * installation also makes a root of 127.0.0.1 and nameless users, none with a password: they go.
 */
function initialStatements(password) {
  const owners = ["'bothways'@'localhost'", "'bothways'@'127.0.0.1'"]
  return [
    "DELETE FROM mysql.global_priv WHERE User = '' OR (User = 'root' AND Host <> 'localhost');",
    'FLUSH PRIVILEGES;',
    `ALTER USER 'root'@'localhost' IDENTIFIED BY '${randomBytes(24).toString('hex')}';`,
    ...owners.flatMap((owner) => [
      `CREATE USER IF NOT EXISTS ${owner};`,
      `ALTER USER ${owner} IDENTIFIED BY '${password}';`,
      `GRANT ALL PRIVILEGES ON \`bothways%\`.* TO ${owner};`,
    ]),
    'CREATE DATABASE IF NOT EXISTS bothways;',
  ].join('\n')
}

/** A port of 127.0.0.1 that is free now, below the range from which outgoing connections take theirs. */
export async function freePort() {
  for (let attempt = 0; attempt < 50; attempt++) {
    const port = 20_000 + Math.floor(Math.random() * 12_000)
    const probe = createServer()
    const isFree = await new Promise((resolve) => {
      probe.once('error', () => resolve(false))
      probe.listen(port, '127.0.0.1', () => probe.close(() => resolve(true)))
    })
    if (isFree) return port
  }
  throw new Error('No free port was found between 20000 and 32000 on 127.0.0.1.')
}

function install(dataFolder) {
  if (existsSync(join(dataFolder, 'mysql'))) return
  const unfinished = `${dataFolder}.new`
  rmSync(unfinished, { recursive: true, force: true })
  mkdirSync(unfinished, { recursive: true, mode: 0o700 })
  const made = spawnSync(
    'mariadb-install-db',
    [
      '--no-defaults',
      `--datadir=${unfinished}`,
      '--auth-root-authentication-method=normal',
      '--skip-test-db',
      ...(isRoot ? ['--user=root'] : []),
    ],
    { encoding: 'utf8' },
  )
  if (made.status !== 0) throw new Error(`mariadb-install-db failed: ${made.error?.message ?? made.stderr + made.stdout}`)
  rmSync(dataFolder, { recursive: true, force: true })
  renameSync(unfinished, dataFolder)
}

/** Waits for the greeting: the socket is there earlier, while the first statements are still to be read. */
async function untilAccepting(socketPath, hasEnded) {
  for (let waited = 0; waited < 30_000; waited += 50) {
    if (hasEnded()) return false
    const isUp = await new Promise((resolve) => {
      const probe = connect(socketPath)
      probe
        .once('data', () => resolve(true))
        .once('error', () => resolve(false))
        .once('close', () => resolve(false))
      probe.once('data', () => probe.destroy()).setTimeout(5_000, () => probe.destroy())
    })
    if (isUp) return true
    await new Promise((resolve) => setTimeout(resolve, 50))
  }
  return false
}

/**
 * A private MariaDB on 127.0.0.1 with its own socket, its data in `dataFolder` (made when absent).
 * It ends with this process, however this process ends.
 * @param {{ dataFolder: string, onExit?: (output: string) => void, isDurable?: boolean }} options
 * @returns {Promise<{ socketPath: string, port: number, user: string, password: string, database: string, stop: () => Promise<void> }>}
 */
export async function startDatabase({ dataFolder, onExit, isDurable = true }) {
  install(dataFolder)
  const folder = mkdtempSync(join(tmpdir(), 'bothways-'))
  const socketPath = join(folder, 'db.sock')
  const password = randomBytes(24).toString('hex')
  const port = await freePort()
  const statements = join(folder, 'init.sql')
  writeFileSync(statements, initialStatements(password), { mode: 0o600 })
  const child = spawn(
    'setpriv',
    [
      '--pdeathsig',
      'TERM',
      '--',
      'mariadbd',
      '--no-defaults',
      ...(isRoot ? ['--user=root'] : []),
      `--datadir=${dataFolder}`,
      `--socket=${socketPath}`,
      `--pid-file=${join(folder, 'db.pid')}`,
      `--port=${port}`,
      `--init-file=${statements}`,
      '--bind-address=127.0.0.1',
      '--skip-name-resolve',
      '--character-set-server=utf8mb4',
      '--collation-server=utf8mb4_unicode_520_ci',
      '--default-time-zone=+00:00',
      '--sql-mode=STRICT_ALL_TABLES,ERROR_FOR_DIVISION_BY_ZERO,NO_ENGINE_SUBSTITUTION',
      `--innodb-flush-log-at-trx-commit=${isDurable ? 1 : 2}`,
      '--innodb-snapshot-isolation=ON',
      '--innodb-buffer-pool-size=128M',
      '--max-connections=200',
    ],
    { stdio: ['ignore', 'pipe', 'pipe'], detached: true },
  )
  let output = ''
  const keep = (chunk) => (output = (output + chunk).slice(-20_000))
  child.stdout.on('data', keep)
  child.stderr.on('data', keep)
  let hasEnded = false
  let isStopping = false
  const ended = once(child, 'exit').then(() => {
    hasEnded = true
    rmSync(folder, { recursive: true, force: true })
    if (!isStopping) onExit?.(output)
  })
  if (!(await untilAccepting(socketPath, () => hasEnded))) {
    isStopping = true
    child.kill('SIGKILL')
    throw new Error(`MariaDB did not start on ${dataFolder}.\n${output}`)
  }
  rmSync(statements)
  return {
    socketPath,
    port,
    user: 'bothways',
    password,
    database: 'bothways',
    async stop() {
      isStopping = true
      if (!hasEnded) child.kill('SIGTERM')
      await ended
    },
  }
}
