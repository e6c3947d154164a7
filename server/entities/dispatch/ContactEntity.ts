import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm'

/** Somebody to whom comparisons of a project may be sent. */
@Entity('contact')
@ForeignKey('ProjectEntity', ['firmId', 'projectId'], ['firmId', 'id'], { name: 'fk_contact_project', onDelete: 'CASCADE' })
@Index('uq_contact_email', ['firmId', 'projectId', 'email'], { unique: true })
export class ContactEntity {
  @PrimaryColumn({ name: 'firm_id', type: 'uuid' }) firmId: string
  @PrimaryColumn({ type: 'uuid' }) id: string
  @Column({ name: 'project_id', type: 'uuid' }) projectId: string
  @Column({ type: 'varchar', length: 120 }) name: string
  /** Lower case. */
  @Column({ type: 'varchar', length: 254 }) email: string
  @Column({ name: 'created_at', type: 'datetime', precision: 6 }) createdAt: Date
}
