import type { CookieOptions, Request, Response } from 'express'
import type { Tokens } from '../services/session/sessionService'
import { SESSION_S } from '../services/session/sessionSettings'

type TokenName = keyof Tokens

/** `__Host-` ties a cookie to this host over https; browsers refuse it on plain http. */
const nameOf = (token: TokenName, isHttps: boolean) => `${isHttps ? '__Host-' : ''}bothways-${token}`

const optionsOf = (isHttps: boolean): CookieOptions => ({ httpOnly: true, sameSite: 'strict', secure: isHttps, path: '/' })

const isHttps = (request: Request): boolean => request.app.get('is https') === true

/** Token of this kind that came with the request. */
export function readCookie(request: Request, token: TokenName): string | undefined {
  const cookies = request.cookies as Record<string, unknown>
  const value = cookies[nameOf(token, isHttps(request))]
  return typeof value === 'string' && value.length <= 2048 ? value : undefined
}

/** Gives the browser both tokens, out of reach of scripts. */
export function setCookies(request: Request, response: Response, tokens: Tokens): void {
  const options = { ...optionsOf(isHttps(request)), maxAge: SESSION_S * 1000 }
  response.cookie(nameOf('access', isHttps(request)), tokens.access, options)
  response.cookie(nameOf('refresh', isHttps(request)), tokens.refresh, options)
}

/** Takes both tokens from the browser. */
export function clearCookies(request: Request, response: Response): void {
  response.clearCookie(nameOf('access', isHttps(request)), optionsOf(isHttps(request)))
  response.clearCookie(nameOf('refresh', isHttps(request)), optionsOf(isHttps(request)))
}
