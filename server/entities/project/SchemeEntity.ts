import type { Scheme } from '#shared/contracts/appraisal'
import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm'

/** One way of building all levels of a project: the specification is the engine's own. */
@Entity('scheme')
@ForeignKey('ProjectEntity', ['firmId', 'projectId'], ['firmId', 'id'], { name: 'fk_scheme_project', onDelete: 'CASCADE' })
@ForeignKey('BlockEntity', ['firmId', 'blockId'], ['firmId', 'id'], { name: 'fk_scheme_block' })
@Index('uq_scheme_mark', ['firmId', 'projectId', 'mark'], { unique: true })
export class SchemeEntity {
  @PrimaryColumn({ name: 'firm_id', type: 'uuid' }) firmId: string
  @PrimaryColumn({ type: 'uuid' }) id: string
  @Column({ name: 'project_id', type: 'uuid' }) projectId: string
  @Column({ type: 'int', unsigned: true }) position: number
  @Column({ type: 'varchar', length: 20, collation: 'utf8mb4_bin' }) mark: string
  @Column({ type: 'varchar', length: 120 }) name: string
  @Column({ name: 'block_id', type: 'uuid', nullable: true }) blockId: string | null
  @Column({ type: 'json' }) specification: Scheme
  @Column({ type: 'int', unsigned: true, default: 1 }) version: number
}
