import 'reflect-metadata'
import { DataSource } from 'typeorm'
import { ENTITIES } from './entities/entityList'
import type { DatabaseSettings } from './env'
import { MIGRATIONS } from './migrations/migrationList'
import { QUIET_DATABASE } from './quietDatabase'
import { QueryTimeLimit } from './queryTimeLimit'

/** Bounds of the pool: what does not fit is refused at once, what takes too long is cut off with its connection. */
export interface PoolLimits {
  readonly connections: number
  readonly waiting: number
  readonly queryMs: number
  readonly connectMs: number
}

export const POOL_LIMITS: PoolLimits = { connections: 12, waiting: 400, queryMs: 1_800, connectMs: 1_500 }

/** Connection to the database; `initialize()` opens it. The schema changes by migrations only. */
export function createDataSource(settings: DatabaseSettings, limits: PoolLimits = POOL_LIMITS): DataSource {
  return new DataSource({
    type: 'mariadb',
    ...settings,
    charset: 'utf8mb4_unicode_520_ci',
    timezone: 'Z',
    supportBigNumbers: true,
    synchronize: false,
    logging: false,
    logger: QUIET_DATABASE,
    entities: ENTITIES,
    migrations: MIGRATIONS,
    migrationsTableName: 'migration',
    migrationsTransactionMode: 'none',
    subscribers: [QueryTimeLimit],
    poolSize: limits.connections,
    connectTimeout: limits.connectMs,
    maxQueryExecutionTime: limits.queryMs,
    enableQueryTimeout: true,
    extra: { queueLimit: limits.waiting, maxIdle: limits.connections, multipleStatements: false },
  })
}
