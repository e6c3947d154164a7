import type { MigrationInterface, QueryRunner } from 'typeorm'

export class CreateRateImportRow1796100000076 implements MigrationInterface {
  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`
      CREATE TABLE IF NOT EXISTS rate_import_row (
        firm_id uuid NOT NULL,
        import_id uuid NOT NULL,
        \`row_number\` int UNSIGNED NOT NULL,
        state enum ('new', 'changed', 'unchanged', 'refused') NOT NULL,
        code varchar(200) NOT NULL,
        \`before\` json NULL,
        after json NULL,
        reason varchar(500) NULL,
        note varchar(200) NULL,
        quotation_id uuid NULL,
        seen_version int UNSIGNED NULL,
        PRIMARY KEY (firm_id, import_id, \`row_number\`),
        CONSTRAINT fk_rate_import_row_import FOREIGN KEY (firm_id, import_id) REFERENCES rate_import (firm_id, id) ON DELETE CASCADE ON UPDATE NO ACTION
      ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_520_ci
    `)
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('DROP TABLE IF EXISTS rate_import_row')
  }
}
