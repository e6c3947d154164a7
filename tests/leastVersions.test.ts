import { readFileSync } from 'node:fs'
import { describe, expect, it } from 'vitest'

/** What sends our mail. The receiving side of the local set-up brings copies of its own, which send nothing. */
const OURS = 'node_modules/nodemailer'

/** Oldest versions without a known hole; there is no audit service to ask. */
const LEAST: Readonly<Record<string, string>> = {
  multer: '2.5.0',
  typeorm: '1.1.0',
  mysql2: '3.24.0',
  jsonwebtoken: '9.0.0',
  qs: '6.16.0',
}

interface Lock {
  packages: Record<string, { version?: string }>
}
const lock = JSON.parse(readFileSync('package-lock.json', 'utf8')) as Lock
const installed = Object.entries(lock.packages).map(([path, { version }]) => ({
  name: path.split('node_modules/').at(-1)!,
  version,
}))

const parts = (version: string) => version.split(/[.-]/).slice(0, 3).map(Number)
function isAtLeast(version: string, least: string): boolean {
  const [given, wanted] = [parts(version), parts(least)]
  const place = [0, 1, 2].find((index) => given[index] !== wanted[index])
  return place === undefined || given[place]! > wanted[place]!
}

describe('packages', () => {
  it.each(Object.entries(LEAST))('%s is at least %s wherever it is installed', (name, least) => {
    for (const { version } of installed.filter((one) => one.name === name)) expect(isAtLeast(version!, least), version).toBe(true)
  })

  it('nodemailer, which sends our mail, is at least 10.6.1', () => {
    expect(isAtLeast(lock.packages[OURS]!.version!, '10.6.1')).toBe(true)
  })

  it('are none that read spreadsheets within the server', () => {
    expect(installed.filter(({ name }) => name === 'xlsx')).toEqual([])
  })

  it('come from the registry of whoever installs them: the lock file names no address', () => {
    expect(readFileSync('package-lock.json', 'utf8')).not.toMatch(/"resolved"/)
  })
})
