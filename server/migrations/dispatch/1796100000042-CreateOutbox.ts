import type { MigrationInterface, QueryRunner } from 'typeorm'

export class CreateOutbox1796100000042 implements MigrationInterface {
  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`
      CREATE TABLE IF NOT EXISTS outbox (
        firm_id uuid NOT NULL,
        id uuid NOT NULL,
        dispatch_id uuid NULL,
        message_id varchar(120) NOT NULL,
        to_name varchar(120) NOT NULL,
        to_email varchar(254) NOT NULL,
        subject varchar(300) NOT NULL,
        text mediumtext NOT NULL,
        html mediumtext NOT NULL,
        state enum ('queued', 'sent', 'refused', 'failed') NOT NULL,
        tries int UNSIGNED NOT NULL DEFAULT 0,
        due_at datetime(6) NOT NULL,
        claim uuid NULL,
        last_answer varchar(500) NULL,
        created_at datetime(6) NOT NULL,
        sent_at datetime(6) NULL,
        PRIMARY KEY (firm_id, id),
        INDEX ix_outbox_due (state, due_at),
        INDEX ix_outbox_day (firm_id, created_at),
        CONSTRAINT fk_outbox_dispatch FOREIGN KEY (firm_id, dispatch_id) REFERENCES dispatch (firm_id, id) ON DELETE CASCADE ON UPDATE NO ACTION,
        CONSTRAINT fk_outbox_firm FOREIGN KEY (firm_id) REFERENCES firm (id) ON DELETE NO ACTION ON UPDATE NO ACTION
      ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_520_ci
    `)
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('DROP TABLE IF EXISTS outbox')
  }
}
