import type { MigrationInterface, QueryRunner } from 'typeorm'

export class KeepEditionRow1796100000019 implements MigrationInterface {
  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`
      CREATE TRIGGER IF NOT EXISTS keep_edition_row BEFORE DELETE ON edition FOR EACH ROW
      IF OLD.state IN ('published', 'superseded', 'withdrawn') THEN
        SIGNAL SQLSTATE '45000' SET MESSAGE_TEXT = 'a published edition is never deleted';
      END IF
    `)
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('DROP TRIGGER IF EXISTS keep_edition_row')
  }
}
