import type { Gang } from '#shared/contracts/resource'
import { Column, Entity, ForeignKey, PrimaryColumn } from 'typeorm'

/** People who work together, costed by the hour. Fixed with its edition. */
@Entity('gang')
@ForeignKey('EditionEntity', ['firmId', 'editionId'], ['firmId', 'id'], { name: 'fk_gang_edition' })
export class GangEntity {
  @PrimaryColumn({ name: 'firm_id', type: 'uuid' }) firmId: string
  @PrimaryColumn({ name: 'edition_id', type: 'uuid' }) editionId: string
  @PrimaryColumn({ type: 'varchar', length: 40, collation: 'utf8mb4_bin' }) code: string
  @Column({ type: 'varchar', length: 200 }) description: string
  @Column({ type: 'json' }) members: Gang['members']
  @Column({ type: 'int', unsigned: true, default: 1 }) version: number
}
