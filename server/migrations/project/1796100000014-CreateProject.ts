import type { MigrationInterface, QueryRunner } from 'typeorm'

export class CreateProject1796100000014 implements MigrationInterface {
  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`
      CREATE TABLE IF NOT EXISTS project (
        firm_id uuid NOT NULL,
        id uuid NOT NULL,
        name varchar(120) NOT NULL,
        reference varchar(40) NOT NULL,
        place varchar(120) NOT NULL,
        \`use\` enum ('A', 'B', 'C1', 'C2', 'C3', 'C4', 'C5', 'D1', 'D2', 'E1') NOT NULL,
        brief json NOT NULL,
        edition_id uuid NULL,
        markups json NOT NULL,
        content_version int UNSIGNED NOT NULL DEFAULT 1,
        totals json NOT NULL,
        totals_version int UNSIGNED NOT NULL DEFAULT 0,
        readers_version int UNSIGNED NOT NULL DEFAULT 1,
        version int UNSIGNED NOT NULL DEFAULT 1,
        created_at datetime(6) NOT NULL,
        updated_at datetime(6) NOT NULL,
        updated_by uuid NOT NULL,
        PRIMARY KEY (firm_id, id),
        UNIQUE INDEX uq_project_reference (firm_id, reference),
        CONSTRAINT fk_project_updated_by FOREIGN KEY (firm_id, updated_by) REFERENCES person (firm_id, id) ON DELETE NO ACTION ON UPDATE NO ACTION,
        CONSTRAINT fk_project_edition FOREIGN KEY (firm_id, edition_id) REFERENCES edition (firm_id, id) ON DELETE NO ACTION ON UPDATE NO ACTION,
        CONSTRAINT fk_project_firm FOREIGN KEY (firm_id) REFERENCES firm (id) ON DELETE NO ACTION ON UPDATE NO ACTION
      ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_520_ci
    `)
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('DROP TABLE IF EXISTS project')
  }
}
