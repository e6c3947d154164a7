import type { MigrationInterface, QueryRunner } from 'typeorm'

export class CreateRateImport1796100000075 implements MigrationInterface {
  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`
      CREATE TABLE IF NOT EXISTS rate_import (
        firm_id uuid NOT NULL,
        id uuid NOT NULL,
        edition_id uuid NOT NULL,
        file_name varchar(200) NOT NULL,
        state enum ('reading', 'matching', 'checking', 'previewed', 'committing', 'committed', 'undone', 'failed') NOT NULL,
        progress double NOT NULL DEFAULT 0,
        failure varchar(500) NULL,
        sheets json NOT NULL,
        matching json NULL,
        counts json NULL,
        moves json NULL,
        person_id uuid NOT NULL,
        created_at datetime(6) NOT NULL,
        touched_at datetime(6) NOT NULL,
        PRIMARY KEY (firm_id, id),
        CONSTRAINT fk_rate_import_edition FOREIGN KEY (firm_id, edition_id) REFERENCES edition (firm_id, id) ON DELETE CASCADE ON UPDATE NO ACTION,
        CONSTRAINT fk_rate_import_person FOREIGN KEY (firm_id, person_id) REFERENCES person (firm_id, id) ON DELETE NO ACTION ON UPDATE NO ACTION
      ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_520_ci
    `)
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('DROP TABLE IF EXISTS rate_import')
  }
}
