import { readFile } from 'node:fs/promises';
import type { Page } from 'playwright-core';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { openBrowser, visit, type Visit } from './support/browser';
import { screenshot } from './support/screenshot';
import { signIn } from './support/session';

const browser = openBrowser();
let open: Visit;
let page: Page;

beforeEach(async () => {
  open = await visit(browser(), { acceptDownloads: true });
  page = open.page;
  await signIn(page, 'engineer', '/rank');
  await page.locator('#answer h1').waitFor();
});

afterEach(async () => {
  const { problems, close } = open;
  await close();
  expect(problems).toEqual([]);
});

const map = () => page.getByRole('application', { name: /^Quietest map/ });

async function saved(format: string): Promise<string> {
  await page.getByRole('button', { name: 'Save the chart “Quietest map”' }).click();
  const [download] = await Promise.all([
    page.waitForEvent('download'),
    page.getByRole('menuitem', { name: `as ${format}` }).click(),
  ]);
  return readFile(await download.path(), format === 'PNG' ? 'latin1' : 'utf8');
}

describe('the quietest map', () => {
  beforeEach(async () => {
    await page.getByRole('tab', { name: 'Quietest map' }).click();
    await map().waitFor();
  });

  it('tells what is quietest under the pointer, and a click moves the conditions there', async () => {
    await screenshot(page, 'map');
    const box = (await map().boundingBox())!;
    const place = { x: box.width * 0.7, y: box.height * 0.5 };
    await map().hover({ position: place });
    const told = (await page.getByText(/^[\d.]+\s.?Ω, [\d.]+\s.?Hz: /).textContent())!;
    const [, resistance] = /^([\d.]+\s.?Ω), /.exec(told)!;
    await map().click({ position: place });
    const field = page.getByLabel('source resistance', { exact: true });
    await expect
      .poll(async () => (await field.inputValue()).replace(/\s/, ' '))
      .toBe(resistance.replace(/\s/, ' '));
    await page.goBack();
    await expect.poll(() => field.inputValue()).toBe('375 Ω');
  });

  it('is walked with the arrow keys', async () => {
    await map().focus();
    for (const key of ['ArrowRight', 'ArrowRight', 'ArrowRight', 'ArrowUp', 'Enter'])
      await page.keyboard.press(key);
    await page.waitForURL(/rs=1\.6k/);
    await page.getByText(/^Present conditions, 1\.6\skΩ, 56\sHz: /).waitFor();
  });

  it('is saved as picture, drawing and figures', async () => {
    expect((await saved('PNG')).slice(1, 4)).toBe('PNG');
    const svg = await saved('SVG');
    expect(svg).toMatch(/^<svg[^>]*><rect[^>]*fill="#/);
    expect(svg.includes('@font-face')).toBe(true);
    expect(svg).not.toContain('var(');
    const lines = (await saved('CSV')).split('\r\n');
    expect(lines).toHaveLength(1 + 36 * 33 + 1);
    expect(lines[0]).toContain('quietest part');
  });
});

describe('the levers', () => {
  it('are tried by a click, and back undoes it', async () => {
    const lever = page
      .getByRole('region', { name: /^Levers for/ })
      .getByRole('button')
      .first();
    const box = (await lever.boundingBox())!;
    expect(box.y + box.height).toBeLessThan(900);
    await lever.hover();
    await page.getByRole('tooltip').waitFor();
    const before = await page.locator('#answer h1').textContent();
    const address = page.url();
    await lever.click();
    await expect.poll(() => page.locator('#answer h1').textContent()).not.toBe(before);
    await page.goBack();
    await expect.poll(() => page.locator('#answer h1').textContent()).toBe(before);
    expect(page.url()).toBe(address);
  });
});
