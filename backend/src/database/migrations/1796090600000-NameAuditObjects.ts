import type { MigrationInterface, QueryRunner } from 'typeorm';

export class NameAuditObjects1796090600000 implements MigrationInterface {
  name = 'NameAuditObjects1796090600000';

  async up(runner: QueryRunner): Promise<void> {
    await runner.query(
      'ALTER TABLE audit_entries ADD COLUMN IF NOT EXISTS object_label VARCHAR(250) NULL AFTER object_id',
    );
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('ALTER TABLE audit_entries DROP COLUMN object_label');
  }
}
