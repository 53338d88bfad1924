import type { MigrationInterface, QueryRunner } from 'typeorm';

export class CreateInvitations1796090600200 implements MigrationInterface {
  name = 'CreateInvitations1796090600200';

  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`CREATE TABLE IF NOT EXISTS invitations (
      id INT UNSIGNED NOT NULL AUTO_INCREMENT,
      team_id INT UNSIGNED NOT NULL,
      email VARCHAR(254) COLLATE utf8mb4_bin NOT NULL,
      open_email VARCHAR(254) COLLATE utf8mb4_bin NULL,
      roles SET ('admin', 'librarian', 'purchasing', 'engineer', 'reviewer') NOT NULL,
      token_hash CHAR(64) COLLATE utf8mb4_bin NOT NULL,
      invited_by_id INT UNSIGNED NULL,
      sent_at DATETIME(3) NOT NULL,
      expires_at DATETIME(3) NOT NULL,
      accepted_at DATETIME(3) NULL,
      revoked_at DATETIME(3) NULL,
      UNIQUE INDEX invitations_token (token_hash),
      UNIQUE INDEX invitations_open (team_id, open_email),
      PRIMARY KEY (id),
      CONSTRAINT invitations_team FOREIGN KEY (team_id) REFERENCES teams (id) ON DELETE CASCADE ON UPDATE NO ACTION,
      CONSTRAINT invitations_invited_by FOREIGN KEY (invited_by_id) REFERENCES users (id) ON DELETE SET NULL ON UPDATE NO ACTION
    ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci`);
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('DROP TABLE invitations');
  }
}
