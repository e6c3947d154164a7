import type { MigrationInterface, QueryRunner } from 'typeorm'

export class CreatePerson1796100000002 implements MigrationInterface {
  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`
      CREATE TABLE IF NOT EXISTS person (
        firm_id uuid NOT NULL,
        id uuid NOT NULL,
        name varchar(120) NOT NULL,
        email varchar(254) NOT NULL,
        password_hash varchar(255) NULL,
        state enum ('invited', 'active', 'off') NOT NULL,
        version int UNSIGNED NOT NULL DEFAULT 1,
        created_at datetime(6) NOT NULL,
        PRIMARY KEY (firm_id, id),
        INDEX ix_person_sign_in (email),
        UNIQUE INDEX uq_person_email (firm_id, email),
        CONSTRAINT fk_person_firm FOREIGN KEY (firm_id) REFERENCES firm (id) ON DELETE NO ACTION ON UPDATE NO ACTION
      ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_520_ci
    `)
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('DROP TABLE IF EXISTS person')
  }
}
