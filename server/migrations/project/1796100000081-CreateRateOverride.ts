import type { MigrationInterface, QueryRunner } from 'typeorm'

export class CreateRateOverride1796100000081 implements MigrationInterface {
  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`
      CREATE TABLE IF NOT EXISTS rate_override (
        firm_id uuid NOT NULL,
        project_id uuid NOT NULL,
        item varchar(40) COLLATE utf8mb4_bin NOT NULL,
        rate decimal(15,6) NOT NULL,
        reason varchar(400) NOT NULL,
        changed_by uuid NOT NULL,
        changed_at datetime(6) NOT NULL,
        version int UNSIGNED NOT NULL DEFAULT 1,
        PRIMARY KEY (firm_id, project_id, item),
        CONSTRAINT fk_rate_override_project FOREIGN KEY (firm_id, project_id) REFERENCES project (firm_id, id) ON DELETE NO ACTION ON UPDATE NO ACTION,
        CONSTRAINT fk_rate_override_changed_by FOREIGN KEY (firm_id, changed_by) REFERENCES person (firm_id, id) ON DELETE NO ACTION ON UPDATE NO ACTION
      ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_520_ci
    `)
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('DROP TABLE IF EXISTS rate_override')
  }
}
