import type { ImportCounts, ImportedSheet, ImportMatching, ImportState } from '#shared/contracts/rateImport'
import type { RateMove } from '#shared/contracts/resource'
import { Column, Entity, ForeignKey, PrimaryColumn } from 'typeorm'

/** An uploaded price list on its way into a draft. Its rows as they were read lie in the data folder until it is put in. */
@Entity('rate_import')
@ForeignKey('EditionEntity', ['firmId', 'editionId'], ['firmId', 'id'], { name: 'fk_rate_import_edition', onDelete: 'CASCADE' })
@ForeignKey('PersonEntity', ['firmId', 'personId'], ['firmId', 'id'], { name: 'fk_rate_import_person' })
export class RateImportEntity {
  @PrimaryColumn({ name: 'firm_id', type: 'uuid' }) firmId: string
  @PrimaryColumn({ type: 'uuid' }) id: string
  @Column({ name: 'edition_id', type: 'uuid' }) editionId: string
  @Column({ name: 'file_name', type: 'varchar', length: 200 }) fileName: string
  @Column({
    type: 'enum',
    enum: ['reading', 'matching', 'checking', 'previewed', 'committing', 'committed', 'undone', 'failed'],
  })
  state: ImportState
  @Column({ type: 'double', default: 0 }) progress: number
  @Column({ type: 'varchar', length: 500, nullable: true }) failure: string | null
  @Column({ type: 'json' }) sheets: ImportedSheet[]
  @Column({ type: 'json', nullable: true }) matching: ImportMatching | null
  @Column({ type: 'json', nullable: true }) counts: ImportCounts | null
  @Column({ type: 'json', nullable: true }) moves: RateMove[] | null
  @Column({ name: 'person_id', type: 'uuid' }) personId: string
  @Column({ name: 'created_at', type: 'datetime', precision: 6 }) createdAt: Date
  @Column({ name: 'touched_at', type: 'datetime', precision: 6 }) touchedAt: Date
}
