import type { MigrationInterface, QueryRunner } from 'typeorm'

export class CreateAttempt1796100000009 implements MigrationInterface {
  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`
      CREATE TABLE IF NOT EXISTS attempt (
        subject char(64) NOT NULL,
        window_start datetime(6) NOT NULL,
        count int UNSIGNED NOT NULL,
        PRIMARY KEY (subject)
      ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_520_ci
    `)
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('DROP TABLE IF EXISTS attempt')
  }
}
