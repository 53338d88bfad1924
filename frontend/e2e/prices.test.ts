import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { launchBrowser, PHONE, visit, type Visit } from './support/browser';
import { screenshot } from './support/screenshot';
import { signIn } from './support/session';

let browser: Browser;
let open: Visit;
let page: Page;

beforeAll(async () => {
  browser = await launchBrowser();
});

afterAll(async () => {
  await browser.close();
});

async function start(
  role: 'purchasing' | 'engineer',
  path: string,
  options: Parameters<typeof visit>[1] = {},
) {
  open = await visit(browser, { permissions: ['clipboard-read', 'clipboard-write'], ...options });
  page = open.page;
  await signIn(page, role, path);
  await cell(0, 'price:1').waitFor();
}

async function end() {
  const { problems, close } = open;
  await close();
  expect(problems).toEqual([]);
}

const cell = (row: number, column: string) =>
  page.locator(`.ag-row[row-index="${row}"] [col-id="${column}"]`);
const textOf = (row: number, column: string) => () => cell(row, column).textContent();
const button = (name: string | RegExp) => page.getByRole('button', { name });
const press = (...keys: string[]) =>
  keys.reduce((done, key) => done.then(() => page.keyboard.press(key)), Promise.resolve());

/** Prices that no other run has left here. */
const fresh = () => (1 + (Date.now() % 1e6) / 1e7).toFixed(4);

describe('the prices page', () => {
  it('is edited by keyboard, pasted into, mended, saved at once and confirmed', async () => {
    await start('purchasing', '/prices?search=Brackwater&kind=op-amp');
    const [one, two] = [fresh(), (Number(fresh()) - 0.5).toFixed(4)];

    await cell(1, 'price:100').click();
    await press('F2', 'Control+a');
    await page.keyboard.type(one);
    await press('Enter');
    await expect.poll(textOf(1, 'price:100')).toContain(one);
    await press('Control+z');
    await expect.poll(textOf(1, 'price:100')).not.toContain(one);
    await press('Control+Shift+z');
    await expect.poll(textOf(1, 'price:100')).toContain(one);

    await page.evaluate((text) => navigator.clipboard.writeText(text), `${two}\n1.234,56`);
    await cell(1, 'price:1000').click();
    await press('Control+v');
    await expect.poll(textOf(2, 'price:1000')).toContain('refused: unit price: digits in groups');
    expect(await button(/^Save/).isDisabled()).toBe(true);
    await screenshot(page, 'prices-refused');
    await button('Show it').click();
    await page.keyboard.type(two);
    await press('Enter');
    await expect.poll(textOf(2, 'price:1000')).toContain(`${two}, not saved yet`);

    await button(/^Save 3 changes/).click();
    await page.getByText('2 offers are saved').waitFor();
    await expect.poll(textOf(1, 'price:100')).toBe(one);
    await page.reload();
    await expect.poll(textOf(2, 'price:1000')).toBe(two);

    await cell(1, 'price:1').click();
    await button('Price history').click();
    await page.getByRole('img', { name: /^Price at 100 over time/ }).waitFor();
    await page.getByText(`→ ${one}`).first().waitFor();
    await screenshot(page, 'prices-history');

    await press('Escape');
    await cell(1, 'confirm').getByRole('button').click();
    await page.getByText('1 offer is confirmed as still valid').waitFor();
    const undone = page.waitForResponse('**/api/offers/confirm/undo');
    await page.getByRole('alert').getByRole('button', { name: 'Undo' }).click();
    expect((await undone).status()).toBe(200);
    await end();
  });

  it('keeps the rest of a rectangle that is larger than the grid', async () => {
    await start('purchasing', '/prices?search=TN-610');
    const last = (await page.locator('.ag-row [col-id="currency"]').count()) - 1;
    await cell(last, 'stock').click();
    await page.evaluate(() => navigator.clipboard.writeText('4321\n9\n9'));
    await press('Control+v');
    await expect.poll(textOf(last, 'stock')).toMatch(/4321, refused: the pasted rectangle is 2 rows longer/);
    await button('Leave out what has no place').click();
    await expect.poll(textOf(last, 'stock')).toBe('4321, not saved yet');
    await button('Discard').click();
    await expect.poll(textOf(last, 'stock')).not.toContain('4321');
    await end();
  });

  it('shows an engineer what parts cost and lets nothing be changed', async () => {
    await start('engineer', '/prices?usedInConditions=true');
    await cell(0, 'price:100').dblclick();
    await page.keyboard.type('9');
    expect(await page.locator('.ag-row input').count()).toBe(0);
    expect(await button(/^Save/).count()).toBe(0);
    await end();
  });

  it('takes an edit on a phone', async () => {
    await start('purchasing', '/prices?search=TN-610', { viewport: PHONE, hasTouch: true });
    await cell(0, 'price:1').tap();
    await page.keyboard.type('7.77');
    await press('Enter');
    await button('Save 1 change').waitFor();
    await screenshot(page, 'prices-phone');
    const width = await page.evaluate(() => document.documentElement.scrollWidth);
    expect(width).toBeLessThanOrEqual(PHONE.width);
    await button('Discard').click();
    await end();
  });
});
