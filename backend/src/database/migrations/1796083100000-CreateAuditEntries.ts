import type { MigrationInterface, QueryRunner } from 'typeorm';

export class CreateAuditEntries1796083100000 implements MigrationInterface {
  name = 'CreateAuditEntries1796083100000';

  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`CREATE TABLE IF NOT EXISTS audit_entries (
      id INT UNSIGNED NOT NULL AUTO_INCREMENT,
      team_id INT UNSIGNED NOT NULL,
      user_id INT UNSIGNED NULL,
      at DATETIME(3) NOT NULL,
      action VARCHAR(60) NOT NULL,
      object_kind VARCHAR(40) NOT NULL,
      object_id VARCHAR(40) NOT NULL,
      from_value JSON NULL,
      to_value JSON NULL,
      INDEX audit_entries_at (team_id, at),
      INDEX audit_entries_object (team_id, object_kind, object_id),
      PRIMARY KEY (id),
      CONSTRAINT audit_entries_team FOREIGN KEY (team_id) REFERENCES teams (id) ON DELETE CASCADE ON UPDATE NO ACTION,
      CONSTRAINT audit_entries_user FOREIGN KEY (user_id) REFERENCES users (id) ON DELETE SET NULL ON UPDATE NO ACTION
    ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci`);
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('DROP TABLE audit_entries');
  }
}
