import type { MigrationInterface, QueryRunner } from 'typeorm'

export class CreateAudit1796100000004 implements MigrationInterface {
  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`
      CREATE TABLE IF NOT EXISTS audit (
        id uuid NOT NULL,
        at datetime(6) NOT NULL,
        firm_id uuid NULL,
        person_id uuid NULL,
        event varchar(60) NOT NULL,
        detail json NOT NULL,
        PRIMARY KEY (id),
        INDEX ix_audit_firm (firm_id, at)
      ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_520_ci
    `)
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('DROP TABLE IF EXISTS audit')
  }
}
