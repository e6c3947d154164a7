import type { MigrationInterface, QueryRunner } from 'typeorm'

export class AddLevelProppingHeight1796100000045 implements MigrationInterface {
  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`
      ALTER TABLE level
        ADD COLUMN IF NOT EXISTS propping_height_mm int unsigned NOT NULL DEFAULT 2800 AFTER repeat_count
    `)
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('ALTER TABLE level DROP COLUMN IF EXISTS propping_height_mm')
  }
}
