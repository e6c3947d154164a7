import { EventSubscriber, type EntitySubscriberInterface } from 'typeorm'

/** True of an error, or of the error it wraps, that carries the driver's code for a query without an answer in time. */
function isTimeout(error: unknown): boolean {
  if (!(error instanceof Error)) return false
  return 'code' in error && error.code === 'PROTOCOL_SEQUENCE_TIMEOUT'
}

type AfterQueryEvent = Parameters<NonNullable<EntitySubscriberInterface['afterQuery']>>[0]

interface HasConnection {
  readonly databaseConnection?: { destroy(): void }
}

/**
 * Takes a connection out of the pool when a query on it got no answer in time. The driver would hand it out again with
 * the unanswered query still in front of the next one, and a database that never answers would keep the pool for good.
 */
@EventSubscriber()
export class QueryTimeLimit implements EntitySubscriberInterface {
  afterQuery({ success, error, queryRunner }: AfterQueryEvent): void {
    if (!success && isTimeout(error)) (queryRunner as HasConnection).databaseConnection?.destroy()
  }
}
