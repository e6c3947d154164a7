import type { MigrationInterface, QueryRunner } from 'typeorm'

export class CreateSession1796100000006 implements MigrationInterface {
  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`
      CREATE TABLE IF NOT EXISTS session (
        id uuid NOT NULL,
        firm_id uuid NOT NULL,
        person_id uuid NOT NULL,
        created_at datetime(6) NOT NULL,
        expires_at datetime(6) NOT NULL,
        revoked_at datetime(6) NULL,
        PRIMARY KEY (id),
        CONSTRAINT fk_session_person FOREIGN KEY (firm_id, person_id) REFERENCES person (firm_id, id) ON DELETE CASCADE ON UPDATE NO ACTION
      ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_520_ci
    `)
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('DROP TABLE IF EXISTS session')
  }
}
