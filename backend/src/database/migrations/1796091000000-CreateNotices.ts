import type { MigrationInterface, QueryRunner } from 'typeorm';

const TABLES = [
  `CREATE TABLE IF NOT EXISTS price_digests (
    team_id INT UNSIGNED NOT NULL,
    week DATE NOT NULL,
    at DATETIME(3) NOT NULL,
    PRIMARY KEY (team_id, week),
    CONSTRAINT price_digests_team FOREIGN KEY (team_id) REFERENCES teams (id) ON DELETE CASCADE ON UPDATE NO ACTION
  ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci`,
  `CREATE TABLE IF NOT EXISTS part_watches (
    conditions_id INT UNSIGNED NOT NULL,
    part_id INT UNSIGNED NOT NULL,
    lifecycle VARCHAR(20) NOT NULL,
    available TINYINT NOT NULL,
    quantity INT UNSIGNED NOT NULL,
    unit_price DECIMAL(40,4) NULL,
    currency CHAR(3) NULL,
    PRIMARY KEY (conditions_id, part_id),
    CONSTRAINT part_watches_chosen FOREIGN KEY (conditions_id, part_id)
      REFERENCES saved_conditions_parts (conditions_id, part_id) ON DELETE CASCADE ON UPDATE NO ACTION
  ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci`,
];

export class CreateNotices1796091000000 implements MigrationInterface {
  name = 'CreateNotices1796091000000';

  async up(runner: QueryRunner): Promise<void> {
    for (const table of TABLES) await runner.query(table);
  }

  async down(runner: QueryRunner): Promise<void> {
    for (const table of ['part_watches', 'price_digests']) await runner.query(`DROP TABLE ${table}`);
  }
}
