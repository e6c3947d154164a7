import type { MigrationInterface, QueryRunner } from 'typeorm'

export class CreateProjectShare1796100000017 implements MigrationInterface {
  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`
      CREATE TABLE IF NOT EXISTS project_share (
        firm_id uuid NOT NULL,
        project_id uuid NOT NULL,
        person_id uuid NOT NULL,
        PRIMARY KEY (firm_id, project_id, person_id),
        CONSTRAINT fk_project_share_person FOREIGN KEY (firm_id, person_id) REFERENCES person (firm_id, id) ON DELETE CASCADE ON UPDATE NO ACTION,
        CONSTRAINT fk_project_share_project FOREIGN KEY (firm_id, project_id) REFERENCES project (firm_id, id) ON DELETE CASCADE ON UPDATE NO ACTION
      ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_520_ci
    `)
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('DROP TABLE IF EXISTS project_share')
  }
}
