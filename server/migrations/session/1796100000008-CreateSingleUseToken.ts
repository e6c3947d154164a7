import type { MigrationInterface, QueryRunner } from 'typeorm'

export class CreateSingleUseToken1796100000008 implements MigrationInterface {
  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`
      CREATE TABLE IF NOT EXISTS single_use_token (
        token_hash char(64) NOT NULL,
        firm_id uuid NOT NULL,
        person_id uuid NOT NULL,
        kind enum ('invitation', 'passwordReset') NOT NULL,
        created_at datetime(6) NOT NULL,
        expires_at datetime(6) NOT NULL,
        used_at datetime(6) NULL,
        PRIMARY KEY (token_hash),
        CONSTRAINT fk_single_use_token_person FOREIGN KEY (firm_id, person_id) REFERENCES person (firm_id, id) ON DELETE CASCADE ON UPDATE NO ACTION
      ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_520_ci
    `)
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('DROP TABLE IF EXISTS single_use_token')
  }
}
