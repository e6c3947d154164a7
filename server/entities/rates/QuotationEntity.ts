import { Column, Entity, ForeignKey, PrimaryColumn } from 'typeorm'

/** A supplier's price for a resource of an edition. Fixed with its edition; decimals come as padded strings. */
@Entity('quotation')
@ForeignKey('ResourceEntity', ['firmId', 'editionId', 'resource'], ['firmId', 'editionId', 'code'], {
  name: 'fk_quotation_resource',
})
export class QuotationEntity {
  @PrimaryColumn({ name: 'firm_id', type: 'uuid' }) firmId: string
  @PrimaryColumn({ type: 'uuid' }) id: string
  @Column({ name: 'edition_id', type: 'uuid' }) editionId: string
  @Column({ type: 'varchar', length: 40, collation: 'utf8mb4_bin' }) resource: string
  @Column({ type: 'varchar', length: 120 }) supplier: string
  @Column({ type: 'decimal', precision: 15, scale: 6 }) price: string
  @Column({ type: 'decimal', precision: 15, scale: 6 }) contains: string
  @Column({ type: 'varchar', length: 120 }) reference: string
  @Column({ type: 'date' }) day: string
  @Column({ name: 'valid_until', type: 'date', nullable: true }) validUntil: string | null
  @Column({ type: 'int', unsigned: true, default: 1 }) version: number
}
