import type { MigrationInterface, QueryRunner } from 'typeorm'

export class CreateRefreshToken1796100000007 implements MigrationInterface {
  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`
      CREATE TABLE IF NOT EXISTS refresh_token (
        token_hash char(64) NOT NULL,
        session_id uuid NOT NULL,
        created_at datetime(6) NOT NULL,
        used_at datetime(6) NULL,
        PRIMARY KEY (token_hash),
        CONSTRAINT fk_refresh_token_session FOREIGN KEY (session_id) REFERENCES session (id) ON DELETE CASCADE ON UPDATE NO ACTION
      ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_520_ci
    `)
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('DROP TABLE IF EXISTS refresh_token')
  }
}
