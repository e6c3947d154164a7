import type { ResourceKind } from '#shared/contracts/resource'
import { Column, Entity, ForeignKey, PrimaryColumn } from 'typeorm'

/** What rates of an edition are built up from. Fixed with its edition; decimals come as padded strings. */
@Entity('resource')
@ForeignKey('EditionEntity', ['firmId', 'editionId'], ['firmId', 'id'], { name: 'fk_resource_edition' })
export class ResourceEntity {
  @PrimaryColumn({ name: 'firm_id', type: 'uuid' }) firmId: string
  @PrimaryColumn({ name: 'edition_id', type: 'uuid' }) editionId: string
  @PrimaryColumn({ type: 'varchar', length: 40, collation: 'utf8mb4_bin' }) code: string
  @Column({ type: 'enum', enum: ['material', 'labour', 'plant'] }) kind: ResourceKind
  @Column({ type: 'varchar', length: 200 }) description: string
  @Column({ type: 'varchar', length: 10 }) unit: string
  @Column({ type: 'decimal', precision: 15, scale: 6 }) low: string
  @Column({ type: 'decimal', precision: 15, scale: 6 }) likely: string
  @Column({ type: 'decimal', precision: 15, scale: 6 }) high: string
  @Column({ type: 'varchar', length: 400 }) source: string
  @Column({ name: 'source_date', type: 'date', nullable: true }) sourceDate: string | null
  /** The quotation that its likely price is taken from. */
  @Column({ name: 'quotation_id', type: 'uuid', nullable: true }) quotationId: string | null
  @Column({ type: 'int', unsigned: true, default: 1 }) version: number
}
