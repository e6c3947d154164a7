import type { ApiError } from '#shared/contracts/apiError'
import type { ErrorRequestHandler, Request, Response } from 'express'
import type { EntityManager } from 'typeorm'
import { AppError, STATUS } from '../errors'
import type { Log } from '../log'
import { recordEvent } from '../services/auditLog'
import type { SignedIn } from '../services/session/signedIn'
import { createAllowance } from '../services/allowance'
import { isUnavailable } from '../services/unavailable'

/** An error of the framework that says itself that it may be shown: a body that is no JSON, an address that cannot be decoded. */
function fromFramework(error: unknown): AppError | null {
  if (!(error instanceof Error) || !('status' in error) || typeof error.status !== 'number') return null
  if (error.status < 400 || error.status > 499) return null
  if (error.status === 403 || error.status === 404) return new AppError('not_found')
  if (error.status === 413) return new AppError('too_large')
  if (error.status === 415) return new AppError('unsupported_media_type')
  const reason = 'type' in error && error.type === 'entity.parse.failed' ? 'The body is not JSON.' : undefined
  return new AppError('invalid_request', reason)
}

/** The error as the caller may see it: what is not known to be theirs is ours. */
export function toAppError(error: unknown): AppError {
  if (error instanceof AppError) return error
  if (isUnavailable(error)) return new AppError('unavailable', undefined, undefined, 1)
  return fromFramework(error) ?? new AppError('internal')
}

/** Refusals of one caller that are recorded: more of them say nothing new, and would let anybody fill the table. */
const RECORDED = { most: 100, windowMs: 3_600_000 }

async function auditRefusal(db: EntityManager, request: Request, response: Response): Promise<void> {
  const who = response.locals['who'] as SignedIn | undefined
  const detail = { method: request.method, path: request.path.slice(0, 200) }
  await recordEvent(db, { event: 'request.refused', firmId: who?.firmId ?? null, personId: who?.personId ?? null, detail })
}

/** The person who is signed in, else the address. */
function callerOf(request: Request, response: Response): string {
  const who = response.locals['who'] as SignedIn | undefined
  return who?.personId ?? `nobody at ${request.ip ?? 'unknown'}`
}

/** Answers every error in the one shape; logs whole what is ours, and records what was refused for want of rights. */
export function errorHandler(db: EntityManager, log: Log): ErrorRequestHandler {
  const isRecorded = createAllowance(RECORDED)
  return async (error: unknown, request, response, next) => {
    const known = toAppError(error)
    const requestId = String(request.id)
    if (STATUS[known.code] >= 500) log.error({ err: error, requestId }, 'request failed')
    // after a whole answer the connection stays: cutting it would tell the caller how the work behind the answer went
    if (response.writableEnded) return
    if (response.headersSent) return next(error)
    const body: ApiError = { code: known.code, message: known.message, requestId }
    if (known.retryAfterS !== undefined) response.set('Retry-After', String(known.retryAfterS))
    response
      .status(STATUS[known.code])
      .set('Cache-Control', 'no-store')
      .json(known.issues === undefined ? body : { ...body, issues: known.issues })
    if (known.code !== 'forbidden' || !isRecorded(callerOf(request, response))) return
    await auditRefusal(db, request, response).catch((cause: unknown) =>
      log.error({ err: cause, requestId }, 'refusal not recorded'),
    )
  }
}
