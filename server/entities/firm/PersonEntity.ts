import type { Person } from '#shared/contracts/person'
import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm'

@Entity('person')
@ForeignKey('FirmEntity', ['firmId'], ['id'], { name: 'fk_person_firm' })
@Index('uq_person_email', ['firmId', 'email'], { unique: true })
@Index('ix_person_sign_in', ['email'])
export class PersonEntity {
  @PrimaryColumn({ name: 'firm_id', type: 'uuid' }) firmId: string
  @PrimaryColumn({ type: 'uuid' }) id: string
  @Column({ type: 'varchar', length: 120 }) name: string
  /** Lower case. */
  @Column({ type: 'varchar', length: 254 }) email: string
  /** Argon2id in its own text form; null until the invitation is accepted. */
  @Column({ name: 'password_hash', type: 'varchar', length: 255, nullable: true }) passwordHash: string | null
  @Column({ type: 'enum', enum: ['invited', 'active', 'off'] }) state: Person['state']
  @Column({ type: 'int', unsigned: true, default: 1 }) version: number
  @Column({ name: 'created_at', type: 'datetime', precision: 6 }) createdAt: Date
}
