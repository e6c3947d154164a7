import type { MigrationInterface, QueryRunner } from 'typeorm'

export class CreateBlock1796100000013 implements MigrationInterface {
  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`
      CREATE TABLE IF NOT EXISTS block (
        firm_id uuid NOT NULL,
        id uuid NOT NULL,
        code varchar(40) COLLATE utf8mb4_bin NOT NULL,
        name varchar(120) NOT NULL,
        material enum ('fired clay', 'concrete', 'lightweight concrete') NOT NULL,
        length double NOT NULL,
        width double NOT NULL,
        height double NOT NULL,
        mass double NOT NULL,
        supplier varchar(120) NOT NULL,
        pallet_count int UNSIGNED NULL,
        breakage_percent decimal(7,4) NOT NULL,
        PRIMARY KEY (firm_id, id),
        UNIQUE INDEX uq_block_code (firm_id, code),
        CONSTRAINT fk_block_firm FOREIGN KEY (firm_id) REFERENCES firm (id) ON DELETE NO ACTION ON UPDATE NO ACTION
      ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_520_ci
    `)
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('DROP TABLE IF EXISTS block')
  }
}
