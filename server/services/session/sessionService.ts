import { role } from '#shared/contracts/person'
import type { SignInInput } from '#shared/contracts/session'
import { IsNull, LessThan, type EntityManager } from 'typeorm'
import { v7 } from 'uuid'
import { z } from 'zod'
import { PersonEntity } from '../../entities/firm/PersonEntity'
import { RefreshTokenEntity } from '../../entities/session/RefreshTokenEntity'
import { SessionEntity } from '../../entities/session/SessionEntity'
import { AppError } from '../../errors'
import { recordEvent } from '../auditLog'
import { sha256 } from '../sha256'
import { inTransaction } from '../transaction'
import { issueAccessToken, readAccessToken } from './accessToken'
import { countAttempt, returnAttempt, type AttemptRule } from './attemptLimit'
import { isPassword } from './passwordHash'
import { newRefreshToken } from './refreshToken'
import { SESSION_S, type SessionSettings } from './sessionSettings'
import type { SignedIn } from './signedIn'

/** Both tokens of a session, as the cookies carry them. */
export interface Tokens {
  readonly access: string
  readonly refresh: string
}

/** An address may stand in several firms; more than this many are not tried. */
const MOST_FIRMS = 5
const WINDOW_S = 900

const rulesOf = (email: string, address: string): AttemptRule[] => [
  { kind: 'signIn.here', subject: `${email}\n${address}`, most: 10, windowS: WINDOW_S },
  { kind: 'signIn.account', subject: email, most: 50, windowS: WINDOW_S },
  { kind: 'signIn.address', subject: address, most: 200, windowS: WINDOW_S },
]

async function personOf(db: EntityManager, { email, password }: SignInInput): Promise<PersonEntity | null> {
  const people = await db.find(PersonEntity, {
    where: { email, state: 'active' },
    order: { createdAt: 'ASC', id: 'ASC' },
    take: MOST_FIRMS,
  })
  if (people.length === 0) await isPassword(null, password)
  for (const person of people) if (await isPassword(person.passwordHash, password)) return person
  return null
}

async function openSession(tx: EntityManager, { firmId, id }: PersonEntity): Promise<{ sessionId: string; refresh: string }> {
  const now = new Date()
  const sessionId = v7()
  const refresh = newRefreshToken()
  await tx.delete(SessionEntity, { firmId, personId: id, expiresAt: LessThan(now) })
  await tx.insert(SessionEntity, {
    id: sessionId,
    firmId,
    personId: id,
    createdAt: now,
    expiresAt: new Date(now.getTime() + SESSION_S * 1000),
    revokedAt: null,
  })
  await tx.insert(RefreshTokenEntity, { tokenHash: sha256(refresh), sessionId, createdAt: now, usedAt: null })
  return { sessionId, refresh }
}

/**
 * Tokens of a new session. Where one address and password stand in several firms, the oldest membership is signed in.
 * @param address - of the caller, for the limits
 * @throws AppError `unauthenticated`, the same for an unknown person and a wrong password; `limited` after too many failures
 */
export async function signIn(db: EntityManager, settings: SessionSettings, input: SignInInput, address: string): Promise<Tokens> {
  const rules = rulesOf(input.email, address)
  await countAttempt(db, rules)
  const person = await personOf(db, input)
  if (person === null) {
    await recordEvent(db, {
      event: 'signIn.refused',
      firmId: null,
      personId: null,
      detail: { email: sha256(input.email), address },
    })
    throw new AppError('unauthenticated', 'The e-mail address or the password is not right.')
  }
  const { sessionId, refresh } = await inTransaction(db, async (tx) => {
    await recordEvent(tx, { event: 'signIn.accepted', firmId: person.firmId, personId: person.id, detail: { address } })
    return await openSession(tx, person)
  })
  await returnAttempt(db, rules)
  return { access: issueAccessToken(settings, person.id, sessionId), refresh }
}

const row = z.object({
  sessionId: z.string(),
  personId: z.string(),
  firmId: z.string(),
  name: z.string(),
  email: z.string(),
  firmName: z.string(),
  isDemo: z.coerce.boolean(),
  roles: z
    .string()
    .nullable()
    .transform((text) => (text === null ? [] : text.split(',')))
    .pipe(z.array(role)),
})

/** Who the access token speaks for, with the roles of this moment; null when signed out, switched off or run out. */
export async function whoIs(db: EntityManager, settings: SessionSettings, token: string): Promise<SignedIn | null> {
  const claims = readAccessToken(settings, token)
  if (claims === null) return null
  const rows: unknown[] = await db.query(
    `SELECT s.id AS sessionId, p.id AS personId, p.firm_id AS firmId, p.name, p.email, f.name AS firmName, f.is_demo AS isDemo,
       (SELECT GROUP_CONCAT(r.role) FROM person_role r WHERE r.firm_id = p.firm_id AND r.person_id = p.id) AS roles
     FROM session s JOIN person p ON p.firm_id = s.firm_id AND p.id = s.person_id JOIN firm f ON f.id = p.firm_id
     WHERE s.id = ? AND s.person_id = ? AND s.revoked_at IS NULL AND s.expires_at > ? AND p.state = 'active'`,
    [claims.sessionId, claims.personId, new Date()],
  )
  return rows.length === 0 ? null : row.parse(rows[0])
}

/** Ends the session at once, whatever tokens of it are still about. */
export async function signOut(db: EntityManager, who: SignedIn): Promise<void> {
  await inTransaction(db, async (tx) => {
    await tx.update(SessionEntity, { id: who.sessionId, revokedAt: IsNull() }, { revokedAt: new Date() })
    await recordEvent(tx, { event: 'session.ended', firmId: who.firmId, personId: who.personId, detail: {} })
  })
}

/** Ends every session of a person: after a new password, or when switched off. */
export async function endSessions(tx: EntityManager, person: { firmId: string; personId: string }): Promise<void> {
  const { firmId, personId } = person
  await tx.update(SessionEntity, { firmId, personId, revokedAt: IsNull() }, { revokedAt: new Date() })
}
