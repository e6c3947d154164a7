import { spawn, type ChildProcess } from 'node:child_process'
import { once } from 'node:events'
import { existsSync, mkdtempSync, readFileSync, rmSync, statSync } from 'node:fs'
import { createServer, type AddressInfo } from 'node:net'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import type { DataSource } from 'typeorm'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { freePort } from '../../scripts/localDatabase.js'
import { OutboxEntity } from '../../server/entities/dispatch/OutboxEntity'
import { FirmEntity } from '../../server/entities/firm/FirmEntity'
import { PersonRoleEntity } from '../../server/entities/firm/PersonRoleEntity'
import { PersonEntity } from '../../server/entities/firm/PersonEntity'
import { project, projectSheet, projectSummary } from '../../shared/contracts/project'
import { createDataSource, POOL_LIMITS } from '../../server/dataSource'
import { makeDatabase, testDatabaseSettings } from '../support/testDatabase'

const settings = testDatabaseSettings('_commands')
const folder = mkdtempSync(join(tmpdir(), 'bothways-commands-'))
let db: DataSource

const environment = () => ({
  PATH: process.env['PATH'],
  DATABASE_SOCKET: settings.socketPath,
  DATABASE_NAME: settings.database,
  DATABASE_USER: settings.username,
  DATABASE_PASSWORD: settings.password,
  SESSION_SECRET: 's'.repeat(40),
  LOCAL_MAIL_FOLDER: join(folder, 'mail'),
  DATA_FOLDER: folder,
  CLIENT_FOLDER: folder,
  LOG_LEVEL: 'warn',
})

function run(script: string, words: readonly string[], env: Record<string, string | undefined> = environment()): ChildProcess {
  return spawn(process.execPath, ['--import', 'tsx', script, ...words], { env: env as NodeJS.ProcessEnv, stdio: 'pipe' })
}

async function result(child: ChildProcess) {
  let [out, err] = ['', '']
  child.stdout!.on('data', (chunk: Buffer) => (out += chunk.toString()))
  child.stderr!.on('data', (chunk: Buffer) => (err += chunk.toString()))
  const [status] = (await once(child, 'close')) as [number | null]
  return { status, out, err }
}

beforeAll(async () => {
  await makeDatabase(settings)
  db = await createDataSource(settings, { ...POOL_LIMITS, queryMs: 20_000 }).initialize()
})
afterAll(async () => {
  await db.query(`DROP DATABASE ${settings.database}`)
  await db.destroy()
  rmSync(folder, { recursive: true, force: true })
})

describe('preparing the database', { timeout: 120_000 }, () => {
  const signIns = join(folder, 'demo-sign-ins.txt')

  it('loads the demo firm once and keeps its sign-ins for the owner alone', async () => {
    expect(await result(run('scripts/prepareDatabase.ts', []))).toMatchObject({ status: 0, err: '' })
    const first = readFileSync(signIns, 'utf8')
    expect(first.trim().split('\n')).toHaveLength(7)
    for (const text of first.trim().split('\n')) expect(text).toMatch(/^\w+@example\.test \S{15,}$/)
    expect(statSync(signIns).mode & 0o777).toBe(0o600)
    expect((await result(run('scripts/prepareDatabase.ts', []))).status).toBe(0)
    expect(readFileSync(signIns, 'utf8')).toBe(first)
    expect(await db.manager.countBy(FirmEntity, { isDemo: true })).toBe(1)
  })

  it('makes new demo passwords when their file is lost', async () => {
    const first = readFileSync(signIns, 'utf8')
    rmSync(signIns)
    expect((await result(run('scripts/prepareDatabase.ts', []))).status).toBe(0)
    expect(readFileSync(signIns, 'utf8')).not.toBe(first)
  })

  it('loads no demo firm where the database is not the local one', async () => {
    const other = testDatabaseSettings('_nodemo')
    await makeDatabase(other)
    const away = {
      ...environment(),
      DATABASE_NAME: other.database,
      LOCAL_MAIL_FOLDER: '',
      SMTP_URL: 'smtp://127.0.0.1:1',
      MAIL_FROM: 'a@example.test',
    }
    expect((await result(run('scripts/prepareDatabase.ts', [], away))).status).toBe(0)
    const there = await createDataSource(other, { ...POOL_LIMITS, queryMs: 20_000 }).initialize()
    expect(await there.manager.count(FirmEntity)).toBe(0)
    await there.query(`DROP DATABASE ${other.database}`)
    await there.destroy()
  })

  it('says what is wrong with the settings', async () => {
    const { status, err } = await result(run('scripts/prepareDatabase.ts', [], { ...environment(), SESSION_SECRET: 'short' }))
    expect(status).toBe(1)
    expect(err).toMatch(/^The settings are not usable:\n {2}SESSION_SECRET: expected at least 32 random bytes\n$/)
  })
})

describe('the command that makes a firm', { timeout: 120_000 }, () => {
  it('makes it and invites its admin by mail', async () => {
    const { status, out } = await result(
      run('scripts/firm.ts', ['Alder & Sons', 'Boss@alder.example'], { ...environment(), ORIGIN: 'https://floors.example' }),
    )
    expect(status).toBe(0)
    expect(out).toContain('boss@alder.example')
    const firm = await db.manager.findOneByOrFail(FirmEntity, { name: 'Alder & Sons' })
    expect(firm.isDemo).toBe(false)
    const [admin] = await db.manager.findBy(PersonEntity, { firmId: firm.id })
    expect(admin).toMatchObject({ email: 'boss@alder.example', state: 'invited', passwordHash: null })
    expect(await db.manager.findBy(PersonRoleEntity, { firmId: firm.id })).toMatchObject([{ personId: admin!.id, role: 'admin' }])
    const [mail] = await db.manager.findBy(OutboxEntity, { firmId: firm.id })
    expect(mail!.text).toContain('https://floors.example/invitation#')
  })

  it('starts the local database for itself where nothing else is named or running', async () => {
    const local = { PATH: process.env['PATH'], DATA_FOLDER: join(folder, 'local') }
    const { status, out } = await result(run('scripts/firm.ts', ['Birch', 'boss@birch.example'], local))
    expect({ status, out }).toMatchObject({ status: 0, out: expect.stringContaining('Birch is made') as string })
    expect(existsSync(join(folder, 'local', 'database', 'mysql'))).toBe(true)
  })

  it.each([
    [[], 'expected a NAME and an EMAIL'],
    [['Alder', 'nobody'], 'EMAIL: expected'],
    [['', 'a@example.test'], 'NAME: expected'],
  ])('refuses the words %j with exit status 2 and makes nothing', async (words, message) => {
    const before = await db.manager.count(FirmEntity)
    const { status, out, err } = await result(run('scripts/firm.ts', words))
    expect(status).toBe(2)
    expect(out).toBe('')
    expect(err).toContain(message)
    expect(await db.manager.count(FirmEntity)).toBe(before)
  })
})

describe('the server', { timeout: 120_000 }, () => {
  const untilUp = (port: number) =>
    expect
      .poll(
        () =>
          fetch(`http://127.0.0.1:${port}/readyz`).then(
            ({ status }) => status,
            () => 0,
          ),
        { timeout: 60_000 },
      )
      .toBe(200)

  it('serves the demo: every project opens, has totals, and can be read by its readers', async () => {
    const port = await freePort()
    const child = run('server/main.ts', [], { ...environment(), PORT: String(port) })
    await untilUp(port)
    const passwords = new Map(
      readFileSync(join(folder, 'demo-sign-ins.txt'), 'utf8')
        .trim()
        .split('\n')
        .map((text) => text.split(' ') as [string, string]),
    )
    const signIn = async (email: string) => {
      const answer = await fetch(`http://127.0.0.1:${port}/api/session`, {
        method: 'POST',
        headers: { 'Content-Type': 'application/json' },
        body: JSON.stringify({ email, password: passwords.get(email) }),
      })
      const cookie = answer.headers
        .getSetCookie()
        .map((text) => text.split(';')[0])
        .join('; ')
      return async (path: string): Promise<unknown> =>
        (await fetch(`http://127.0.0.1:${port}/api${path}`, { headers: { cookie } })).json()
    }
    const surveyor = await signIn('surveyor@example.test')
    const list = async () => projectSummary.array().parse(await surveyor('/projects'))
    await expect
      .poll(async () => (await list()).every(({ totals }) => totals.length >= 2 && totals.every(({ total }) => total !== null)), {
        timeout: 60_000,
      })
      .toBe(true)
    const projects = await list()
    expect(projects.map(({ name }) => name).sort()).toEqual(['Gannet House', 'Millrace Clinic', 'Tarn Court'])
    expect(new Set(projects.map(({ edition }) => edition?.region)).size).toBe(3)
    for (const { id } of projects) {
      const sheet = projectSheet.parse(await surveyor(`/projects/${id}`))
      expect(project.parse(sheet.project).id).toBe(id)
    }
    const engineer = await signIn('engineer@example.test')
    expect(projectSummary.array().parse(await engineer('/projects'))).toHaveLength(3)
    child.kill('SIGTERM')
    expect((await result(child)).status).toBe(0)
  })

  it('lets running requests end when told to stop, and takes no new one', async () => {
    const port = await freePort()
    const child = run('server/main.ts', [], { ...environment(), PORT: String(port) })
    await untilUp(port)
    const signIns = Array.from({ length: 16 }, async (_, who) => {
      const body = JSON.stringify({ email: `nobody${who}@example.test`, password: 'wrong wrong wrong' })
      const headers = { 'Content-Type': 'application/json' }
      return (await fetch(`http://127.0.0.1:${port}/api/session`, { method: 'POST', headers, body })).status
    })
    await Promise.race(signIns)
    child.kill('SIGTERM')
    const ended = result(child)
    expect(await Promise.all(signIns)).toEqual(Array(16).fill(401))
    expect((await ended).status).toBe(0)
    await expect(fetch(`http://127.0.0.1:${port}/livez`)).rejects.toThrow()
  })

  it('says that its port is taken', async () => {
    const other = createServer().listen(0, '127.0.0.1')
    await once(other, 'listening')
    const { port } = other.address() as AddressInfo
    const { status, err } = await result(run('server/main.ts', [], { ...environment(), PORT: String(port) }))
    expect(status).toBe(1)
    expect(err).toContain(`Port ${port} of 127.0.0.1 is taken by another program; choose another PORT.`)
    expect(err).not.toContain('    at ')
    other.close()
  })

  it('says that the database is not there', async () => {
    expect(existsSync('/nonexistent.sock')).toBe(false)
    const { status, err } = await result(run('server/main.ts', [], { ...environment(), DATABASE_SOCKET: '/nonexistent.sock' }))
    expect(status).toBe(1)
    expect(err).toMatch(/^The database cannot be reached: /m)
    expect(err).not.toContain('    at ')
  })
})
