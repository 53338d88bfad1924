import type { Page } from 'playwright-core';
import { describe, expect, it } from 'vitest';
import { openBrowser, PHONE, visit } from './support/browser';
import { createPart, fill, removePart, uniqueNumber } from './support/parts';
import { screenshot } from './support/screenshot';
import { signIn } from './support/session';

const LIST = '/parts/resistors';

const browser = openBrowser();

function rows(page: Page) {
  return page.getByRole('region', { name: 'Resistors' }).locator('a');
}

describe('the resistors', () => {
  it('stand beside the op-amps and are searched on the server where not all are loaded', async () => {
    const { page, problems, close } = await visit(browser());
    await signIn(page, 'engineer', '/parts');
    await page.getByRole('link', { name: 'Resistors' }).click();
    await rows(page).first().waitFor();
    await page.getByText(/\d parts, of which the first 1.000 are shown/).waitFor();
    await screenshot(page, 'resistors');
    await page.getByLabel('Search parts').fill('VCC-1-36K0');
    await page.getByText(/found among \d.\d+ parts/).waitFor();
    expect(await rows(page).first().textContent()).toBe('VCC-1-36K0');
    await rows(page).first().click();
    await page.getByText(/^36 kΩ ±10 % · carbon composition/).waitFor();
    expect(new URL(page.url()).pathname).toMatch(/^\/parts\/resistors\/\d+$/);
    expect(problems).toEqual([]);
    await close();
  });

  it('are narrowed by technology and by values typed as one writes them', async () => {
    const { page, problems, close } = await visit(browser());
    await signIn(page, 'engineer', `${LIST}?technology=thick-film&library=curated&sort=-noiseIndex`);
    await fill(page, 'resistance from', '4k7');
    await page.keyboard.press('Enter');
    await fill(page, 'resistance to', '0.0047 MΩ');
    await page.keyboard.press('Enter');
    await page.getByText(/^\d+ parts: \d+ curated, 0 of your own/).waitFor();
    const values = async () =>
      new Set(await page.locator('[col-id=resistance][role=gridcell]').allTextContents());
    await expect.poll(values, { timeout: 15_000 }).toEqual(new Set(['4.70\u2009kΩ']));
    const indices = await page.locator('[col-id=noiseIndex][role=gridcell]').allTextContents();
    const figures = indices.map((text) => Number(text.replace('−', '-')));
    expect(figures).toEqual([...figures].sort((one, other) => other - one));
    await page.reload();
    expect(await page.getByLabel('resistance to').inputValue()).toBe('4.7 kΩ');
    await fill(page, 'resistance to', '100');
    await page.keyboard.press('Enter');
    await page.getByText('no value lies between these').waitFor();
    await page.getByRole('button', { name: 'show all parts' }).click();
    await page.getByText(/of which the first/).waitFor();
    expect(problems).toEqual([]);
    await close();
  });

  it('are created, edited, deleted and brought back by a librarian', async () => {
    const { page, problems, close } = await visit(browser());
    await signIn(page, 'librarian', LIST);
    const partNumber = uniqueNumber();
    await createPart(page, partNumber, 'resistor');
    await page.getByText('The noise index is unknown').waitFor();
    await page.getByRole('link', { name: 'Edit' }).click();
    await fill(page, 'noise index NI', '-10');
    await screenshot(page, 'resistor-edit');
    await page.getByRole('button', { name: 'Save' }).click();
    await page.getByText('316\u2009nV/V').waitFor();
    await fill(page, 'direct voltage', '10');
    await page.keyboard.press('Enter');
    await page.getByRole('img', { name: /excess at 10.V/ }).waitFor();
    await screenshot(page, 'resistor');
    await page.getByRole('button', { name: 'Delete' }).click();
    await page.getByText(`${partNumber} is deleted`).waitFor();
    expect(new URL(page.url()).pathname).toBe(LIST);
    await page.getByRole('button', { name: 'Undo' }).click();
    await page.getByRole('heading', { level: 1, name: partNumber }).waitFor();
    await page.getByText('316\u2009nV/V').waitFor();
    await removePart(page, page.url());
    expect(problems).toEqual([]);
    await close();
  });

  it('show what a second librarian changed meanwhile, value by value', async () => {
    const { page, problems, close } = await visit(browser(), { expected: [409] });
    await signIn(page, 'librarian', LIST);
    const address = await createPart(page, uniqueNumber(), 'resistor');
    const other = await visit(browser());
    await signIn(other.page, 'admin', new URL(address).pathname);
    await page.getByRole('link', { name: 'Edit' }).click();
    await page.getByRole('button', { name: 'Save' }).waitFor();
    await other.page.getByRole('link', { name: 'Edit' }).click();
    await fill(other.page, 'tolerance', '0.1 %');
    await other.page.getByRole('button', { name: 'Save' }).click();
    await other.page.getByLabel('Parameters').getByText('0.1 %').waitFor();
    await fill(page, 'tolerance', '1 %');
    await page.getByRole('button', { name: 'Save' }).click();
    await page.getByRole('alertdialog').waitFor();
    await page.getByRole('radio', { name: 'Take theirs: 0.1 %' }).check();
    await page.getByRole('button', { name: 'Save with these values' }).click();
    await page.getByLabel('Parameters').getByText('0.1 %').waitFor();
    await removePart(page, address);
    expect([...problems, ...other.problems]).toEqual([]);
    await other.close();
    await close();
  });

  it('fit a narrow screen', async () => {
    const { page, problems, close } = await visit(browser(), { viewport: PHONE });
    await signIn(page, 'librarian', `${LIST}?technology=metal-foil`);
    await rows(page).first().waitFor();
    const first = (await rows(page).first().getAttribute('href'))!;
    for (const path of [LIST, first, `${LIST}/new`]) {
      await page.goto(path);
      await page.getByRole('heading', { level: 1 }).waitFor();
      expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBeLessThanOrEqual(
        PHONE.width,
      );
    }
    expect(problems).toEqual([]);
    await close();
  });
});
