import { spawn, spawnSync } from 'node:child_process'
import { once } from 'node:events'
import { mkdtempSync, readFileSync, readdirSync, rmSync, statSync } from 'node:fs'
import { createServer, type AddressInfo } from 'node:net'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { fileURLToPath } from 'node:url'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { freePort } from '../../scripts/localDatabase.js'
import { startProduct } from '../support/product'

const root = fileURLToPath(new URL('../..', import.meta.url))
let folder: string

beforeAll(() => {
  folder = mkdtempSync(join(tmpdir(), 'bothways-start-'))
})
afterAll(() => rmSync(folder, { recursive: true, force: true }))

/** Processes whose command line names our data folder. */
function processesOfFolder(): string[] {
  return readdirSync('/proc')
    .filter((name) => /^\d+$/.test(name) && Number(name) !== process.pid)
    .filter((name) => {
      try {
        const text = readFileSync(`/proc/${name}/cmdline`, 'utf8') + readFileSync(`/proc/${name}/environ`, 'utf8')
        return text.includes(folder) && !readFileSync(`/proc/${name}/stat`, 'utf8').includes(') Z ')
      } catch {
        return false
      }
    })
}

async function untilGone(mostMs: number): Promise<string[]> {
  for (let waited = 0; waited < mostMs && processesOfFolder().length > 0; waited += 100)
    await new Promise((resolve) => setTimeout(resolve, 100))
  return processesOfFolder()
}

const isReachable = (address: string) =>
  fetch(`${address}/livez`).then(
    (response) => response.ok,
    () => false,
  )

describe('npm start', () => {
  it('prints one address and the demo sign-ins, keeps secrets to the owner, and stops all at TERM', async () => {
    const product = await startProduct(folder)
    expect(product.printed.filter((text) => text.startsWith('Bothways is running at '))).toEqual([
      `Bothways is running at ${product.address}`,
    ])
    expect([...product.passwords.keys()].sort()).toEqual(
      ['admin', 'checker', 'client', 'developer', 'engineer', 'estimator', 'surveyor'].map((name) => `${name}@example.test`),
    )
    for (const name of ['secrets.json', 'demo-sign-ins.txt']) expect(statSync(join(folder, name)).mode & 0o777).toBe(0o600)
    expect(await isReachable(product.address)).toBe(true)
    await product.stop()
    expect(await isReachable(product.address)).toBe(false)
    expect(await untilGone(30_000)).toEqual([])
  })

  it('keeps passwords and data at a second start, which skips what is done', async () => {
    const first = await startProduct(folder)
    await first.stop()
    const second = await startProduct(folder)
    await second.stop()
    expect(second.passwords).toEqual(first.passwords)
  })

  it('stops everything, the database too, when npm itself is killed', async () => {
    const port = await freePort()
    const npm = spawn('npm', ['start'], {
      cwd: root,
      env: { ...process.env, PORT: String(port), DATA_FOLDER: folder },
      stdio: ['ignore', 'pipe', 'ignore'],
      detached: true,
    })
    for await (const chunk of npm.stdout) if (String(chunk).includes('Bothways is running at')) break
    expect(await isReachable(`http://127.0.0.1:${port}`)).toBe(true)
    npm.kill('SIGKILL')
    await once(npm, 'exit')
    expect(await untilGone(30_000)).toEqual([])
  })

  it('says which port is taken and how to choose another', async () => {
    const holder = createServer().listen(0, '127.0.0.1')
    await once(holder, 'listening')
    const port = (holder.address() as AddressInfo).port
    const started = spawnSync(process.execPath, ['scripts/start.js'], {
      cwd: root,
      env: { ...process.env, PORT: String(port), DATA_FOLDER: folder },
      encoding: 'utf8',
    })
    holder.close()
    expect(started.status).toBe(1)
    expect(started.stdout).toBe('')
    expect(started.stderr).toContain(`Port ${port} of 127.0.0.1 is taken`)
  })

  it('refuses a mail server without a database of its own, and the reverse', () => {
    const started = spawnSync(process.execPath, ['scripts/start.js'], {
      cwd: root,
      env: { ...process.env, SMTP_URL: 'smtps://mail.example.test', DATABASE_URL: '', DATA_FOLDER: folder },
      encoding: 'utf8',
    })
    expect(started.status).toBe(1)
    expect(started.stderr).toContain('DATABASE_URL and SMTP_URL go together')
  })
})
