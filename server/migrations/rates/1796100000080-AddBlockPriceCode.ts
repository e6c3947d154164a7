import type { MigrationInterface, QueryRunner } from 'typeorm'

export class AddBlockPriceCode1796100000080 implements MigrationInterface {
  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`
      ALTER TABLE block
        ADD COLUMN IF NOT EXISTS price_code varchar(40) COLLATE utf8mb4_bin NULL AFTER breakage_percent,
        ADD COLUMN IF NOT EXISTS version int UNSIGNED NOT NULL DEFAULT 1 AFTER price_code
    `)
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('ALTER TABLE block DROP COLUMN IF EXISTS price_code, DROP COLUMN IF EXISTS version')
  }
}
