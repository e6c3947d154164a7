import type { MigrationInterface, QueryRunner } from 'typeorm'

type Event = 'INSERT' | 'UPDATE' | 'DELETE'

/** Editions that a row leaves or enters by an event, as the trigger names them. */
const TOUCHED = {
  INSERT: 'firm_id = NEW.firm_id AND id = NEW.edition_id',
  UPDATE: 'firm_id IN (OLD.firm_id, NEW.firm_id) AND id IN (OLD.edition_id, NEW.edition_id)',
  DELETE: 'firm_id = OLD.firm_id AND id = OLD.edition_id',
} as const satisfies Record<Event, string>

/** A trigger that refuses an event on rows of editions that are no drafts, whoever tries; a row never moves to another edition. */
export class KeepInDraft implements MigrationInterface {
  constructor(
    private readonly table: string,
    private readonly event: Event,
  ) {}

  private get trigger(): string {
    return `keep_${this.table}_${this.event.toLowerCase()}`
  }

  async up(runner: QueryRunner): Promise<void> {
    const moved = this.event === 'UPDATE' ? 'NEW.firm_id <> OLD.firm_id OR NEW.edition_id <> OLD.edition_id OR ' : ''
    await runner.query(`
      CREATE OR REPLACE TRIGGER ${this.trigger} BEFORE ${this.event} ON ${this.table} FOR EACH ROW
      IF ${moved}EXISTS (SELECT 1 FROM edition WHERE ${TOUCHED[this.event]} AND state <> 'draft') THEN
        SIGNAL SQLSTATE '45000' SET MESSAGE_TEXT = 'prices change in a draft only';
      END IF
    `)
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query(`DROP TRIGGER IF EXISTS ${this.trigger}`)
  }
}
