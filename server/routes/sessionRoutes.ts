import type { Session } from '#shared/contracts/session'
import { signInInput } from '#shared/contracts/session'
import { Router } from 'express'
import type { EntityManager } from 'typeorm'
import { z } from 'zod'
import { AppError, parse } from '../errors'
import { clearCookies, readCookie, setCookies } from '../middleware/sessionCookies'
import { signedInOnly, whoOf } from '../middleware/signedInOnly'
import { refreshSession } from '../services/session/refreshSession'
import { signIn, signOut, whoIs } from '../services/session/sessionService'
import type { SessionSettings } from '../services/session/sessionSettings'
import type { SignedIn } from '../services/session/signedIn'

const toSession = (who: SignedIn, hasLocalMail: boolean): Session => ({
  person: { id: who.personId, name: who.name, email: who.email, roles: [...who.roles] },
  firm: { id: who.firmId, name: who.firmName, isDemo: who.isDemo },
  hasLocalMail,
})

/** Signing in and out, and staying signed in. */
export function sessionRoutes(db: EntityManager, settings: SessionSettings, hasLocalMail: boolean): Router {
  return Router()
    .post('/session', async (request, response) => {
      const input = parse(signInInput, request.body)
      const tokens = await signIn(db, settings, input, request.ip ?? 'unknown')
      const who = await whoIs(db, settings, tokens.access)
      if (who === null) throw new AppError('unauthenticated')
      setCookies(request, response, tokens)
      response.status(201).json(toSession(who, hasLocalMail))
    })
    .post('/session/refresh', async (request, response) => {
      parse(z.strictObject({}), request.body)
      const token = readCookie(request, 'refresh')
      if (token === undefined) throw new AppError('unauthenticated')
      setCookies(request, response, await refreshSession(db, settings, token))
      response.status(204).end()
    })
    .get('/session', signedInOnly(db, settings), (_request, response) => {
      response.json(toSession(whoOf(response), hasLocalMail))
    })
    .delete('/session', signedInOnly(db, settings), async (request, response) => {
      await signOut(db, whoOf(response))
      clearCookies(request, response)
      response.status(204).end()
    })
}
