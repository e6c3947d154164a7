import type { MigrationInterface, QueryRunner } from 'typeorm'

export class CreateGang1796100000054 implements MigrationInterface {
  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`
      CREATE TABLE IF NOT EXISTS gang (
        firm_id uuid NOT NULL,
        edition_id uuid NOT NULL,
        code varchar(40) COLLATE utf8mb4_bin NOT NULL,
        description varchar(200) NOT NULL,
        members json NOT NULL,
        version int UNSIGNED NOT NULL DEFAULT 1,
        PRIMARY KEY (firm_id, edition_id, code),
        CONSTRAINT fk_gang_edition FOREIGN KEY (firm_id, edition_id) REFERENCES edition (firm_id, id) ON DELETE NO ACTION ON UPDATE NO ACTION
      ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_520_ci
    `)
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('DROP TABLE IF EXISTS gang')
  }
}
