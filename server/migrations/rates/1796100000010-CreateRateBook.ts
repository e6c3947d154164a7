import type { MigrationInterface, QueryRunner } from 'typeorm'

export class CreateRateBook1796100000010 implements MigrationInterface {
  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`
      CREATE TABLE IF NOT EXISTS rate_book (
        firm_id uuid NOT NULL,
        id uuid NOT NULL,
        region varchar(80) NOT NULL,
        currency char(3) NOT NULL,
        PRIMARY KEY (firm_id, id),
        UNIQUE INDEX uq_rate_book_region (firm_id, region),
        CONSTRAINT fk_rate_book_firm FOREIGN KEY (firm_id) REFERENCES firm (id) ON DELETE NO ACTION ON UPDATE NO ACTION
      ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_520_ci
    `)
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('DROP TABLE IF EXISTS rate_book')
  }
}
