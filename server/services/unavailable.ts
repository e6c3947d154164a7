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

/** What the driver was doing: a file that is not there is no database that is not there. */
const CALLS = new Set(['connect', 'read', 'write', 'query', 'getaddrinfo'])

function networkCode(error: unknown): string | undefined {
  if (!(error instanceof Error) || !('syscall' in error) || !CALLS.has(String(error.syscall))) return undefined
  return 'code' in error ? String(error.code) : undefined
}

/** True when an error says that the database cannot be had at this moment, which passes by itself. */
export function isUnavailable(error: unknown): boolean {
  if (!(error instanceof Error)) return false
  const code = driverCode(error) ?? networkCode('driverError' in error ? error.driverError : error)
  return (code !== undefined && CODES.has(code)) || MESSAGES.test(error.message)
}
