import type { DispatchState } from '#shared/contracts/dispatch'
import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm'

/** A mail to be sent, written in the transaction of what it tells about. A worker claims it, sends it and marks it. */
@Entity('outbox')
@ForeignKey('FirmEntity', ['firmId'], ['id'], { name: 'fk_outbox_firm' })
@ForeignKey('DispatchEntity', ['firmId', 'dispatchId'], ['firmId', 'id'], { name: 'fk_outbox_dispatch', onDelete: 'CASCADE' })
@Index('ix_outbox_due', ['state', 'dueAt'])
@Index('ix_outbox_day', ['firmId', 'createdAt'])
export class OutboxEntity {
  @PrimaryColumn({ name: 'firm_id', type: 'uuid' }) firmId: string
  @PrimaryColumn({ type: 'uuid' }) id: string
  @Column({ name: 'dispatch_id', type: 'uuid', nullable: true }) dispatchId: string | null
  /** Fixed when queued: a mail that has to be repeated carries the same one. */
  @Column({ name: 'message_id', type: 'varchar', length: 120 }) messageId: string
  @Column({ name: 'to_name', type: 'varchar', length: 120 }) toName: string
  @Column({ name: 'to_email', type: 'varchar', length: 254 }) toEmail: string
  @Column({ type: 'varchar', length: 300 }) subject: string
  /** Both bodies are emptied once the mail was accepted: it may carry a link that opens an account. */
  @Column({ type: 'mediumtext' }) text: string
  @Column({ type: 'mediumtext' }) html: string
  @Column({ type: 'enum', enum: ['queued', 'sent', 'refused', 'failed'] }) state: DispatchState
  @Column({ type: 'int', unsigned: true, default: 0 }) tries: number
  /** While queued: when it may be claimed. A claim moves it on by the length of the lease. */
  @Column({ name: 'due_at', type: 'datetime', precision: 6 }) dueAt: Date
  /** Of the worker that claimed it last: only that one may mark it. */
  @Column({ name: 'claim', type: 'uuid', nullable: true }) claim: string | null
  @Column({ name: 'last_answer', type: 'varchar', length: 500, nullable: true }) lastAnswer: string | null
  @Column({ name: 'created_at', type: 'datetime', precision: 6 }) createdAt: Date
  @Column({ name: 'sent_at', type: 'datetime', precision: 6, nullable: true }) sentAt: Date | null
}
