import type { MigrationInterface, QueryRunner } from 'typeorm';

export class AddPartsOfConditions1796090900000 implements MigrationInterface {
  name = 'AddPartsOfConditions1796090900000';

  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`CREATE TABLE IF NOT EXISTS saved_conditions_parts (
      conditions_id INT UNSIGNED NOT NULL,
      part_id INT UNSIGNED NOT NULL,
      PRIMARY KEY (conditions_id, part_id),
      CONSTRAINT saved_conditions_parts_conditions FOREIGN KEY (conditions_id) REFERENCES saved_conditions (id) ON DELETE CASCADE ON UPDATE NO ACTION,
      CONSTRAINT saved_conditions_parts_part FOREIGN KEY (part_id) REFERENCES parts (id) ON DELETE CASCADE ON UPDATE NO ACTION
    ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci`);
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('DROP TABLE saved_conditions_parts');
  }
}
