import type { MigrationInterface, QueryRunner } from 'typeorm';

/** The team in which somebody worked last is the one that a sign-in opens. */
export class RememberOpenTeams1796105001000 implements MigrationInterface {
  name = 'RememberOpenTeams1796105001000';

  async up(runner: QueryRunner): Promise<void> {
    await runner.query('ALTER TABLE memberships ADD COLUMN IF NOT EXISTS opened_at DATETIME(3) NULL');
    await runner.query(`UPDATE memberships membership
      JOIN (SELECT user_id, team_id, MAX(last_seen_at) AS seen_at FROM sessions GROUP BY user_id, team_id) session
        ON session.user_id = membership.user_id AND session.team_id = membership.team_id
      SET membership.opened_at = session.seen_at`);
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('ALTER TABLE memberships DROP COLUMN opened_at');
  }
}
