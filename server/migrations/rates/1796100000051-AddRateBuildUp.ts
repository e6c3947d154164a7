import type { MigrationInterface, QueryRunner } from 'typeorm'

export class AddRateBuildUp1796100000051 implements MigrationInterface {
  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`
      ALTER TABLE rate
        ADD COLUMN IF NOT EXISTS source_date date NULL AFTER source,
        ADD COLUMN IF NOT EXISTS build_up json NULL AFTER source_date,
        ADD COLUMN IF NOT EXISTS version int UNSIGNED NOT NULL DEFAULT 1 AFTER build_up
    `)
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query(`
      ALTER TABLE rate
        DROP COLUMN IF EXISTS source_date,
        DROP COLUMN IF EXISTS build_up,
        DROP COLUMN IF EXISTS version
    `)
  }
}
