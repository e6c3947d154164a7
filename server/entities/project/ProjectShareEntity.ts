import { Entity, ForeignKey, PrimaryColumn } from 'typeorm'

/** A developer or an engineer may read this project. */
@Entity('project_share')
@ForeignKey('ProjectEntity', ['firmId', 'projectId'], ['firmId', 'id'], { name: 'fk_project_share_project', onDelete: 'CASCADE' })
@ForeignKey('PersonEntity', ['firmId', 'personId'], ['firmId', 'id'], { name: 'fk_project_share_person', onDelete: 'CASCADE' })
export class ProjectShareEntity {
  @PrimaryColumn({ name: 'firm_id', type: 'uuid' }) firmId: string
  @PrimaryColumn({ name: 'project_id', type: 'uuid' }) projectId: string
  @PrimaryColumn({ name: 'person_id', type: 'uuid' }) personId: string
}
