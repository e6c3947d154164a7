import { spawn } from 'node:child_process'
import { once } from 'node:events'
import { mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { createInterface } from 'node:readline'
import { fileURLToPath } from 'node:url'
import { freePort } from '../../scripts/localDatabase.js'

const root = fileURLToPath(new URL('../..', import.meta.url))

/** The product as `npm start` runs it, on its own data folder and port. */
export interface Product {
  readonly address: string
  /** Password of each demo person by address, as printed at the start. */
  readonly passwords: ReadonlyMap<string, string>
  /** Lines printed on stdout. */
  readonly printed: readonly string[]
  readonly pid: number
  stop(): Promise<void>
}

/** Starts the product on `dataFolder` (a new one when absent, removed at the end). @throws Error with its output when it does not come up */
export async function startProduct(dataFolder?: string): Promise<Product> {
  const folder = dataFolder ?? mkdtempSync(join(tmpdir(), 'bothways-e2e-'))
  const port = await freePort()
  const child = spawn('setpriv', ['--pdeathsig', 'TERM', '--', process.execPath, 'scripts/start.js'], {
    cwd: root,
    env: { ...process.env, NODE_ENV: 'production', PORT: String(port), DATA_FOLDER: folder },
    stdio: ['ignore', 'pipe', 'pipe'],
  })
  let progress = ''
  child.stderr.on('data', (chunk: Buffer) => (progress = (progress + chunk.toString()).slice(-20_000)))
  const printed: string[] = []
  const passwords = new Map<string, string>()
  const exit = once(child, 'exit')
  const isUp = new Promise<void>((resolve, reject) => {
    void exit.then(([status]) => reject(new Error(`The product ended with ${status}.\n${progress}`)))
    createInterface(child.stdout).on('line', (text) => {
      printed.push(text)
      const signIn = /^(\S+@\S+) (\S+)$/.exec(text)
      if (signIn) passwords.set(signIn[1]!, signIn[2]!)
      if (passwords.has('surveyor@example.test') && passwords.size >= 7) resolve()
    })
  })
  await isUp
  return {
    address: `http://127.0.0.1:${port}`,
    passwords,
    printed,
    pid: child.pid!,
    async stop() {
      child.kill('SIGTERM')
      await exit
      if (dataFolder === undefined) rmSync(folder, { recursive: true, force: true })
    },
  }
}
