import { randomUUID } from 'node:crypto'
import { v7 } from 'uuid'
import { FirmEntity } from '../../server/entities/firm/FirmEntity'
import { PersonEntity } from '../../server/entities/firm/PersonEntity'
import { PersonRoleEntity } from '../../server/entities/firm/PersonRoleEntity'
import { BlockEntity } from '../../server/entities/rates/BlockEntity'
import { EditionEntity } from '../../server/entities/rates/EditionEntity'
import { RateBookEntity } from '../../server/entities/rates/RateBookEntity'
import { RateEntity } from '../../server/entities/rates/RateEntity'
import { SessionEntity } from '../../server/entities/session/SessionEntity'
import { issueAccessToken } from '../../server/services/session/accessToken'
import { hashPassword } from '../../server/services/session/passwordHash'
import type { ItemCode } from '../../shared/contracts/appraisal'
import type { Role } from '../../shared/contracts/person'
import type { EditionState } from '../../shared/contracts/rateBook'
import { TestClient } from './testClient'
import type { TestServer } from './testServer'

export const PASSWORD = 'violet kettle over the harbour'

/** A new firm of its own. */
export async function makeFirm({ db }: TestServer, name = 'Testfield Surveyors'): Promise<string> {
  const id = v7()
  await db.manager.insert(FirmEntity, { id, name, isDemo: false, createdAt: new Date() })
  return id
}

export interface TestPerson {
  readonly id: string
  readonly firmId: string
  readonly email: string
}

/** An active person of the firm; with a password only where the test signs in by it. */
export async function makePerson(
  { db }: TestServer,
  firmId: string,
  roles: readonly Role[],
  more: { password?: string; email?: string; state?: 'active' | 'invited' | 'off' } = {},
): Promise<TestPerson> {
  const id = v7()
  const email = more.email ?? `${randomUUID()}@example.test`
  const passwordHash = more.password === undefined ? null : await hashPassword(more.password)
  const state = more.state ?? 'active'
  await db.manager.insert(PersonEntity, { firmId, id, name: 'Terry Test', email, passwordHash, state, createdAt: new Date() })
  await db.manager.insert(
    PersonRoleEntity,
    roles.map((role) => ({ firmId, personId: id, role })),
  )
  return { id, firmId, email }
}

/** Cookie of a session of this person, as signing in would have set it. */
export async function sessionCookie({ db, env }: TestServer, { id, firmId }: TestPerson): Promise<string> {
  const sessionId = v7()
  const now = new Date()
  const expiresAt = new Date(now.getTime() + 3_600_000)
  await db.manager.insert(SessionEntity, { id: sessionId, firmId, personId: id, createdAt: now, expiresAt, revokedAt: null })
  return `bothways-access=${issueAccessToken({ secret: env.sessionSecret, origin: env.origin }, id, sessionId)}`
}

/** A client signed in as this person. */
export async function clientOf(server: TestServer, person: TestPerson): Promise<TestClient> {
  return new TestClient(server.app, await sessionCookie(server, person))
}

/** A new firm with one person of these roles, signed in. */
export async function signedIn(server: TestServer, ...roles: Role[]) {
  const firmId = await makeFirm(server)
  const person = await makePerson(server, firmId, roles)
  return { firmId, person, client: await clientOf(server, person) }
}

const RATES: Partial<Record<ItemCode, string>> = {
  'concrete.slab': '168',
  'blocks.whole': '1.62',
  'blocks.cut': '2.35',
  'blocks.closedEnds': '0.42',
  'formwork.soffit': '21.4',
  'formwork.edge': '9.2',
  'curing.area': '0.62',
  'propping.area': '5.8',
}
for (const diameter of [6, 8, 10, 12, 16, 20, 25, 32, 40] as const) RATES[`steel.bar.${diameter}`] = '1450'
for (const mesh of ['A98', 'A142', 'A193', 'A252', 'A393'] as const) RATES[`steel.mesh.${mesh}`] = '4.45'

/** An edition with a price for every item but `without`, in a book of its own. */
export async function makeEdition(
  { db }: TestServer,
  firmId: string,
  state: EditionState = 'published',
  without?: ItemCode,
): Promise<string> {
  const bookId = v7()
  const id = v7()
  await db.manager.insert(RateBookEntity, { firmId, id: bookId, region: `Region ${bookId}`, currency: 'USD' })
  const texts = { compiledBy: 'A', checkedBy: 'B', taxBasis: 'before tax', note: '', baseDate: '2026-09-01', validUntil: null }
  await db.manager.insert(EditionEntity, { firmId, id, bookId, number: 1, state: 'draft', ...texts })
  const priced = Object.entries(RATES).filter(([item]) => item !== without)
  const rates = priced.map(([item, likely]) => ({
    firmId,
    editionId: id,
    item: item as ItemCode,
    description: item,
    unit: 'nr',
    low: likely,
    likely,
    high: likely,
    source: 'test',
  }))
  await db.manager.insert(RateEntity, rates)
  if (state !== 'draft') await db.manager.update(EditionEntity, { firmId, id }, { state })
  return id
}

/** A block of the firm's catalogue: 200 along × 400 across × 200 high. */
export async function makeBlock({ db }: TestServer, firmId: string): Promise<string> {
  const id = v7()
  const sizes = { length: 200, width: 400, height: 200, mass: 15, palletCount: 120, breakagePercent: '3' }
  const names = { code: `B-${id}`, name: 'Block', material: 'fired clay' as const, supplier: 'Somebody' }
  await db.manager.insert(BlockEntity, { firmId, id, ...names, ...sizes })
  return id
}
