import type { MigrationInterface, QueryRunner } from 'typeorm'

export class CreateFirm1796100000001 implements MigrationInterface {
  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`
      CREATE TABLE IF NOT EXISTS firm (
        id uuid NOT NULL,
        name varchar(120) NOT NULL,
        is_demo tinyint NOT NULL DEFAULT 0,
        created_at datetime(6) NOT NULL,
        PRIMARY KEY (id)
      ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_520_ci
    `)
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('DROP TABLE IF EXISTS firm')
  }
}
