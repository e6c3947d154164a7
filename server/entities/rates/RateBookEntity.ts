import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm'

/** A region's prices; its dated states are editions. */
@Entity('rate_book')
@ForeignKey('FirmEntity', ['firmId'], ['id'], { name: 'fk_rate_book_firm' })
@Index('uq_rate_book_region', ['firmId', 'region'], { unique: true })
export class RateBookEntity {
  @PrimaryColumn({ name: 'firm_id', type: 'uuid' }) firmId: string
  @PrimaryColumn({ type: 'uuid' }) id: string
  @Column({ type: 'varchar', length: 80 }) region: string
  @Column({ type: 'char', length: 3 }) currency: string
}
