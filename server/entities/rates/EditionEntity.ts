import type { EditionState } from '#shared/contracts/rateBook'
import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm'

/** A dated state of a rate book. A trigger keeps published ones as they are: they may only be superseded or withdrawn. */
@Entity('edition')
@ForeignKey('RateBookEntity', ['firmId', 'bookId'], ['firmId', 'id'], { name: 'fk_edition_rate_book' })
@Index('uq_edition_number', ['firmId', 'bookId', 'number'], { unique: true })
export class EditionEntity {
  @PrimaryColumn({ name: 'firm_id', type: 'uuid' }) firmId: string
  @PrimaryColumn({ type: 'uuid' }) id: string
  @Column({ name: 'book_id', type: 'uuid' }) bookId: string
  @Column({ type: 'int', unsigned: true }) number: number
  @Column({ type: 'enum', enum: ['draft', 'checked', 'published', 'superseded', 'withdrawn'] }) state: EditionState
  @Column({ name: 'base_date', type: 'date' }) baseDate: string
  @Column({ name: 'valid_until', type: 'date', nullable: true }) validUntil: string | null
  @Column({ name: 'compiled_by', type: 'varchar', length: 120 }) compiledBy: string
  @Column({ name: 'checked_by', type: 'varchar', length: 120, nullable: true }) checkedBy: string | null
  @Column({ name: 'tax_basis', type: 'varchar', length: 200 }) taxBasis: string
  @Column({ type: 'varchar', length: 2000 }) note: string
  @Column({ name: 'holds_overheads', type: 'boolean', default: true }) holdsOverheads: boolean
  /** Why it was made, where it puts an earlier edition right or was rebased. */
  @Column({ type: 'varchar', length: 400, default: '' }) reason: string
  /** Number of the edition that it puts right. */
  @Column({ type: 'int', unsigned: true, nullable: true }) corrects: number | null
  /** Why it was last returned to its compilers, or withdrawn. */
  @Column({ name: 'state_reason', type: 'varchar', length: 400, default: '' }) stateReason: string
  @Column({ type: 'int', unsigned: true, default: 1 }) version: number
}
