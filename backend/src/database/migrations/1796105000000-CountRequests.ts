import type { MigrationInterface, QueryRunner } from 'typeorm';

/** In memory: what is counted for a minute needn't be written to a disk with every request. */
export class CountRequests1796105000000 implements MigrationInterface {
  name = 'CountRequests1796105000000';

  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`CREATE TABLE IF NOT EXISTS request_counts (
      request_hash CHAR(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      count INT UNSIGNED NOT NULL,
      until DATETIME(3) NOT NULL,
      PRIMARY KEY (request_hash)
    ) ENGINE=MEMORY DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci`);
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('DROP TABLE request_counts');
  }
}
