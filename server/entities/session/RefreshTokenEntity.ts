import { Column, Entity, ForeignKey, PrimaryColumn } from 'typeorm'

/** A refresh token of a session, by its hash. Used ones stay, so that a stolen one betrays itself. */
@Entity('refresh_token')
@ForeignKey('SessionEntity', ['sessionId'], ['id'], { name: 'fk_refresh_token_session', onDelete: 'CASCADE' })
export class RefreshTokenEntity {
  /** SHA-256, hexadecimal. */
  @PrimaryColumn({ name: 'token_hash', type: 'char', length: 64 }) tokenHash: string
  @Column({ name: 'session_id', type: 'uuid' }) sessionId: string
  @Column({ name: 'created_at', type: 'datetime', precision: 6 }) createdAt: Date
  @Column({ name: 'used_at', type: 'datetime', precision: 6, nullable: true }) usedAt: Date | null
}
