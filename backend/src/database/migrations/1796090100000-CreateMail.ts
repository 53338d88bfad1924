import type { MigrationInterface, QueryRunner } from 'typeorm';

const TABLES = [
  `CREATE TABLE IF NOT EXISTS outbox_mails (
    id INT UNSIGNED NOT NULL AUTO_INCREMENT,
    kind VARCHAR(40) NOT NULL,
    message_id VARCHAR(320) NOT NULL,
    \`to\` VARCHAR(254) NOT NULL,
    user_id INT UNSIGNED NULL,
    team_id INT UNSIGNED NULL,
    subject VARCHAR(200) NOT NULL,
    html MEDIUMTEXT NULL,
    text MEDIUMTEXT NULL,
    created_at DATETIME(3) NOT NULL,
    attempts TINYINT UNSIGNED NOT NULL DEFAULT 0,
    next_attempt_at DATETIME(3) NULL,
    sent_at DATETIME(3) NULL,
    failed_at DATETIME(3) NULL,
    last_error VARCHAR(300) NULL,
    INDEX outbox_mails_due (next_attempt_at),
    UNIQUE INDEX outbox_mails_message (message_id),
    PRIMARY KEY (id),
    CONSTRAINT outbox_mails_user FOREIGN KEY (user_id) REFERENCES users (id) ON DELETE SET NULL ON UPDATE NO ACTION,
    CONSTRAINT outbox_mails_team FOREIGN KEY (team_id) REFERENCES teams (id) ON DELETE SET NULL ON UPDATE NO ACTION
  ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci`,
  `CREATE TABLE IF NOT EXISTS refused_mails (
    user_id INT UNSIGNED NOT NULL,
    kind VARCHAR(40) NOT NULL,
    at DATETIME(3) NOT NULL,
    PRIMARY KEY (user_id, kind),
    CONSTRAINT refused_mails_user FOREIGN KEY (user_id) REFERENCES users (id) ON DELETE CASCADE ON UPDATE NO ACTION
  ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci`,
];

export class CreateMail1796090100000 implements MigrationInterface {
  name = 'CreateMail1796090100000';

  async up(runner: QueryRunner): Promise<void> {
    for (const table of TABLES) await runner.query(table);
  }

  async down(runner: QueryRunner): Promise<void> {
    for (const table of ['refused_mails', 'outbox_mails']) await runner.query(`DROP TABLE ${table}`);
  }
}
