import { apiError } from '#shared/contracts/apiError'
import type { z } from 'zod'
import { ApiFailure } from './apiFailure'

export type Method = 'GET' | 'POST' | 'PUT' | 'DELETE'

export interface RequestOptions {
  readonly body?: unknown
  /** A form with a file, in place of a body. */
  readonly form?: FormData
  /** Version of the row being changed: goes out as `If-Match`. */
  readonly version?: number
  /** Makes a creating POST safe to repeat. */
  readonly idempotencyKey?: string
  /** Sent even while the page is being left. */
  readonly keepalive?: boolean
  /** Answer 401 as a failure without asking for a new session: for signing in itself. */
  readonly isSigningIn?: boolean
}

let renewSession: () => Promise<boolean> = () => Promise.resolve(false)

/** Sets what is tried once when the session has run out: true when the call may be repeated. */
export function onUnauthenticated(hook: () => Promise<boolean>): void {
  renewSession = hook
}

function headersOf({ body, version, idempotencyKey }: RequestOptions): Headers {
  const headers = new Headers({ Accept: 'application/json', 'X-Requested-With': 'bothways' })
  if (body !== undefined) headers.set('Content-Type', 'application/json')
  if (version !== undefined) headers.set('If-Match', `"${version}"`)
  if (idempotencyKey !== undefined) headers.set('Idempotency-Key', idempotencyKey)
  return headers
}

async function send(method: Method, path: string, options: RequestOptions): Promise<Response> {
  const { body, form, keepalive = false } = options
  try {
    return await fetch(path, {
      method,
      headers: headersOf(options),
      credentials: 'same-origin',
      cache: 'no-store',
      keepalive,
      ...(form !== undefined ? { body: form } : body === undefined ? {} : { body: JSON.stringify(body) }),
    })
  } catch (cause) {
    throw new ApiFailure('unreachable', cause instanceof Error ? cause.message : 'no answer')
  }
}

async function failureOf(response: Response): Promise<ApiFailure> {
  const answer = apiError.safeParse(await response.json().catch(() => null))
  if (!answer.success) return new ApiFailure('unreadable', `the server answered ${response.status} without saying why`)
  const { code, message, issues, requestId } = answer.data
  return new ApiFailure(code, message, issues, requestId)
}

async function answered(method: Method, path: string, options: RequestOptions): Promise<Response> {
  const first = await send(method, path, options)
  const response =
    first.status === 401 && !options.isSigningIn && (await renewSession()) ? await send(method, path, options) : first
  if (!response.ok) throw await failureOf(response)
  return response
}

/** Calls the API and reads the answer by its contract. @throws ApiFailure */
export async function request<T extends z.ZodType>(
  schema: T,
  method: Method,
  path: string,
  options: RequestOptions = {},
): Promise<z.infer<T>> {
  const response = await answered(method, path, options)
  const answer = schema.safeParse(await response.json().catch(() => null))
  if (!answer.success) throw new ApiFailure('unreadable', `${method} ${path}: ${answer.error.message}`)
  return answer.data
}

/** Calls the API where success has no body to read. @throws ApiFailure */
export async function command(method: Method, path: string, options: RequestOptions = {}): Promise<void> {
  await answered(method, path, options)
}
