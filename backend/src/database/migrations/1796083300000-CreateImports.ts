import type { MigrationInterface, QueryRunner } from 'typeorm';

const TABLES = [
  `CREATE TABLE IF NOT EXISTS imports (
    id INT UNSIGNED NOT NULL AUTO_INCREMENT,
    team_id INT UNSIGNED NOT NULL,
    kind VARCHAR(20) NOT NULL,
    state VARCHAR(20) NOT NULL,
    file_name VARCHAR(255) NOT NULL,
    file_size INT UNSIGNED NOT NULL,
    stored_name VARCHAR(64) COLLATE utf8mb4_bin NULL,
    sha256 VARCHAR(64) COLLATE utf8mb4_bin NOT NULL,
    header_key VARCHAR(64) COLLATE utf8mb4_bin NOT NULL,
    dialect JSON NOT NULL,
    columns JSON NOT NULL,
    mapping JSON NULL,
    row_count INT UNSIGNED NOT NULL,
    counts JSON NULL,
    kept_count INT UNSIGNED NOT NULL DEFAULT 0,
    checked_revision INT UNSIGNED NULL,
    failure VARCHAR(500) NULL,
    created_at DATETIME(3) NOT NULL,
    created_by INT UNSIGNED NULL,
    applied_at DATETIME(3) NULL,
    applied_by INT UNSIGNED NULL,
    undone_at DATETIME(3) NULL,
    undone_by INT UNSIGNED NULL,
    INDEX imports_file (team_id, sha256),
    INDEX imports_header (team_id, header_key),
    PRIMARY KEY (id),
    CONSTRAINT imports_team FOREIGN KEY (team_id) REFERENCES teams (id) ON DELETE CASCADE ON UPDATE NO ACTION,
    CONSTRAINT imports_created_by FOREIGN KEY (created_by) REFERENCES users (id) ON DELETE SET NULL ON UPDATE NO ACTION,
    CONSTRAINT imports_applied_by FOREIGN KEY (applied_by) REFERENCES users (id) ON DELETE SET NULL ON UPDATE NO ACTION,
    CONSTRAINT imports_undone_by FOREIGN KEY (undone_by) REFERENCES users (id) ON DELETE SET NULL ON UPDATE NO ACTION
  ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci`,
  `CREATE TABLE IF NOT EXISTS import_progress (
    import_id INT UNSIGNED NOT NULL,
    done INT UNSIGNED NOT NULL DEFAULT 0,
    total INT UNSIGNED NOT NULL DEFAULT 0,
    since DATETIME(3) NULL,
    cancel_requested TINYINT NOT NULL DEFAULT 0,
    PRIMARY KEY (import_id),
    CONSTRAINT import_progress_import FOREIGN KEY (import_id) REFERENCES imports (id) ON DELETE CASCADE ON UPDATE NO ACTION
  ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci`,
  `CREATE TABLE IF NOT EXISTS import_portions (
    import_id INT UNSIGNED NOT NULL,
    place INT UNSIGNED NOT NULL,
    counts JSON NOT NULL,
    verdicts JSON NOT NULL,
    PRIMARY KEY (import_id, place),
    CONSTRAINT import_portions_import FOREIGN KEY (import_id) REFERENCES imports (id) ON DELETE CASCADE ON UPDATE NO ACTION
  ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci`,
];

export class CreateImports1796083300000 implements MigrationInterface {
  name = 'CreateImports1796083300000';

  async up(runner: QueryRunner): Promise<void> {
    for (const table of TABLES) await runner.query(table);
  }

  async down(runner: QueryRunner): Promise<void> {
    for (const table of ['import_portions', 'import_progress', 'imports'])
      await runner.query(`DROP TABLE ${table}`);
  }
}
