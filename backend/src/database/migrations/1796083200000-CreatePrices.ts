import type { MigrationInterface, QueryRunner } from 'typeorm';

const TABLES = [
  `CREATE TABLE IF NOT EXISTS price_settings (
    team_id INT UNSIGNED NOT NULL,
    currency CHAR(3) NOT NULL DEFAULT 'EUR',
    stale_after_days INT UNSIGNED NOT NULL DEFAULT 90,
    revision INT UNSIGNED NOT NULL DEFAULT 1,
    PRIMARY KEY (team_id),
    CONSTRAINT price_settings_team FOREIGN KEY (team_id) REFERENCES teams (id) ON DELETE CASCADE ON UPDATE NO ACTION
  ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci`,
  `CREATE TABLE IF NOT EXISTS exchange_rates (
    team_id INT UNSIGNED NOT NULL,
    base_currency CHAR(3) NOT NULL,
    currency CHAR(3) NOT NULL,
    dated DATE NOT NULL,
    rate DECIMAL(18,8) NOT NULL,
    updated_at DATETIME(3) NOT NULL,
    updated_by INT UNSIGNED NULL,
    PRIMARY KEY (team_id, base_currency, currency, dated),
    CONSTRAINT exchange_rates_team FOREIGN KEY (team_id) REFERENCES teams (id) ON DELETE CASCADE ON UPDATE NO ACTION,
    CONSTRAINT exchange_rates_updated_by FOREIGN KEY (updated_by) REFERENCES users (id) ON DELETE SET NULL ON UPDATE NO ACTION
  ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci`,
  `CREATE TABLE IF NOT EXISTS suppliers (
    id INT UNSIGNED NOT NULL AUTO_INCREMENT,
    team_id INT UNSIGNED NOT NULL,
    name VARCHAR(120) NOT NULL,
    name_key VARCHAR(360) COLLATE utf8mb4_bin NOT NULL,
    created_at DATETIME(3) NOT NULL,
    UNIQUE INDEX suppliers_name (team_id, name_key),
    PRIMARY KEY (id),
    CONSTRAINT suppliers_team FOREIGN KEY (team_id) REFERENCES teams (id) ON DELETE CASCADE ON UPDATE NO ACTION
  ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci`,
  `CREATE TABLE IF NOT EXISTS offers (
    id INT UNSIGNED NOT NULL AUTO_INCREMENT,
    team_id INT UNSIGNED NOT NULL,
    part_id INT UNSIGNED NOT NULL,
    supplier_id INT UNSIGNED NOT NULL,
    supplier_number VARCHAR(60) NOT NULL,
    currency CHAR(3) NOT NULL,
    minimum_order_quantity INT UNSIGNED NOT NULL,
    order_multiple INT UNSIGNED NOT NULL,
    lead_time_days INT UNSIGNED NULL,
    stock INT UNSIGNED NULL,
    valid_from DATE NOT NULL,
    valid_until DATE NULL,
    confirmed_at DATETIME(3) NOT NULL,
    confirmed_by INT UNSIGNED NULL,
    version INT UNSIGNED NOT NULL DEFAULT 1,
    opened_at DATETIME(3) NOT NULL,
    opened_by INT UNSIGNED NULL,
    closed_at DATETIME(3) NULL,
    closed_by INT UNSIGNED NULL,
    INDEX offers_open (team_id, closed_at, part_id),
    INDEX offers_history (team_id, part_id, opened_at),
    PRIMARY KEY (id),
    CONSTRAINT offers_team FOREIGN KEY (team_id) REFERENCES teams (id) ON DELETE CASCADE ON UPDATE NO ACTION,
    CONSTRAINT offers_part FOREIGN KEY (part_id) REFERENCES parts (id) ON DELETE CASCADE ON UPDATE NO ACTION,
    CONSTRAINT offers_supplier FOREIGN KEY (supplier_id) REFERENCES suppliers (id) ON DELETE CASCADE ON UPDATE NO ACTION,
    CONSTRAINT offers_confirmed_by FOREIGN KEY (confirmed_by) REFERENCES users (id) ON DELETE SET NULL ON UPDATE NO ACTION,
    CONSTRAINT offers_opened_by FOREIGN KEY (opened_by) REFERENCES users (id) ON DELETE SET NULL ON UPDATE NO ACTION,
    CONSTRAINT offers_closed_by FOREIGN KEY (closed_by) REFERENCES users (id) ON DELETE SET NULL ON UPDATE NO ACTION
  ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci`,
  `CREATE TABLE IF NOT EXISTS price_breaks (
    offer_id INT UNSIGNED NOT NULL,
    minimum_quantity INT UNSIGNED NOT NULL,
    unit_price DECIMAL(18,6) NOT NULL,
    PRIMARY KEY (offer_id, minimum_quantity),
    CONSTRAINT price_breaks_offer FOREIGN KEY (offer_id) REFERENCES offers (id) ON DELETE CASCADE ON UPDATE NO ACTION
  ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci`,
];

const NEWEST_FIRST = ['price_breaks', 'offers', 'suppliers', 'exchange_rates', 'price_settings'];

export class CreatePrices1796083200000 implements MigrationInterface {
  name = 'CreatePrices1796083200000';

  async up(runner: QueryRunner): Promise<void> {
    for (const table of TABLES) await runner.query(table);
  }

  async down(runner: QueryRunner): Promise<void> {
    for (const table of NEWEST_FIRST) await runner.query(`DROP TABLE ${table}`);
  }
}
