import type { MigrationInterface, QueryRunner } from 'typeorm'

export class CreateScheme1796100000016 implements MigrationInterface {
  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`
      CREATE TABLE IF NOT EXISTS scheme (
        firm_id uuid NOT NULL,
        id uuid NOT NULL,
        project_id uuid NOT NULL,
        position int UNSIGNED NOT NULL,
        mark varchar(20) COLLATE utf8mb4_bin NOT NULL,
        name varchar(120) NOT NULL,
        block_id uuid NULL,
        specification json NOT NULL,
        version int UNSIGNED NOT NULL DEFAULT 1,
        PRIMARY KEY (firm_id, id),
        UNIQUE INDEX uq_scheme_mark (firm_id, project_id, mark),
        CONSTRAINT fk_scheme_block FOREIGN KEY (firm_id, block_id) REFERENCES block (firm_id, id) ON DELETE NO ACTION ON UPDATE NO ACTION,
        CONSTRAINT fk_scheme_project FOREIGN KEY (firm_id, project_id) REFERENCES project (firm_id, id) ON DELETE CASCADE ON UPDATE NO ACTION
      ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_520_ci
    `)
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('DROP TABLE IF EXISTS scheme')
  }
}
