import { Column, Entity, PrimaryColumn } from 'typeorm'

/** A firm: nothing of one is ever seen by another. */
@Entity('firm')
export class FirmEntity {
  @PrimaryColumn({ type: 'uuid' }) id: string
  @Column({ type: 'varchar', length: 120 }) name: string
  /** Loaded as an example: screens say so. */
  @Column({ name: 'is_demo', type: 'boolean', default: false }) isDemo: boolean
  @Column({ name: 'created_at', type: 'datetime', precision: 6 }) createdAt: Date
}
