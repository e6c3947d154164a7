import { destination, pino, type Logger } from 'pino'
import type { Env } from './env'

export type Log = Logger

interface LoggedError {
  readonly type: string
  readonly message: string
  readonly code?: string
  readonly stack?: string
}

/** An error as it is logged: never with what else hangs on it, as a database driver's statement and its values. */
function loggedError(error: unknown): LoggedError {
  if (!(error instanceof Error)) return { type: typeof error, message: String(error) }
  const { name, message, stack } = error
  const code = 'code' in error && typeof error.code === 'string' ? { code: error.code } : {}
  return { type: name, message, ...code, ...(stack === undefined ? {} : { stack }) }
}

/** The log: one JSON line an event, on stderr. Callers give it ids and codes, never passwords, tokens, cookies or mail. */
export function createLog(level: Env['logLevel'], stream = destination(2)): Log {
  const timestamp = () => `,"time":"${new Date().toISOString()}"`
  return pino({ level, base: undefined, timestamp, serializers: { err: loggedError } }, stream)
}
