import type { MigrationInterface, QueryRunner } from 'typeorm'

export class CreateDispatch1796100000041 implements MigrationInterface {
  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`
      CREATE TABLE IF NOT EXISTS dispatch (
        firm_id uuid NOT NULL,
        id uuid NOT NULL,
        project_id uuid NOT NULL,
        project_name varchar(120) NOT NULL,
        contact_id uuid NOT NULL,
        contact_name varchar(120) NOT NULL,
        contact_email varchar(254) NOT NULL,
        ribbed_mark varchar(20) COLLATE utf8mb4_bin NOT NULL,
        solid_mark varchar(20) COLLATE utf8mb4_bin NOT NULL,
        note text NOT NULL,
        state enum ('queued', 'sent', 'refused', 'failed') NOT NULL,
        tries int UNSIGNED NOT NULL DEFAULT 0,
        last_answer varchar(500) NULL,
        message_id varchar(120) NOT NULL,
        sent_by uuid NOT NULL,
        created_at datetime(6) NOT NULL,
        sent_at datetime(6) NULL,
        frozen json NOT NULL,
        pdf mediumblob NULL,
        version int UNSIGNED NOT NULL DEFAULT 1,
        PRIMARY KEY (firm_id, id),
        INDEX ix_dispatch_project (firm_id, project_id, created_at),
        INDEX ix_dispatch_recipient (firm_id, contact_email, created_at),
        CONSTRAINT fk_dispatch_sent_by FOREIGN KEY (firm_id, sent_by) REFERENCES person (firm_id, id) ON DELETE NO ACTION ON UPDATE NO ACTION,
        CONSTRAINT fk_dispatch_project FOREIGN KEY (firm_id, project_id) REFERENCES project (firm_id, id) ON DELETE CASCADE ON UPDATE NO ACTION
      ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_520_ci
    `)
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('DROP TABLE IF EXISTS dispatch')
  }
}
