import { Entity, ForeignKey, PrimaryColumn } from 'typeorm'

/** Somebody who compiled an edition or changed a price in it, and so may not check it. */
@Entity('edition_editor')
@ForeignKey('EditionEntity', ['firmId', 'editionId'], ['firmId', 'id'], {
  name: 'fk_edition_editor_edition',
  onDelete: 'CASCADE',
})
@ForeignKey('PersonEntity', ['firmId', 'personId'], ['firmId', 'id'], { name: 'fk_edition_editor_person' })
export class EditionEditorEntity {
  @PrimaryColumn({ name: 'firm_id', type: 'uuid' }) firmId: string
  @PrimaryColumn({ name: 'edition_id', type: 'uuid' }) editionId: string
  @PrimaryColumn({ name: 'person_id', type: 'uuid' }) personId: string
}
