import type { MigrationInterface, QueryRunner } from 'typeorm'

export class KeepPublishedEdition1796100000018 implements MigrationInterface {
  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`
      CREATE TRIGGER IF NOT EXISTS keep_published_edition BEFORE UPDATE ON edition FOR EACH ROW
      IF OLD.state IN ('published', 'superseded', 'withdrawn') AND NOT (
        NEW.firm_id = OLD.firm_id AND NEW.id = OLD.id AND NEW.book_id = OLD.book_id AND NEW.number = OLD.number
        AND NEW.state IN ('published', 'superseded', 'withdrawn') AND NOT (NEW.state = 'published' AND OLD.state <> 'published')
        AND NEW.base_date = OLD.base_date AND NEW.valid_until <=> OLD.valid_until AND NEW.compiled_by = OLD.compiled_by
        AND NEW.checked_by <=> OLD.checked_by AND NEW.tax_basis = OLD.tax_basis AND NEW.note = OLD.note
      ) THEN
        SIGNAL SQLSTATE '45000' SET MESSAGE_TEXT = 'a published edition is never edited';
      END IF
    `)
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('DROP TRIGGER IF EXISTS keep_published_edition')
  }
}
