import type { MigrationInterface, QueryRunner } from 'typeorm';

export class CreateKeptPairs1796090500000 implements MigrationInterface {
  name = 'CreateKeptPairs1796090500000';

  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`CREATE TABLE IF NOT EXISTS kept_pairs (
      team_id INT UNSIGNED NOT NULL,
      one_id INT UNSIGNED NOT NULL,
      other_id INT UNSIGNED NOT NULL,
      decided_at DATETIME(3) NOT NULL,
      decided_by INT UNSIGNED NULL,
      PRIMARY KEY (team_id, one_id, other_id),
      CONSTRAINT kept_pairs_team FOREIGN KEY (team_id) REFERENCES teams (id) ON DELETE CASCADE ON UPDATE NO ACTION,
      CONSTRAINT kept_pairs_one FOREIGN KEY (one_id) REFERENCES parts (id) ON DELETE CASCADE ON UPDATE NO ACTION,
      CONSTRAINT kept_pairs_other FOREIGN KEY (other_id) REFERENCES parts (id) ON DELETE CASCADE ON UPDATE NO ACTION,
      CONSTRAINT kept_pairs_decided_by FOREIGN KEY (decided_by) REFERENCES users (id) ON DELETE SET NULL ON UPDATE NO ACTION
    ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci`);
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('DROP TABLE kept_pairs');
  }
}
