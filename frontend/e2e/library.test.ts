import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { launchBrowser, PHONE, visit } from './support/browser';
import { screenshot } from './support/screenshot';
import { signIn } from './support/session';

let browser: Browser;
beforeAll(async () => {
  browser = await launchBrowser();
});
afterAll(() => browser.close());

async function createPart(page: Page, partNumber: string): Promise<string> {
  await page.goto('/parts/new');
  const fill = (label: string, text: string) => page.getByLabel(label, { exact: true }).fill(text);
  await fill('manufacturer', 'Harbour Test Works');
  await fill('part number', partNumber);
  await fill('voltage noise e_n', '3n3');
  await page.getByRole('button', { name: 'Add to your library' }).click();
  await page.getByRole('heading', { level: 1, name: partNumber }).waitFor();
  return page.url();
}

async function removePart(page: Page, address: string): Promise<void> {
  await page.goto(address);
  await page.getByRole('button', { name: 'Delete' }).click();
  await page.getByText('is deleted').first().waitFor();
}

describe('the library work', () => {
  it('fills in what the ranking misses, and settles what looks like one part', async () => {
    const { page, problems, close } = await visit(browser);
    await signIn(page, 'librarian', '/parts');
    const number = `E2E-${Date.now().toString(36)}-1`;
    const first = await createPart(page, `${number}0`);
    const second = await createPart(page, `${number}O`);

    await page.goto(`/parts/completeness?library=team&search=${number}`);
    await page.getByText('2 parts, 0 complete').waitFor();
    await page.getByRole('button', { name: 'current noise 2' }).click();
    await page.getByLabel(`current noise of ${number}0`).fill('1.2 pA/√Hz');
    await page.getByLabel(`current noise of ${number}0`).press('Tab');
    await page.getByRole('button', { name: 'current noise 1' }).waitFor();
    await screenshot(page, 'parts-completeness');

    await page.getByRole('link', { name: 'Duplicates' }).click();
    const pair = page.getByRole('article', { name: new RegExp(`${number}[0O] and ${number}[0O]`) });
    await pair.getByText('part numbers that read alike').waitFor();
    await screenshot(page, 'parts-duplicates');
    await pair.getByRole('button', { name: 'Keep both' }).click();
    await page.getByText('are both kept').waitFor();
    await pair.waitFor({ state: 'detached' });
    await page.getByRole('button', { name: 'Undo' }).click();
    await pair.getByRole('button', { name: `Retire ${number}O` }).click();
    await page.getByText(`${number}O is retired`).waitFor();
    await pair.waitFor({ state: 'detached' });

    await removePart(page, first);
    await removePart(page, second);
    expect(problems).toEqual([]);
    await close();
  });

  it('fits a narrow screen', async () => {
    const { page, problems, close } = await visit(browser, { viewport: PHONE });
    await signIn(page, 'engineer', '/parts');
    for (const path of ['/parts/completeness?library=team', '/parts/resistors/duplicates']) {
      await page.goto(path);
      await page.getByRole('table').first().waitFor();
      expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBeLessThanOrEqual(
        PHONE.width,
      );
    }
    expect(problems).toEqual([]);
    await close();
  });
});
