import type { z } from 'zod'
import type { ApiErrorCode, ApiIssue } from '#shared/contracts/apiError'
import { readableIssues } from '#shared/readableIssues'

/** The one table from error code to HTTP status. */
export const STATUS = {
  invalid_request: 400,
  unauthenticated: 401,
  forbidden: 403,
  not_found: 404,
  conflict: 409,
  stale: 412,
  too_large: 413,
  unsupported_media_type: 415,
  out_of_scope: 422,
  version_required: 428,
  limited: 429,
  internal: 500,
  unavailable: 503,
} as const satisfies Record<ApiErrorCode, number>

const MESSAGE = {
  invalid_request: 'The request is not as expected; see the issues.',
  unauthenticated: 'Sign in first.',
  forbidden: 'Your role does not allow this.',
  not_found: 'There is nothing here, or it is not yours to see.',
  conflict: 'This contradicts what is stored already.',
  stale: 'Somebody changed this meanwhile. Read it again and repeat your change.',
  too_large: 'The request is larger than allowed.',
  unsupported_media_type: 'Send JSON, with the header Content-Type: application/json.',
  out_of_scope: 'This is outside what can be answered.',
  version_required: 'Say which version you change, with the header If-Match.',
  limited: 'Too many attempts. Wait a while.',
  internal: 'Something went wrong on our side. It was recorded under this request id.',
  unavailable: 'Not available at this moment. Try again shortly.',
} as const satisfies Record<ApiErrorCode, string>

/** An error the caller can act on: its body may be sent as it is. Anything else is a fault of ours. */
export class AppError extends Error {
  constructor(
    readonly code: ApiErrorCode,
    message?: string,
    readonly issues?: readonly ApiIssue[],
    /** Seconds after which another attempt may succeed: the header Retry-After. */
    readonly retryAfterS?: number,
  ) {
    super(message ?? MESSAGE[code])
    this.name = 'AppError'
  }
}

/** A refusal of one field. */
export function refuse(path: string, message: string): AppError {
  return new AppError('invalid_request', undefined, [{ path, message }])
}

const MOST_ISSUES = 50
const SECRET = /(^|\.)(password|token)$/

/** Rows of `{ path, message }` as the API answers them: at most 50, none too long, no secret quoted back. */
function issuesOf(error: z.core.$ZodError, value: unknown): ApiIssue[] {
  return readableIssues(error.issues, value)
    .slice(0, MOST_ISSUES)
    .map(({ path, message }) => ({
      path: path.slice(0, 200),
      message: (SECRET.test(path) ? message.replace(/, got .*$/s, '') : message).slice(0, 500),
    }))
}

/** Value of `schema` read from untrusted `value`. @throws AppError `invalid_request` with every issue and its path */
export function parse<T extends z.ZodType>(schema: T, value: unknown, root = ''): z.infer<T> {
  const result = schema.safeParse(value)
  if (result.success) return result.data
  const issues = issuesOf(result.error, value)
  throw new AppError(
    'invalid_request',
    undefined,
    issues.map(({ path, message }) => ({ path: [root, path].filter((step) => step !== '').join('.'), message })),
  )
}
