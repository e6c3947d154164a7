import { IsNull, type EntityManager } from 'typeorm'
import { PersonEntity } from '../../entities/firm/PersonEntity'
import { RefreshTokenEntity } from '../../entities/session/RefreshTokenEntity'
import { SessionEntity } from '../../entities/session/SessionEntity'
import { AppError } from '../../errors'
import { recordEvent } from '../auditLog'
import { sha256 } from '../sha256'
import { inTransaction } from '../transaction'
import { issueAccessToken } from './accessToken'
import { nextRefreshToken } from './refreshToken'
import type { Tokens } from './sessionService'
import { REUSE_MS, type SessionSettings } from './sessionSettings'

async function openSessionOf(tx: EntityManager, sessionId: string, now: Date): Promise<SessionEntity | null> {
  const session = await tx.findOneBy(SessionEntity, { id: sessionId, revokedAt: IsNull() })
  if (session === null || session.expiresAt <= now) return null
  const isActive = await tx.existsBy(PersonEntity, { firmId: session.firmId, id: session.personId, state: 'active' })
  return isActive ? session : null
}

async function revoke(tx: EntityManager, { id, firmId, personId }: SessionEntity, now: Date): Promise<void> {
  await tx.update(SessionEntity, { id }, { revokedAt: now })
  await recordEvent(tx, { event: 'session.reused', firmId, personId, detail: { sessionId: id } })
}

async function rotate(tx: EntityManager, { secret }: SessionSettings, token: string) {
  const now = new Date()
  const tokenHash = sha256(token)
  const used = await tx.findOne(RefreshTokenEntity, { where: { tokenHash }, lock: { mode: 'pessimistic_write' } })
  const session = used && (await openSessionOf(tx, used.sessionId, now))
  if (!used || !session) return null
  const refresh = nextRefreshToken(secret, token)
  if (used.usedAt === null) {
    await tx.update(RefreshTokenEntity, { tokenHash }, { usedAt: now })
    await tx.insert(RefreshTokenEntity, { tokenHash: sha256(refresh), sessionId: session.id, createdAt: now, usedAt: null })
  } else if (now.getTime() - used.usedAt.getTime() > REUSE_MS) {
    await revoke(tx, session, now)
    return null
  }
  return { personId: session.personId, sessionId: session.id, refresh }
}

/**
 * The tokens that follow. A token used within the last 10 s yields the same successor again; one used earlier was copied:
 * its whole session ends.
 * @throws AppError `unauthenticated` for a token that is unknown, used, run out, or of a session that ended
 */
export async function refreshSession(db: EntityManager, settings: SessionSettings, token: string): Promise<Tokens> {
  const next = await inTransaction(db, (tx) => rotate(tx, settings, token))
  if (next === null) throw new AppError('unauthenticated')
  return { access: issueAccessToken(settings, next.personId, next.sessionId), refresh: next.refresh }
}
