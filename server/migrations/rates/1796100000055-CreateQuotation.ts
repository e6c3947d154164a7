import type { MigrationInterface, QueryRunner } from 'typeorm'

export class CreateQuotation1796100000055 implements MigrationInterface {
  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`
      CREATE TABLE IF NOT EXISTS quotation (
        firm_id uuid NOT NULL,
        id uuid NOT NULL,
        edition_id uuid NOT NULL,
        resource varchar(40) COLLATE utf8mb4_bin NOT NULL,
        supplier varchar(120) NOT NULL,
        price decimal(15,6) NOT NULL,
        contains decimal(15,6) NOT NULL,
        reference varchar(120) NOT NULL,
        day date NOT NULL,
        valid_until date NULL,
        version int UNSIGNED NOT NULL DEFAULT 1,
        PRIMARY KEY (firm_id, id),
        CONSTRAINT fk_quotation_resource FOREIGN KEY (firm_id, edition_id, resource) REFERENCES resource (firm_id, edition_id, code) ON DELETE NO ACTION ON UPDATE NO ACTION
      ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_520_ci
    `)
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('DROP TABLE IF EXISTS quotation')
  }
}
