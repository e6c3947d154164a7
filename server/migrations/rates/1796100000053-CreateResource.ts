import type { MigrationInterface, QueryRunner } from 'typeorm'

export class CreateResource1796100000053 implements MigrationInterface {
  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`
      CREATE TABLE IF NOT EXISTS resource (
        firm_id uuid NOT NULL,
        edition_id uuid NOT NULL,
        code varchar(40) COLLATE utf8mb4_bin NOT NULL,
        kind enum ('material', 'labour', 'plant') NOT NULL,
        description varchar(200) NOT NULL,
        unit varchar(10) NOT NULL,
        low decimal(15,6) NOT NULL,
        likely decimal(15,6) NOT NULL,
        high decimal(15,6) NOT NULL,
        source varchar(400) NOT NULL,
        source_date date NULL,
        quotation_id uuid NULL,
        version int UNSIGNED NOT NULL DEFAULT 1,
        PRIMARY KEY (firm_id, edition_id, code),
        CONSTRAINT fk_resource_edition FOREIGN KEY (firm_id, edition_id) REFERENCES edition (firm_id, id) ON DELETE NO ACTION ON UPDATE NO ACTION
      ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_520_ci
    `)
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('DROP TABLE IF EXISTS resource')
  }
}
