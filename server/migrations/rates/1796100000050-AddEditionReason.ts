import type { MigrationInterface, QueryRunner } from 'typeorm'

export class AddEditionReason1796100000050 implements MigrationInterface {
  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`
      ALTER TABLE edition
        ADD COLUMN IF NOT EXISTS holds_overheads tinyint NOT NULL DEFAULT 1 AFTER note,
        ADD COLUMN IF NOT EXISTS reason varchar(400) NOT NULL DEFAULT '' AFTER holds_overheads,
        ADD COLUMN IF NOT EXISTS corrects int UNSIGNED NULL AFTER reason
    `)
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query(`
      ALTER TABLE edition
        DROP COLUMN IF EXISTS holds_overheads,
        DROP COLUMN IF EXISTS reason,
        DROP COLUMN IF EXISTS corrects
    `)
  }
}
