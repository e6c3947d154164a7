import type { ItemCode } from '#shared/contracts/appraisal'
import type { BuildUp } from '#shared/contracts/buildUp'
import { Column, Entity, ForeignKey, PrimaryColumn } from 'typeorm'

/** One price of an edition. A trigger refuses any change once the edition is published. Decimals come as padded strings. */
@Entity('rate')
@ForeignKey('EditionEntity', ['firmId', 'editionId'], ['firmId', 'id'], { name: 'fk_rate_edition' })
export class RateEntity {
  @PrimaryColumn({ name: 'firm_id', type: 'uuid' }) firmId: string
  @PrimaryColumn({ name: 'edition_id', type: 'uuid' }) editionId: string
  @PrimaryColumn({ type: 'varchar', length: 40, collation: 'utf8mb4_bin' }) item: ItemCode
  @Column({ type: 'varchar', length: 200 }) description: string
  @Column({ type: 'varchar', length: 10 }) unit: string
  @Column({ type: 'decimal', precision: 15, scale: 6 }) low: string
  @Column({ type: 'decimal', precision: 15, scale: 6 }) likely: string
  @Column({ type: 'decimal', precision: 15, scale: 6 }) high: string
  @Column({ type: 'varchar', length: 400 }) source: string
  @Column({ name: 'source_date', type: 'date', nullable: true }) sourceDate: string | null
  /** Null: a plain price. */
  @Column({ name: 'build_up', type: 'json', nullable: true }) buildUp: BuildUp | null
  @Column({ type: 'int', unsigned: true, default: 1 }) version: number
}
