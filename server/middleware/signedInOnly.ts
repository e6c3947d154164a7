import type { NextFunction, Request, RequestHandler, Response } from 'express'
import type { EntityManager } from 'typeorm'
import { AppError } from '../errors'
import { whoIs } from '../services/session/sessionService'
import type { SessionSettings } from '../services/session/sessionSettings'
import type { SignedIn } from '../services/session/signedIn'
import { readCookie } from './sessionCookies'

/** Lets signed-in people through, with who they are at this moment; everybody else is answered 401. */
export function signedInOnly(db: EntityManager, settings: SessionSettings): RequestHandler {
  return async (request: Request, response: Response, next: NextFunction) => {
    const token = readCookie(request, 'access')
    const who = token === undefined ? null : await whoIs(db, settings, token)
    if (who === null) throw new AppError('unauthenticated')
    response.locals['who'] = who
    next()
  }
}

/** Who asks. To be called behind `signedInOnly`. */
export function whoOf(response: Response): SignedIn {
  const who = response.locals['who'] as SignedIn | undefined
  if (who === undefined) throw new AppError('unauthenticated')
  return who
}
