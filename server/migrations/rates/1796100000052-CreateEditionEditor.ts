import type { MigrationInterface, QueryRunner } from 'typeorm'

export class CreateEditionEditor1796100000052 implements MigrationInterface {
  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`
      CREATE TABLE IF NOT EXISTS edition_editor (
        firm_id uuid NOT NULL,
        edition_id uuid NOT NULL,
        person_id uuid NOT NULL,
        PRIMARY KEY (firm_id, edition_id, person_id),
        CONSTRAINT fk_edition_editor_edition FOREIGN KEY (firm_id, edition_id) REFERENCES edition (firm_id, id) ON DELETE CASCADE ON UPDATE NO ACTION,
        CONSTRAINT fk_edition_editor_person FOREIGN KEY (firm_id, person_id) REFERENCES person (firm_id, id) ON DELETE NO ACTION ON UPDATE NO ACTION
      ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_520_ci
    `)
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('DROP TABLE IF EXISTS edition_editor')
  }
}
