import type { MigrationInterface, QueryRunner } from 'typeorm';

const TABLES = [
  `CREATE TABLE IF NOT EXISTS subscriptions (
    team_id INT UNSIGNED NOT NULL,
    trial_ends_at DATETIME(3) NULL,
    customer_id VARCHAR(255) COLLATE utf8mb4_bin NULL,
    subscription_id VARCHAR(255) COLLATE utf8mb4_bin NULL,
    status ENUM ('active', 'past-due', 'cancelled') NULL,
    seats INT UNSIGNED NOT NULL DEFAULT 0,
    current_period_end DATETIME(3) NULL,
    ends_at DATETIME(3) NULL,
    past_due_since DATETIME(3) NULL,
    UNIQUE INDEX subscriptions_customer (customer_id),
    PRIMARY KEY (team_id),
    CONSTRAINT subscriptions_team FOREIGN KEY (team_id) REFERENCES teams (id) ON DELETE CASCADE ON UPDATE NO ACTION
  ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci`,
];

/** The plan of a team follows from its subscription: teams that have one granted keep it, with a seat for each member. */
const GRANTED = `INSERT IGNORE INTO subscriptions (team_id, status, seats)
  SELECT teams.id, 'active', GREATEST(COUNT(memberships.user_id), 5)
  FROM teams LEFT JOIN memberships ON memberships.team_id = teams.id
  WHERE teams.plan = 'team' GROUP BY teams.id`;

export class CreateSubscriptions1796090300000 implements MigrationInterface {
  name = 'CreateSubscriptions1796090300000';

  async up(runner: QueryRunner): Promise<void> {
    for (const table of TABLES) await runner.query(table);
    if (!(await runner.hasColumn('teams', 'plan'))) return;
    await runner.query(GRANTED);
    await runner.query('ALTER TABLE teams DROP COLUMN plan');
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query(
      `ALTER TABLE teams ADD COLUMN plan ENUM ('free', 'team') NOT NULL DEFAULT 'free' AFTER name`,
    );
    await runner.query(
      `UPDATE teams SET plan = 'team' WHERE id IN (SELECT team_id FROM subscriptions WHERE status = 'active')`,
    );
    await runner.query('DROP TABLE subscriptions');
  }
}
