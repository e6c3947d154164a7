import { Column, Entity, ForeignKey, PrimaryColumn } from 'typeorm'

/** What an import wrote into the draft, so that it can be undone. */
@Entity('rate_import_write')
@ForeignKey('RateImportEntity', ['firmId', 'importId'], ['firmId', 'id'], {
  name: 'fk_rate_import_write_import',
  onDelete: 'CASCADE',
})
export class RateImportWriteEntity {
  @PrimaryColumn({ name: 'firm_id', type: 'uuid' }) firmId: string
  @PrimaryColumn({ name: 'import_id', type: 'uuid' }) importId: string
  @PrimaryColumn({ type: 'enum', enum: ['resource', 'quotation', 'rate'] }) kind: 'resource' | 'quotation' | 'rate'
  /** Code of the resource or the rate, id of the quotation. */
  @PrimaryColumn({ type: 'varchar', length: 40, collation: 'utf8mb4_bin' }) target: string
  /** The row as it stood, by its columns; null: it was not there. */
  @Column({ type: 'json', nullable: true }) before: Record<string, unknown> | null
  /** Version that the import left it with. */
  @Column({ type: 'int', unsigned: true }) version: number
}
