import type { ItemCode } from '#shared/contracts/appraisal'
import { Column, Entity, ForeignKey, PrimaryColumn } from 'typeorm'

/** A rate that a project prices an item by in place of its edition's. Decimals come as padded strings. */
@Entity('rate_override')
@ForeignKey('ProjectEntity', ['firmId', 'projectId'], ['firmId', 'id'], { name: 'fk_rate_override_project' })
@ForeignKey('PersonEntity', ['firmId', 'changedBy'], ['firmId', 'id'], { name: 'fk_rate_override_changed_by' })
export class RateOverrideEntity {
  @PrimaryColumn({ name: 'firm_id', type: 'uuid' }) firmId: string
  @PrimaryColumn({ name: 'project_id', type: 'uuid' }) projectId: string
  @PrimaryColumn({ type: 'varchar', length: 40, collation: 'utf8mb4_bin' }) item: ItemCode
  @Column({ type: 'decimal', precision: 15, scale: 6 }) rate: string
  @Column({ type: 'varchar', length: 400 }) reason: string
  @Column({ name: 'changed_by', type: 'uuid' }) changedBy: string
  @Column({ name: 'changed_at', type: 'datetime', precision: 6 }) changedAt: Date
  @Column({ type: 'int', unsigned: true, default: 1 }) version: number
}
