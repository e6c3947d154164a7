import { destination, pino, type Logger } from 'pino'
import type { Env } from './env'

export type Log = Logger

/** The log: one JSON line an event, on stderr. Callers give it ids and codes, never passwords, tokens, cookies or mail. */
export function createLog(level: Env['logLevel']): Log {
  return pino({ level, base: undefined, timestamp: () => `,"time":"${new Date().toISOString()}"` }, destination(2))
}
