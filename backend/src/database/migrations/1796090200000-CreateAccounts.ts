import type { MigrationInterface, QueryRunner } from 'typeorm';

const TABLES = [
  `CREATE TABLE IF NOT EXISTS sessions (
    id INT UNSIGNED NOT NULL AUTO_INCREMENT,
    user_id INT UNSIGNED NOT NULL,
    team_id INT UNSIGNED NOT NULL,
    created_at DATETIME(3) NOT NULL,
    last_seen_at DATETIME(3) NOT NULL,
    user_agent VARCHAR(300) NOT NULL,
    address VARCHAR(45) NOT NULL,
    PRIMARY KEY (id),
    CONSTRAINT sessions_user FOREIGN KEY (user_id) REFERENCES users (id) ON DELETE CASCADE ON UPDATE NO ACTION,
    CONSTRAINT sessions_team FOREIGN KEY (team_id) REFERENCES teams (id) ON DELETE CASCADE ON UPDATE NO ACTION
  ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci`,
  `CREATE TABLE IF NOT EXISTS account_tokens (
    id INT UNSIGNED NOT NULL AUTO_INCREMENT,
    purpose VARCHAR(20) NOT NULL,
    token_hash CHAR(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    user_id INT UNSIGNED NULL,
    email VARCHAR(254) COLLATE utf8mb4_bin NOT NULL,
    details JSON NULL,
    expires_at DATETIME(3) NOT NULL,
    used_at DATETIME(3) NULL,
    UNIQUE INDEX account_tokens_hash (token_hash),
    PRIMARY KEY (id),
    CONSTRAINT account_tokens_user FOREIGN KEY (user_id) REFERENCES users (id) ON DELETE CASCADE ON UPDATE NO ACTION
  ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci`,
  `CREATE TABLE IF NOT EXISTS attempt_counts (
    subject_hash CHAR(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    count INT UNSIGNED NOT NULL,
    until DATETIME(3) NOT NULL,
    PRIMARY KEY (subject_hash)
  ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci`,
];

export class CreateAccounts1796090200000 implements MigrationInterface {
  name = 'CreateAccounts1796090200000';

  async up(runner: QueryRunner): Promise<void> {
    for (const table of TABLES) await runner.query(table);
  }

  async down(runner: QueryRunner): Promise<void> {
    for (const table of ['attempt_counts', 'account_tokens', 'sessions'])
      await runner.query(`DROP TABLE ${table}`);
  }
}
