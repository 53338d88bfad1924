import { mkdirSync } from 'node:fs';
import { join } from 'node:path';
import type { Page } from 'playwright-core';

const FOLDER = join(import.meta.dirname, '..', 'screenshots');

/** Saves what the page shows as `e2e/screenshots/<name>.png`. */
export async function screenshot(page: Page, name: string): Promise<void> {
  mkdirSync(FOLDER, { recursive: true });
  await page.evaluate(() => document.fonts.ready);
  await page.screenshot({ path: join(FOLDER, `${name}.png`) });
}
