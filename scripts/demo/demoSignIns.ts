import { randomInt } from 'node:crypto'
import { existsSync, mkdirSync, renameSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import type { DataSource } from 'typeorm'
import { FirmEntity } from '../../server/entities/firm/FirmEntity'
import { PersonEntity } from '../../server/entities/firm/PersonEntity'
import { hashPassword } from '../../server/services/session/passwordHash'
import { DEMO_PEOPLE } from './demoPeople'

const SYLLABLES =
  'ba be bo da de do fa fe fo ga ge go ka ke ko la le lo ma me mo na ne no pa pe po ra re ro sa se so ta te to va ve vo'.split(
    ' ',
  )

/** Four easily typed made-up words and a number: about 55 random bits. */
function demoPassword(): string {
  const word = () => SYLLABLES[randomInt(SYLLABLES.length)]! + SYLLABLES[randomInt(SYLLABLES.length)]!
  return [word(), word(), word(), word() + SYLLABLES[randomInt(SYLLABLES.length)]!, String(randomInt(10, 100))].join('-')
}

/** Gives every demo person a new random password and keeps them in `demo-sign-ins.txt`, for the owner's eyes only. */
export async function ensureDemoSignIns(db: DataSource, dataFolder: string): Promise<void> {
  const path = join(dataFolder, 'demo-sign-ins.txt')
  if (existsSync(path)) return
  const firm = await db.manager.findOneByOrFail(FirmEntity, { isDemo: true })
  const lines: string[] = []
  for (const { email } of DEMO_PEOPLE) {
    const password = demoPassword()
    await db.manager.update(PersonEntity, { firmId: firm.id, email }, { passwordHash: await hashPassword(password) })
    lines.push(`${email} ${password}`)
  }
  mkdirSync(dataFolder, { recursive: true, mode: 0o700 })
  writeFileSync(`${path}.new`, `${lines.join('\n')}\n`, { mode: 0o600 })
  renameSync(`${path}.new`, path)
}
