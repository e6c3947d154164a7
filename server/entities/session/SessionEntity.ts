import { Column, Entity, ForeignKey, PrimaryColumn } from 'typeorm'

/** One sign-in and every token that follows from it: revoking it ends them all. */
@Entity('session')
@ForeignKey('PersonEntity', ['firmId', 'personId'], ['firmId', 'id'], { name: 'fk_session_person', onDelete: 'CASCADE' })
export class SessionEntity {
  @PrimaryColumn({ type: 'uuid' }) id: string
  @Column({ name: 'firm_id', type: 'uuid' }) firmId: string
  @Column({ name: 'person_id', type: 'uuid' }) personId: string
  @Column({ name: 'created_at', type: 'datetime', precision: 6 }) createdAt: Date
  @Column({ name: 'expires_at', type: 'datetime', precision: 6 }) expiresAt: Date
  @Column({ name: 'revoked_at', type: 'datetime', precision: 6, nullable: true }) revokedAt: Date | null
}
