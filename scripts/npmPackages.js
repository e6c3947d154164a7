import { createHash } from 'node:crypto'
import { existsSync, readFileSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { step } from './progress.js'
import { runCommand } from './runCommand.js'

/** Installs the npm packages of package-lock.json into `root` unless exactly these are there already. */
export async function ensureNpmPackages(root) {
  const stamp = join(root, 'node_modules', '.bothways-lock')
  const wanted = createHash('sha256')
    .update(readFileSync(join(root, 'package-lock.json')))
    .digest('hex')
  if (existsSync(stamp) && readFileSync(stamp, 'utf8') === wanted) return
  await step('Installing npm packages', () =>
    runCommand('npm', ['ci', '--include=dev', '--cache', join(root, '.data', 'npm'), '--no-fund', '--no-audit'], { cwd: root }),
  )
  writeFileSync(stamp, wanted)
}
