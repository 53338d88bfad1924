import type { MigrationInterface, QueryRunner } from 'typeorm';

export class KeepEarlierConfirmations1796090901000 implements MigrationInterface {
  name = 'KeepEarlierConfirmations1796090901000';

  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`ALTER TABLE offers
      ADD COLUMN IF NOT EXISTS earlier_confirmed_at DATETIME(3) NULL AFTER confirmed_by,
      ADD COLUMN IF NOT EXISTS earlier_confirmed_by INT UNSIGNED NULL AFTER earlier_confirmed_at,
      ADD CONSTRAINT offers_earlier_confirmed_by FOREIGN KEY IF NOT EXISTS (earlier_confirmed_by)
        REFERENCES users (id) ON DELETE SET NULL ON UPDATE NO ACTION`);
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query(`ALTER TABLE offers
      DROP FOREIGN KEY offers_earlier_confirmed_by,
      DROP COLUMN earlier_confirmed_by,
      DROP COLUMN earlier_confirmed_at`);
  }
}
