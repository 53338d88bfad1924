import type { Locator, Page } from 'playwright-core';
import { describe, expect, it } from 'vitest';
import { BASE_URL, openBrowser, PHONE, visit, type Visit } from './support/browser';
import { screenshot } from './support/screenshot';
import { signIn } from './support/session';

const browser = openBrowser();
let open: Visit;
let page: Page;

async function start(
  role: 'purchasing' | 'engineer',
  path: string,
  options: Parameters<typeof visit>[1] = {},
) {
  open = await visit(browser(), { permissions: ['clipboard-read', 'clipboard-write'], ...options });
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

/** Goes on by a key until something has the focus. */
async function go(key: 'Tab' | 'Shift+Tab', to: Locator) {
  const isThere = () => to.evaluateAll((found) => found.includes(document.activeElement as HTMLElement));
  for (let step = 0; step < 40 && !(await isThere()); step++) await press(key);
  expect(await isThere()).toBe(true);
}

/** A price that no other run has left here, with no 0 at its end that its cell would leave out. */
const fresh = () =>
  `1.0${String(Date.now() % 100).padStart(2, '0')}${1 + (Math.floor(Date.now() / 100) % 9)}`;

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

  it('opens an offer of a new supplier by keyboard alone, closes it, takes that back and closes it again', async () => {
    await start('purchasing', '/prices?search=TN-610');
    const supplier = `Saltmarsh Parts ${Date.now()}`;
    const row = page.locator('.ag-row', { hasText: supplier });

    await page.getByRole('searchbox', { name: 'Search prices' }).focus();
    await go('Tab', cell(0, 'part'));
    await go('Shift+Tab', button('New offer for TN-610'));
    await press('Enter');
    await cell(0, 'supplier').getByRole('combobox').waitFor();
    await page.keyboard.type(supplier);
    await press('Tab', 'Tab', 'Tab');
    await cell(0, 'price:1').getByRole('textbox').waitFor();
    await page.keyboard.type('7.5');
    await press('Enter');
    await expect.poll(textOf(0, 'currency')).toBe('EUR');
    await go('Tab', button(`Add the supplier “${supplier}”`));
    await press('Enter');
    await expect.poll(() => button(/^Save/).isEnabled()).toBe(true);
    await go('Shift+Tab', cell(1, 'price:1'));
    await press('Control+s');
    await page.getByText('1 offer is saved').waitFor();
    await expect.poll(() => row.locator('[col-id="price:1"]').textContent()).toBe('7.50');

    await row.locator('[col-id="price:1"]').click();
    await go('Shift+Tab', button('Close this offer'));
    await press('Enter');
    const closed = page
      .getByRole('alert')
      .filter({ hasText: `The offer of ${supplier} for TN-610 is closed` });
    await closed.waitFor();
    await row.first().waitFor({ state: 'detached' });
    await closed.getByRole('button', { name: 'Undo' }).click();
    await row.locator('[col-id="price:1"]').click();
    await button('Close this offer').click();
    await row.first().waitFor({ state: 'detached' });

    await cell(0, 'price:1').click();
    await button('Price history').click();
    const latest = page
      .getByRole('list', { name: 'Changes, the latest first' })
      .getByRole('listitem')
      .first();
    await expect.poll(() => latest.textContent()).toMatch(new RegExp(`Amara Lindqvist ${supplier}: closed`));
    await screenshot(page, 'prices-closed');
    await end();
  });

  it('shows theirs beside mine where somebody was quicker', async () => {
    await start('purchasing', '/prices?search=VR-1136', { expected: [409] });
    const listed = await page.request.get('/api/prices?search=VR-1136');
    const [{ offer }] = (await listed.json()).items;
    const other = await visit(browser());
    await signIn(other.page, 'admin');
    const theirs = { rows: [{ id: offer.id, version: offer.version, stock: (offer.stock ?? 0) + 1 }] };
    const saved = await other.page.request.put('/api/prices', {
      data: theirs,
      headers: { origin: BASE_URL },
    });
    expect(saved.status()).toBe(200);
    await other.close();

    await cell(0, 'price:1000').click();
    await page.keyboard.type('0.0123');
    await press('Enter');
    await button('Save 1 change').click();
    const table = page.getByRole('table', { name: 'Theirs and yours for VR-1136' });
    await table
      .getByRole('row', { name: `stock ${offer.stock ?? 'none'} ${(offer.stock ?? 0) + 1}` })
      .waitFor();
    expect(await table.getByRole('row', { name: /^at 1000 .* 0\.0123$/ }).count()).toBe(1);
    await screenshot(page, 'prices-theirs-and-mine');
    await button('Take theirs').click();
    await table.waitFor({ state: 'detached' });
    await expect.poll(() => button(/^Save/).isDisabled()).toBe(true);
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
