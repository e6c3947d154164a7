import type { EntitySubscriberInterface, InsertEvent, TransactionCommitEvent } from 'typeorm'
import { OutboxEntity } from '../entities/dispatch/OutboxEntity'

const MARK = 'hasQueuedMail'

/** True of a query runner whose open transaction has queued a mail. */
function marked(runner: { data: Record<string, unknown> }): boolean {
  return runner.data[MARK] === true
}

/**
 * Tells the worker of this process that a transaction which queued a mail was committed. Added to the data source by the
 * worker; a process without a worker needs none.
 */
export class OutboxSignal implements EntitySubscriberInterface<OutboxEntity> {
  constructor(private readonly wake: () => void) {}

  listenTo(): typeof OutboxEntity {
    return OutboxEntity
  }

  afterInsert({ queryRunner }: InsertEvent<OutboxEntity>): void {
    queryRunner.data = { ...(queryRunner.data as Record<string, unknown>), [MARK]: true }
  }

  afterTransactionCommit({ queryRunner }: TransactionCommitEvent): void {
    if (queryRunner.isTransactionActive || !marked(queryRunner)) return
    queryRunner.data = { ...(queryRunner.data as Record<string, unknown>), [MARK]: false }
    this.wake()
  }
}
