import type { Brief, Markups } from '#shared/contracts/appraisal'
import type { Factors } from '#shared/contracts/factors'
import type { ProjectInput, ProjectSummary, UseCategory } from '#shared/contracts/project'
import type { ScopeDeclaration } from '#shared/contracts/sameScope'
import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm'

@Entity('project')
@ForeignKey('FirmEntity', ['firmId'], ['id'], { name: 'fk_project_firm' })
@ForeignKey('EditionEntity', ['firmId', 'editionId'], ['firmId', 'id'], { name: 'fk_project_edition' })
@ForeignKey('PersonEntity', ['firmId', 'updatedBy'], ['firmId', 'id'], { name: 'fk_project_updated_by' })
@Index('uq_project_reference', ['firmId', 'reference'], { unique: true })
export class ProjectEntity {
  @PrimaryColumn({ name: 'firm_id', type: 'uuid' }) firmId: string
  @PrimaryColumn({ type: 'uuid' }) id: string
  @Column({ type: 'varchar', length: 120 }) name: string
  @Column({ type: 'varchar', length: 40 }) reference: string
  @Column({ type: 'varchar', length: 120 }) place: string
  @Column({ type: 'enum', enum: ['A', 'B', 'C1', 'C2', 'C3', 'C4', 'C5', 'D1', 'D2', 'E1'] }) use: UseCategory
  @Column({ type: 'json' }) brief: Brief
  @Column({ name: 'edition_id', type: 'uuid', nullable: true }) editionId: string | null
  @Column({ type: 'json' }) markups: Markups
  @Column({ type: 'varchar', length: 40, default: 'comparing' }) measurement: ProjectInput['measurement']
  /** Null: stored before a project had declarations, so that it has none. */
  @Column({ type: 'json', nullable: true }) scope: ScopeDeclaration[] | null
  /** Null: stored before a project had factors of its own, so that the proposed ones hold. */
  @Column({ type: 'json', nullable: true }) factors: Factors | null
  /** Counts every change of the project, its levels and its schemes. */
  @Column({ name: 'content_version', type: 'int', unsigned: true, default: 1 }) contentVersion: number
  /** Totals as appraised at content `totalsVersion`; while that differs from `contentVersion`, they are out of date. */
  @Column({ type: 'json' }) totals: ProjectSummary['totals']
  @Column({ name: 'totals_version', type: 'int', unsigned: true, default: 0 }) totalsVersion: number
  /** Version of the list of readers. */
  @Column({ name: 'readers_version', type: 'int', unsigned: true, default: 1 }) readersVersion: number
  @Column({ type: 'int', unsigned: true, default: 1 }) version: number
  @Column({ name: 'created_at', type: 'datetime', precision: 6 }) createdAt: Date
  @Column({ name: 'updated_at', type: 'datetime', precision: 6 }) updatedAt: Date
  @Column({ name: 'updated_by', type: 'uuid' }) updatedBy: string
}
