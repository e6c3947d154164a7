import { createHmac, randomBytes } from 'node:crypto'
import { tokenKey } from './accessToken'

/** A new refresh token: 256 random bits, base64url. */
export const newRefreshToken = (): string => randomBytes(32).toString('base64url')

/** The one token that follows `token`. It is derived, not stored, so that two tabs that refresh together get the same one. */
export function nextRefreshToken(secret: string, token: string): string {
  return createHmac('sha256', tokenKey(secret, 'refresh')).update(token).digest('base64url')
}
