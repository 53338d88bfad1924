import type { MigrationInterface, QueryRunner } from 'typeorm';

export class CreateStandingChanges1796103000000 implements MigrationInterface {
  name = 'CreateStandingChanges1796103000000';

  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`CREATE TABLE IF NOT EXISTS standing_changes (
      id INT UNSIGNED NOT NULL AUTO_INCREMENT PRIMARY KEY,
      team_id INT UNSIGNED NOT NULL,
      kind VARCHAR(20) NOT NULL,
      part_count INT UNSIGNED NOT NULL,
      made_at DATETIME(3) NOT NULL,
      made_by INT UNSIGNED NULL,
      INDEX standing_changes_made (team_id, made_at),
      CONSTRAINT standing_changes_team FOREIGN KEY (team_id) REFERENCES teams (id) ON DELETE CASCADE ON UPDATE NO ACTION,
      CONSTRAINT standing_changes_made_by FOREIGN KEY (made_by) REFERENCES users (id) ON DELETE SET NULL ON UPDATE NO ACTION
    ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci`);
    await runner.query(`CREATE TABLE IF NOT EXISTS standings_before (
      change_id INT UNSIGNED NOT NULL,
      part_id INT UNSIGNED NOT NULL,
      version INT UNSIGNED NOT NULL,
      lifecycle VARCHAR(20) NOT NULL,
      approval VARCHAR(20) NOT NULL,
      PRIMARY KEY (change_id, part_id),
      CONSTRAINT standings_before_change FOREIGN KEY (change_id) REFERENCES standing_changes (id) ON DELETE CASCADE ON UPDATE NO ACTION,
      CONSTRAINT standings_before_part FOREIGN KEY (part_id) REFERENCES parts (id) ON DELETE CASCADE ON UPDATE NO ACTION
    ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci`);
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('DROP TABLE standings_before');
    await runner.query('DROP TABLE standing_changes');
  }
}
