import type { CatalogueBlock } from '#shared/contracts/blockCatalogue'
import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm'

/** A block the firm can buy; millimetres and kilograms. */
@Entity('block')
@ForeignKey('FirmEntity', ['firmId'], ['id'], { name: 'fk_block_firm' })
@Index('uq_block_code', ['firmId', 'code'], { unique: true })
export class BlockEntity {
  @PrimaryColumn({ name: 'firm_id', type: 'uuid' }) firmId: string
  @PrimaryColumn({ type: 'uuid' }) id: string
  @Column({ type: 'varchar', length: 40, collation: 'utf8mb4_bin' }) code: string
  @Column({ type: 'varchar', length: 120 }) name: string
  @Column({ type: 'enum', enum: ['fired clay', 'concrete', 'lightweight concrete'] }) material: CatalogueBlock['material']
  @Column({ type: 'double' }) length: number
  @Column({ type: 'double' }) width: number
  @Column({ type: 'double' }) height: number
  @Column({ type: 'double' }) mass: number
  @Column({ type: 'varchar', length: 120 }) supplier: string
  @Column({ name: 'pallet_count', type: 'int', unsigned: true, nullable: true }) palletCount: number | null
  @Column({ name: 'breakage_percent', type: 'decimal', precision: 7, scale: 4 }) breakagePercent: string
  /** Code of the resource that it is priced by, in any edition; null: by the edition's own build-ups. */
  @Column({ name: 'price_code', type: 'varchar', length: 40, nullable: true, collation: 'utf8mb4_bin' }) priceCode: string | null
  @Column({ type: 'int', unsigned: true, default: 1 }) version: number
}
