import type { MigrationInterface, QueryRunner } from 'typeorm'

export class CreatePersonRole1796100000003 implements MigrationInterface {
  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`
      CREATE TABLE IF NOT EXISTS person_role (
        firm_id uuid NOT NULL,
        person_id uuid NOT NULL,
        role enum ('surveyor', 'estimator', 'developer', 'client', 'engineer', 'admin') NOT NULL,
        PRIMARY KEY (firm_id, person_id, role),
        CONSTRAINT fk_person_role_person FOREIGN KEY (firm_id, person_id) REFERENCES person (firm_id, id) ON DELETE CASCADE ON UPDATE NO ACTION
      ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_520_ci
    `)
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('DROP TABLE IF EXISTS person_role')
  }
}
