import { driverCode } from './transaction'

/** Driver and network codes that mean: the database is not there, too slow, or all its connections are busy. */
const CODES = new Set([
  'ECONNREFUSED',
  'ECONNRESET',
  'ENOENT',
  'EPIPE',
  'ETIMEDOUT',
  'EHOSTUNREACH',
  'ENETUNREACH',
  'ENOTFOUND',
  'EAI_AGAIN',
  'PROTOCOL_CONNECTION_LOST',
  'PROTOCOL_SEQUENCE_TIMEOUT',
  'POOL_CLOSED',
  'ER_CON_COUNT_ERROR',
  'ER_SERVER_SHUTDOWN',
  'ER_CONNECTION_KILLED',
  'ER_STATEMENT_TIMEOUT',
  'ER_LOCK_WAIT_TIMEOUT',
  'ER_LOCK_DEADLOCK',
])
/** What the driver says where it gives no code. */
const MESSAGES = /^(Queue limit reached|No connections available|Pool is closed|.*connection is in closed state|Connection lost)/

/** True when an error says that the database cannot be had at this moment, which passes by itself. */
export function isUnavailable(error: unknown): boolean {
  if (!(error instanceof Error)) return false
  const cause: unknown = 'driverError' in error ? error.driverError : error
  const code =
    driverCode(error) ?? (cause instanceof Error && 'syscall' in cause && 'code' in cause ? String(cause.code) : undefined)
  return (code !== undefined && CODES.has(code)) || MESSAGES.test(error.message)
}
