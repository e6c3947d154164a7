import type { MigrationInterface, QueryRunner } from 'typeorm'

export class CreateIdempotency1796100000005 implements MigrationInterface {
  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`
      CREATE TABLE IF NOT EXISTS idempotency (
        firm_id uuid NOT NULL,
        person_id uuid NOT NULL,
        key_hash char(64) NOT NULL,
        request_hash char(64) NOT NULL,
        answer json NOT NULL,
        created_at datetime(6) NOT NULL,
        PRIMARY KEY (firm_id, person_id, key_hash),
        CONSTRAINT fk_idempotency_person FOREIGN KEY (firm_id, person_id) REFERENCES person (firm_id, id) ON DELETE CASCADE ON UPDATE NO ACTION
      ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_520_ci
    `)
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('DROP TABLE IF EXISTS idempotency')
  }
}
