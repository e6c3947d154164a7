import type { MigrationInterface, QueryRunner } from 'typeorm'

/** In the place of the trigger before: the columns that came later are kept too, and what is withdrawn stays so. */
export class KeepEditionFacts1796100000057 implements MigrationInterface {
  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`
      CREATE OR REPLACE TRIGGER keep_published_edition BEFORE UPDATE ON edition FOR EACH ROW
      IF OLD.state IN ('published', 'superseded', 'withdrawn') AND NOT (
        NEW.firm_id = OLD.firm_id AND NEW.id = OLD.id AND NEW.book_id = OLD.book_id AND NEW.number = OLD.number
        AND (NEW.state = OLD.state OR NEW.state = 'withdrawn' OR (NEW.state = 'superseded' AND OLD.state = 'published'))
        AND NEW.base_date = OLD.base_date AND NEW.valid_until <=> OLD.valid_until AND NEW.compiled_by = OLD.compiled_by
        AND NEW.checked_by <=> OLD.checked_by AND NEW.tax_basis = OLD.tax_basis AND NEW.note = OLD.note
        AND NEW.holds_overheads = OLD.holds_overheads AND NEW.reason = OLD.reason AND NEW.corrects <=> OLD.corrects
        AND (NEW.state_reason = OLD.state_reason OR (NEW.state = 'withdrawn' AND OLD.state <> 'withdrawn'))
      ) THEN
        SIGNAL SQLSTATE '45000' SET MESSAGE_TEXT = 'a published edition is never edited';
      END IF
    `)
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('DROP TRIGGER IF EXISTS keep_published_edition')
  }
}
