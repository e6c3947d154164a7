import { Column, Entity, Index, PrimaryColumn } from 'typeorm'

/** What must be answerable later: sign-ins, refusals, changes of money and of rights. Rows are only added. */
@Entity('audit')
@Index('ix_audit_firm', ['firmId', 'at'])
export class AuditEntity {
  @PrimaryColumn({ type: 'uuid' }) id: string
  @Column({ type: 'datetime', precision: 6 }) at: Date
  /** Null where nobody known was there: a sign-in of an unknown address. */
  @Column({ name: 'firm_id', type: 'uuid', nullable: true }) firmId: string | null
  @Column({ name: 'person_id', type: 'uuid', nullable: true }) personId: string | null
  @Column({ type: 'varchar', length: 60 }) event: string
  @Column({ type: 'json' }) detail: Record<string, unknown>
}
