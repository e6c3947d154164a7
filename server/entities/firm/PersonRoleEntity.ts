import type { Role } from '#shared/contracts/person'
import { Entity, ForeignKey, PrimaryColumn } from 'typeorm'

/** A person holds one or more roles. */
@Entity('person_role')
@ForeignKey('PersonEntity', ['firmId', 'personId'], ['firmId', 'id'], { name: 'fk_person_role_person', onDelete: 'CASCADE' })
export class PersonRoleEntity {
  @PrimaryColumn({ name: 'firm_id', type: 'uuid' }) firmId: string
  @PrimaryColumn({ name: 'person_id', type: 'uuid' }) personId: string
  @PrimaryColumn({ type: 'enum', enum: ['surveyor', 'estimator', 'developer', 'client', 'engineer', 'admin'] }) role: Role
}
