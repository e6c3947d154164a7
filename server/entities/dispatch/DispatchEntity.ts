import type { DispatchState } from '#shared/contracts/dispatch'
import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm'

/**
 * A comparison sent to a contact: what was sent is frozen here and never computed again. The recipient is kept as it was then.
 * `state`, `tries`, `lastAnswer` and `sentAt` mirror the outbox row.
 */
@Entity('dispatch')
@ForeignKey('ProjectEntity', ['firmId', 'projectId'], ['firmId', 'id'], { name: 'fk_dispatch_project', onDelete: 'CASCADE' })
@ForeignKey('PersonEntity', ['firmId', 'sentBy'], ['firmId', 'id'], { name: 'fk_dispatch_sent_by' })
@Index('ix_dispatch_project', ['firmId', 'projectId', 'createdAt'])
@Index('ix_dispatch_recipient', ['firmId', 'contactEmail', 'createdAt'])
export class DispatchEntity {
  @PrimaryColumn({ name: 'firm_id', type: 'uuid' }) firmId: string
  @PrimaryColumn({ type: 'uuid' }) id: string
  @Column({ name: 'project_id', type: 'uuid' }) projectId: string
  @Column({ name: 'project_name', type: 'varchar', length: 120 }) projectName: string
  @Column({ name: 'contact_id', type: 'uuid' }) contactId: string
  @Column({ name: 'contact_name', type: 'varchar', length: 120 }) contactName: string
  @Column({ name: 'contact_email', type: 'varchar', length: 254 }) contactEmail: string
  @Column({ name: 'ribbed_mark', type: 'varchar', length: 20, collation: 'utf8mb4_bin' }) ribbedMark: string
  @Column({ name: 'solid_mark', type: 'varchar', length: 20, collation: 'utf8mb4_bin' }) solidMark: string
  @Column({ type: 'text' }) note: string
  @Column({ type: 'enum', enum: ['queued', 'sent', 'refused', 'failed'] }) state: DispatchState
  @Column({ type: 'int', unsigned: true, default: 0 }) tries: number
  @Column({ name: 'last_answer', type: 'varchar', length: 500, nullable: true }) lastAnswer: string | null
  @Column({ name: 'message_id', type: 'varchar', length: 120 }) messageId: string
  @Column({ name: 'sent_by', type: 'uuid' }) sentBy: string
  @Column({ name: 'created_at', type: 'datetime', precision: 6 }) createdAt: Date
  @Column({ name: 'sent_at', type: 'datetime', precision: 6, nullable: true }) sentAt: Date | null
  /** The comparison as it was sent (server/reports/frozenComparison.ts). */
  @Column({ type: 'json', select: false }) frozen: unknown
  /** The report as printed for the mail; null until it was first printed. */
  @Column({ type: 'mediumblob', nullable: true, select: false }) pdf: Buffer | null
  @Column({ type: 'int', unsigned: true, default: 1 }) version: number
}
