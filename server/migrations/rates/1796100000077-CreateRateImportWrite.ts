import type { MigrationInterface, QueryRunner } from 'typeorm'

export class CreateRateImportWrite1796100000077 implements MigrationInterface {
  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`
      CREATE TABLE IF NOT EXISTS rate_import_write (
        firm_id uuid NOT NULL,
        import_id uuid NOT NULL,
        kind enum ('resource', 'quotation', 'rate') NOT NULL,
        target varchar(40) COLLATE utf8mb4_bin NOT NULL,
        \`before\` json NULL,
        version int UNSIGNED NOT NULL,
        PRIMARY KEY (firm_id, import_id, kind, target),
        CONSTRAINT fk_rate_import_write_import FOREIGN KEY (firm_id, import_id) REFERENCES rate_import (firm_id, id) ON DELETE CASCADE ON UPDATE NO ACTION
      ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_520_ci
    `)
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('DROP TABLE IF EXISTS rate_import_write')
  }
}
