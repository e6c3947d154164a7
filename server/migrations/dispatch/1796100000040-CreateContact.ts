import type { MigrationInterface, QueryRunner } from 'typeorm'

export class CreateContact1796100000040 implements MigrationInterface {
  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`
      CREATE TABLE IF NOT EXISTS contact (
        firm_id uuid NOT NULL,
        id uuid NOT NULL,
        project_id uuid NOT NULL,
        name varchar(120) NOT NULL,
        email varchar(254) NOT NULL,
        created_at datetime(6) NOT NULL,
        PRIMARY KEY (firm_id, id),
        UNIQUE INDEX uq_contact_email (firm_id, project_id, email),
        CONSTRAINT fk_contact_project FOREIGN KEY (firm_id, project_id) REFERENCES project (firm_id, id) ON DELETE CASCADE ON UPDATE NO ACTION
      ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_520_ci
    `)
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('DROP TABLE IF EXISTS contact')
  }
}
