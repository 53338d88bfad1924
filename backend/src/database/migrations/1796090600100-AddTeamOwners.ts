import type { MigrationInterface, QueryRunner } from 'typeorm';

export class AddTeamOwners1796090600100 implements MigrationInterface {
  name = 'AddTeamOwners1796090600100';

  async up(runner: QueryRunner): Promise<void> {
    await runner.query('ALTER TABLE teams ADD COLUMN IF NOT EXISTS owner_id INT UNSIGNED NULL AFTER name');
    await runner.query(
      `ALTER TABLE teams ADD CONSTRAINT teams_owner FOREIGN KEY IF NOT EXISTS (owner_id) REFERENCES users (id)
        ON DELETE SET NULL ON UPDATE NO ACTION`,
    );
    await runner.query(
      'ALTER TABLE memberships ADD COLUMN IF NOT EXISTS joined_at DATETIME(3) NOT NULL DEFAULT CURRENT_TIMESTAMP(3)',
    );
    await runner.query(
      `UPDATE teams SET owner_id = (SELECT MIN(user_id) FROM memberships
        WHERE memberships.team_id = teams.id AND FIND_IN_SET('admin', memberships.roles)) WHERE owner_id IS NULL`,
    );
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('ALTER TABLE memberships DROP COLUMN joined_at');
    await runner.query('ALTER TABLE teams DROP FOREIGN KEY teams_owner');
    await runner.query('ALTER TABLE teams DROP COLUMN owner_id');
  }
}
