import { Column, Entity, ForeignKey, PrimaryColumn } from 'typeorm'

/** What a creating request under a key asked and made: the same request again is answered from here. */
@Entity('idempotency')
@ForeignKey('PersonEntity', ['firmId', 'personId'], ['firmId', 'id'], { name: 'fk_idempotency_person', onDelete: 'CASCADE' })
export class IdempotencyEntity {
  @PrimaryColumn({ name: 'firm_id', type: 'uuid' }) firmId: string
  @PrimaryColumn({ name: 'person_id', type: 'uuid' }) personId: string
  /** SHA-256 of the caller's key, hexadecimal. */
  @PrimaryColumn({ name: 'key_hash', type: 'char', length: 64 }) keyHash: string
  /** SHA-256 of what was asked, hexadecimal. */
  @Column({ name: 'request_hash', type: 'char', length: 64 }) requestHash: string
  @Column({ type: 'json' }) answer: unknown
  @Column({ name: 'created_at', type: 'datetime', precision: 6 }) createdAt: Date
}
