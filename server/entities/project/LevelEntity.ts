import type { Panel } from '#shared/contracts/appraisal'
import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm'

/** A floor slab of a project with its panels, which are only ever read and written together. */
@Entity('level')
@ForeignKey('ProjectEntity', ['firmId', 'projectId'], ['firmId', 'id'], { name: 'fk_level_project', onDelete: 'CASCADE' })
@Index('uq_level_mark', ['firmId', 'projectId', 'mark'], { unique: true })
export class LevelEntity {
  @PrimaryColumn({ name: 'firm_id', type: 'uuid' }) firmId: string
  @PrimaryColumn({ type: 'uuid' }) id: string
  @Column({ name: 'project_id', type: 'uuid' }) projectId: string
  @Column({ type: 'int', unsigned: true }) position: number
  @Column({ type: 'varchar', length: 20, collation: 'utf8mb4_bin' }) mark: string
  @Column({ type: 'varchar', length: 120 }) name: string
  @Column({ name: 'repeat_count', type: 'int', unsigned: true }) repeat: number
  @Column({ name: 'propping_height_mm', type: 'int', unsigned: true, default: 2800 }) proppingHeight: number
  @Column({ type: 'json' }) panels: Panel[]
  @Column({ type: 'int', unsigned: true, default: 1 }) version: number
}
