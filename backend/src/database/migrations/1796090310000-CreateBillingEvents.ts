import type { MigrationInterface, QueryRunner } from 'typeorm';

export class CreateBillingEvents1796090310000 implements MigrationInterface {
  name = 'CreateBillingEvents1796090310000';

  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`CREATE TABLE IF NOT EXISTS billing_events (
      id VARCHAR(255) COLLATE utf8mb4_bin NOT NULL,
      type VARCHAR(100) NOT NULL,
      received_at DATETIME(3) NOT NULL,
      PRIMARY KEY (id)
    ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci`);
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('DROP TABLE billing_events');
  }
}
