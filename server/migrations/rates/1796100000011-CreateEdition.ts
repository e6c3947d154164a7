import type { MigrationInterface, QueryRunner } from 'typeorm'

export class CreateEdition1796100000011 implements MigrationInterface {
  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`
      CREATE TABLE IF NOT EXISTS edition (
        firm_id uuid NOT NULL,
        id uuid NOT NULL,
        book_id uuid NOT NULL,
        number int UNSIGNED NOT NULL,
        state enum ('draft', 'checked', 'published', 'superseded', 'withdrawn') NOT NULL,
        base_date date NOT NULL,
        valid_until date NULL,
        compiled_by varchar(120) NOT NULL,
        checked_by varchar(120) NULL,
        tax_basis varchar(200) NOT NULL,
        note varchar(2000) NOT NULL,
        version int UNSIGNED NOT NULL DEFAULT 1,
        PRIMARY KEY (firm_id, id),
        UNIQUE INDEX uq_edition_number (firm_id, book_id, number),
        CONSTRAINT fk_edition_rate_book FOREIGN KEY (firm_id, book_id) REFERENCES rate_book (firm_id, id) ON DELETE NO ACTION ON UPDATE NO ACTION
      ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_520_ci
    `)
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('DROP TABLE IF EXISTS edition')
  }
}
