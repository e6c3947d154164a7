import type { MigrationInterface, QueryRunner } from 'typeorm'

export class AddEditionStateReason1796100000056 implements MigrationInterface {
  async up(runner: QueryRunner): Promise<void> {
    await runner.query(
      "ALTER TABLE edition ADD COLUMN IF NOT EXISTS state_reason varchar(400) NOT NULL DEFAULT '' AFTER corrects",
    )
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('ALTER TABLE edition DROP COLUMN IF EXISTS state_reason')
  }
}
