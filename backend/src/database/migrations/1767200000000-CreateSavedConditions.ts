import type { MigrationInterface, QueryRunner } from 'typeorm';

export class CreateSavedConditions1767200000000 implements MigrationInterface {
  name = 'CreateSavedConditions1767200000000';

  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`CREATE TABLE IF NOT EXISTS saved_conditions (
      id INT UNSIGNED NOT NULL AUTO_INCREMENT,
      team_id INT UNSIGNED NOT NULL,
      name VARCHAR(120) NOT NULL,
      name_key VARCHAR(360) COLLATE utf8mb4_bin NOT NULL,
      conditions JSON NOT NULL,
      filter JSON NOT NULL,
      target JSON NOT NULL,
      quantity INT UNSIGNED NOT NULL,
      version INT UNSIGNED NOT NULL DEFAULT 1,
      created_at DATETIME(3) NOT NULL,
      created_by INT UNSIGNED NULL,
      updated_at DATETIME(3) NOT NULL,
      updated_by INT UNSIGNED NULL,
      UNIQUE INDEX saved_conditions_name (team_id, name_key),
      PRIMARY KEY (id),
      CONSTRAINT saved_conditions_team FOREIGN KEY (team_id) REFERENCES teams (id) ON DELETE CASCADE ON UPDATE NO ACTION,
      CONSTRAINT saved_conditions_created_by FOREIGN KEY (created_by) REFERENCES users (id) ON DELETE SET NULL ON UPDATE NO ACTION,
      CONSTRAINT saved_conditions_updated_by FOREIGN KEY (updated_by) REFERENCES users (id) ON DELETE SET NULL ON UPDATE NO ACTION
    ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci`);
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('DROP TABLE saved_conditions');
  }
}
