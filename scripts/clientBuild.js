import { createHash } from 'node:crypto'
import { existsSync, mkdirSync, readdirSync, readFileSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { step } from './progress.js'
import { runCommand } from './runCommand.js'

const SOURCES = ['index.html', 'vite.config.ts', 'package-lock.json', 'src', 'shared']

function* filesOf(root, name) {
  const path = join(root, name)
  if (/\.\w+$/.test(name)) {
    yield name
    return
  }
  for (const entry of readdirSync(path, { recursive: true, withFileTypes: true })) {
    if (entry.isFile()) yield join(entry.parentPath, entry.name).slice(root.length + 1)
  }
}

function hashOf(root) {
  const hash = createHash('sha256')
  for (const name of SOURCES.flatMap((source) => [...filesOf(root, source)]).sort()) {
    hash.update(`${name}\0`).update(readFileSync(join(root, name)))
  }
  return hash.digest('hex')
}

/** Builds the client into `dist` unless it is built from exactly these sources. */
export async function ensureClientBuild(root) {
  const stamp = join(root, '.data', 'client-build')
  const wanted = hashOf(root)
  const isBuilt = existsSync(join(root, 'dist', 'index.html')) && existsSync(stamp) && readFileSync(stamp, 'utf8') === wanted
  if (isBuilt) return
  await step('Building the client', () =>
    runCommand(process.execPath, ['node_modules/vite/bin/vite.js', 'build', '--logLevel', 'warn'], { cwd: root }),
  )
  mkdirSync(join(root, '.data'), { recursive: true, mode: 0o700 })
  writeFileSync(stamp, wanted)
}
