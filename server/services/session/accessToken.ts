import { createSecretKey, hkdfSync, type KeyObject } from 'node:crypto'
import jsonwebtoken from 'jsonwebtoken'
import { z } from 'zod'
import { ACCESS_S, type SessionSettings } from './sessionSettings'

const payload = z.object({
  iss: z.string(),
  aud: z.string(),
  sub: z.uuid(),
  sid: z.uuid(),
  typ: z.literal('access'),
  iat: z.number(),
  exp: z.number(),
})

const keys = new Map<string, KeyObject>()

/**
 * Key of one purpose, drawn from the secret, so that a token of one kind is never one of another. Drawn once: as a key object it is
 * taken as it is, where bytes would first be tried as a public key at every request.
 */
export function tokenKey(secret: string, purpose: 'access' | 'refresh'): KeyObject {
  const name = `${purpose} ${secret}`
  const key = keys.get(name) ?? createSecretKey(Buffer.from(hkdfSync('sha256', secret, '', `bothways ${purpose}`, 32)))
  keys.set(name, key)
  return key
}

/** A signed statement that this session of this person may call the API for the next 10 minutes. */
export function issueAccessToken({ secret, origin }: SessionSettings, personId: string, sessionId: string): string {
  return jsonwebtoken.sign({ sid: sessionId, typ: 'access' }, tokenKey(secret, 'access'), {
    algorithm: 'HS256',
    issuer: origin,
    audience: origin,
    subject: personId,
    expiresIn: ACCESS_S,
  })
}

/** Person and session of a token of ours that has not run out; null for anything else. */
export function readAccessToken(
  { secret, origin }: SessionSettings,
  token: string,
): { personId: string; sessionId: string } | null {
  let claims: unknown
  try {
    claims = jsonwebtoken.verify(token, tokenKey(secret, 'access'), { algorithms: ['HS256'], issuer: origin, audience: origin })
  } catch (error) {
    if (error instanceof jsonwebtoken.JsonWebTokenError || error instanceof SyntaxError) return null
    throw error
  }
  const read = payload.safeParse(claims)
  return read.success ? { personId: read.data.sub, sessionId: read.data.sid } : null
}
