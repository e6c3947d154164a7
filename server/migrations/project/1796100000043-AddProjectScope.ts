import type { MigrationInterface, QueryRunner } from 'typeorm'

export class AddProjectScope1796100000043 implements MigrationInterface {
  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`
      ALTER TABLE project
        ADD COLUMN IF NOT EXISTS measurement varchar(40) NOT NULL DEFAULT 'comparing' AFTER markups,
        ADD COLUMN IF NOT EXISTS scope json NULL AFTER measurement,
        ADD COLUMN IF NOT EXISTS factors json NULL AFTER scope
    `)
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query(`
      ALTER TABLE project
        DROP COLUMN IF EXISTS measurement,
        DROP COLUMN IF EXISTS scope,
        DROP COLUMN IF EXISTS factors
    `)
  }
}
