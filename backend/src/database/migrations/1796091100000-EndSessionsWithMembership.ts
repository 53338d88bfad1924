import type { MigrationInterface, QueryRunner } from 'typeorm';

/** Whoever leaves a team is signed out of it for good: a later return begins with a sign-in. */
export class EndSessionsWithMembership1796091100000 implements MigrationInterface {
  name = 'EndSessionsWithMembership1796091100000';

  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`DELETE session FROM sessions session
      LEFT JOIN memberships membership ON membership.user_id = session.user_id AND membership.team_id = session.team_id
      WHERE membership.user_id IS NULL`);
    await runner.query(`ALTER TABLE sessions
      ADD CONSTRAINT sessions_membership FOREIGN KEY IF NOT EXISTS (user_id, team_id)
      REFERENCES memberships (user_id, team_id) ON DELETE CASCADE ON UPDATE NO ACTION`);
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('ALTER TABLE sessions DROP FOREIGN KEY sessions_membership');
  }
}
