import type { MigrationInterface, QueryRunner } from 'typeorm'

export class CreateLevel1796100000015 implements MigrationInterface {
  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`
      CREATE TABLE IF NOT EXISTS level (
        firm_id uuid NOT NULL,
        id uuid NOT NULL,
        project_id uuid NOT NULL,
        position int UNSIGNED NOT NULL,
        mark varchar(20) COLLATE utf8mb4_bin NOT NULL,
        name varchar(120) NOT NULL,
        repeat_count int UNSIGNED NOT NULL,
        panels json NOT NULL,
        version int UNSIGNED NOT NULL DEFAULT 1,
        PRIMARY KEY (firm_id, id),
        UNIQUE INDEX uq_level_mark (firm_id, project_id, mark),
        CONSTRAINT fk_level_project FOREIGN KEY (firm_id, project_id) REFERENCES project (firm_id, id) ON DELETE CASCADE ON UPDATE NO ACTION
      ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_520_ci
    `)
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('DROP TABLE IF EXISTS level')
  }
}
