import type { MigrationInterface, QueryRunner } from 'typeorm'

export class KeepRateUpdate1796100000021 implements MigrationInterface {
  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`
      CREATE TRIGGER IF NOT EXISTS keep_rate_update BEFORE UPDATE ON rate FOR EACH ROW
      IF (SELECT state FROM edition WHERE firm_id = OLD.firm_id AND id = OLD.edition_id) <> 'draft' THEN
        SIGNAL SQLSTATE '45000' SET MESSAGE_TEXT = 'rates change in a draft only';
      END IF
    `)
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('DROP TRIGGER IF EXISTS keep_rate_update')
  }
}
