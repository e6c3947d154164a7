import type { Logger } from 'typeorm'

const nothing = () => undefined

/** What the database layer would print by itself, values and all. Failed queries reach the log as errors, by the error handler. */
export const QUIET_DATABASE: Logger = {
  logQuery: nothing,
  logQueryError: nothing,
  logQuerySlow: nothing,
  logSchemaBuild: nothing,
  logMigration: nothing,
  log: nothing,
}
