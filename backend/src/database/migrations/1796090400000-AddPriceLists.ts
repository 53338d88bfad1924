import type { MigrationInterface, QueryRunner } from 'typeorm';

/** Imports state a supplier and a currency of a whole list, have a version, and know who stopped the work on them. */
export class AddPriceLists1796090400000 implements MigrationInterface {
  name = 'AddPriceLists1796090400000';

  async up(runner: QueryRunner): Promise<void> {
    await runner.query('ALTER TABLE imports ADD COLUMN IF NOT EXISTS whole_list JSON NULL AFTER mapping');
    await runner.query(
      'ALTER TABLE imports ADD COLUMN IF NOT EXISTS version INT UNSIGNED NOT NULL DEFAULT 1 AFTER whole_list',
    );
    await runner.query('ALTER TABLE import_progress ADD COLUMN IF NOT EXISTS cancelled_by INT UNSIGNED NULL');
    await runner.query('ALTER TABLE import_progress DROP COLUMN IF EXISTS cancel_requested');
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('ALTER TABLE import_progress ADD COLUMN cancel_requested TINYINT NOT NULL DEFAULT 0');
    await runner.query('ALTER TABLE import_progress DROP COLUMN cancelled_by');
    await runner.query('ALTER TABLE imports DROP COLUMN version');
    await runner.query('ALTER TABLE imports DROP COLUMN whole_list');
  }
}
