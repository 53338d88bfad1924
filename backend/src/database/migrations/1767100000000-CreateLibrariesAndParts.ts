import type { MigrationInterface, QueryRunner } from 'typeorm';

const TABLES = [
  `CREATE TABLE IF NOT EXISTS libraries (
    id INT UNSIGNED NOT NULL AUTO_INCREMENT,
    team_id INT UNSIGNED NULL,
    revision INT UNSIGNED NOT NULL DEFAULT 1,
    UNIQUE INDEX libraries_team (team_id),
    PRIMARY KEY (id),
    CONSTRAINT libraries_team_key FOREIGN KEY (team_id) REFERENCES teams (id) ON DELETE CASCADE ON UPDATE NO ACTION
  ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci`,
  `CREATE TABLE IF NOT EXISTS parts (
    id INT UNSIGNED NOT NULL AUTO_INCREMENT,
    library_id INT UNSIGNED NOT NULL,
    kind VARCHAR(20) NOT NULL,
    manufacturer VARCHAR(120) NOT NULL,
    part_number VARCHAR(120) NOT NULL,
    normalised_key VARCHAR(730) COLLATE utf8mb4_bin NOT NULL,
    description VARCHAR(1000) NOT NULL,
    package VARCHAR(60) NOT NULL,
    lifecycle VARCHAR(20) NOT NULL,
    approval VARCHAR(20) NOT NULL,
    version INT UNSIGNED NOT NULL DEFAULT 1,
    created_at DATETIME(3) NOT NULL,
    updated_at DATETIME(3) NOT NULL,
    updated_by INT UNSIGNED NULL,
    UNIQUE INDEX parts_key (library_id, normalised_key),
    INDEX parts_name (library_id, manufacturer, part_number),
    PRIMARY KEY (id),
    CONSTRAINT parts_library FOREIGN KEY (library_id) REFERENCES libraries (id) ON DELETE CASCADE ON UPDATE NO ACTION,
    CONSTRAINT parts_updated_by FOREIGN KEY (updated_by) REFERENCES users (id) ON DELETE SET NULL ON UPDATE NO ACTION
  ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci`,
  `CREATE TABLE IF NOT EXISTS op_amps (
    part_id INT UNSIGNED NOT NULL,
    input_type VARCHAR(20) NULL,
    channels DOUBLE NOT NULL,
    voltage_noise DOUBLE NOT NULL,
    voltage_noise_corner DOUBLE NULL,
    current_noise DOUBLE NULL,
    current_noise_corner DOUBLE NULL,
    gain_bandwidth DOUBLE NULL,
    input_capacitance DOUBLE NULL,
    input_bias_current DOUBLE NULL,
    minimum_stable_gain DOUBLE NULL,
    supply_minimum DOUBLE NULL,
    supply_maximum DOUBLE NULL,
    supply_current DOUBLE NULL,
    origins JSON NOT NULL,
    PRIMARY KEY (part_id),
    CONSTRAINT op_amps_part FOREIGN KEY (part_id) REFERENCES parts (id) ON DELETE CASCADE ON UPDATE NO ACTION
  ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci`,
];

export class CreateLibrariesAndParts1767100000000 implements MigrationInterface {
  name = 'CreateLibrariesAndParts1767100000000';

  async up(runner: QueryRunner): Promise<void> {
    for (const table of TABLES) await runner.query(table);
  }

  async down(runner: QueryRunner): Promise<void> {
    for (const table of ['op_amps', 'parts', 'libraries']) await runner.query(`DROP TABLE ${table}`);
  }
}
