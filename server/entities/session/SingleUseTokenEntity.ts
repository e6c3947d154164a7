import { Column, Entity, ForeignKey, PrimaryColumn } from 'typeorm'

/** A link sent by mail, by the hash of its token: it works once, until it expires. */
@Entity('single_use_token')
@ForeignKey('PersonEntity', ['firmId', 'personId'], ['firmId', 'id'], { name: 'fk_single_use_token_person', onDelete: 'CASCADE' })
export class SingleUseTokenEntity {
  /** SHA-256, hexadecimal. */
  @PrimaryColumn({ name: 'token_hash', type: 'char', length: 64 }) tokenHash: string
  @Column({ name: 'firm_id', type: 'uuid' }) firmId: string
  @Column({ name: 'person_id', type: 'uuid' }) personId: string
  @Column({ type: 'enum', enum: ['invitation', 'passwordReset'] }) kind: 'invitation' | 'passwordReset'
  @Column({ name: 'created_at', type: 'datetime', precision: 6 }) createdAt: Date
  @Column({ name: 'expires_at', type: 'datetime', precision: 6 }) expiresAt: Date
  @Column({ name: 'used_at', type: 'datetime', precision: 6, nullable: true }) usedAt: Date | null
}
