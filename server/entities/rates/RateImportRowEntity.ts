import type { ImportRowState } from '#shared/contracts/rateImport'
import { Column, Entity, ForeignKey, PrimaryColumn } from 'typeorm'

/** A row of an import's preview. */
@Entity('rate_import_row')
@ForeignKey('RateImportEntity', ['firmId', 'importId'], ['firmId', 'id'], {
  name: 'fk_rate_import_row_import',
  onDelete: 'CASCADE',
})
export class RateImportRowEntity {
  @PrimaryColumn({ name: 'firm_id', type: 'uuid' }) firmId: string
  @PrimaryColumn({ name: 'import_id', type: 'uuid' }) importId: string
  /** Counted from 1. */
  @PrimaryColumn({ name: 'row_number', type: 'int', unsigned: true }) row: number
  @Column({ type: 'enum', enum: ['new', 'changed', 'unchanged', 'refused'] }) state: ImportRowState
  @Column({ type: 'varchar', length: 200 }) code: string
  @Column({ type: 'json', nullable: true }) before: Record<string, string> | null
  @Column({ type: 'json', nullable: true }) after: Record<string, string> | null
  @Column({ type: 'varchar', length: 500, nullable: true }) reason: string | null
  @Column({ type: 'varchar', length: 200, nullable: true }) note: string | null
  /** Quotation that the row changes. */
  @Column({ name: 'quotation_id', type: 'uuid', nullable: true }) quotationId: string | null
  /** Version of what the row changes, as the preview saw it; null: it was not there. */
  @Column({ name: 'seen_version', type: 'int', unsigned: true, nullable: true }) seenVersion: number | null
}
