import { randomBytes } from 'node:crypto'
import { existsSync, readFileSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'

/** The secrets of this set-up, made on the first start and kept in `dataFolder`, readable by the owner only. */
export function ensureSecrets(dataFolder) {
  const path = join(dataFolder, 'secrets.json')
  if (!existsSync(path)) {
    writeFileSync(path, JSON.stringify({ sessionSecret: randomBytes(48).toString('base64url') }), { mode: 0o600, flag: 'wx' })
  }
  return JSON.parse(readFileSync(path, 'utf8'))
}
