import type { MigrationInterface, QueryRunner } from 'typeorm';

export class CreateResistors1767300000000 implements MigrationInterface {
  name = 'CreateResistors1767300000000';

  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`CREATE TABLE IF NOT EXISTS resistors (
      part_id INT UNSIGNED NOT NULL,
      technology VARCHAR(20) NULL,
      resistance DOUBLE NOT NULL,
      tolerance DOUBLE NULL,
      temperature_coefficient DOUBLE NULL,
      power_rating DOUBLE NULL,
      noise_index DOUBLE NULL,
      temperature_rise DOUBLE NULL,
      origins JSON NOT NULL,
      PRIMARY KEY (part_id),
      CONSTRAINT resistors_part FOREIGN KEY (part_id) REFERENCES parts (id) ON DELETE CASCADE ON UPDATE NO ACTION
    ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci`);
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('DROP TABLE resistors');
  }
}
