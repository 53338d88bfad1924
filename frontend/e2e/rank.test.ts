import { readFile } from 'node:fs/promises';
import type { Page } from 'playwright-core';
import { beforeEach, describe, expect, it } from 'vitest';
import { DESKTOP, openBrowser, PHONE, visit, type Visit } from './support/browser';
import { screenshot } from './support/screenshot';
import { signIn } from './support/session';

const browser = openBrowser();
let open: Visit;
let page: Page;

const answer = () => page.locator('#answer h1');
const field = (label: string) => page.getByLabel(label, { exact: true });
const rows = () => page.locator('#ranking [row-id]:not([row-id="floor"])');

async function start(options: Parameters<typeof visit>[1] = {}, path = '/rank') {
  open = await visit(browser(), options);
  page = open.page;
  await signIn(page, 'engineer', path);
  await answer().waitFor();
  await rows().first().waitFor();
}

async function end() {
  const { problems, close } = open;
  await close();
  expect(problems).toEqual([]);
}

describe('the rank page on a desktop', () => {
  beforeEach(async () => {
    await start();
    return end;
  });

  it('shows the answer, the ranking and both charts without scrolling', async () => {
    expect(await answer().textContent()).toMatch(/^Quietest is .+: [\d.]+\snV rms, [\d.]+\sdB above what/);
    for (const shown of [
      answer(),
      rows().first(),
      page.getByRole('img', { name: /^Noise over source resistance/ }),
      page.getByRole('img', { name: /^Density over frequency/ }),
      page.getByRole('region', { name: /^Noise budget of/ }).getByRole('table'),
      page.getByRole('button', { name: /left out$/ }),
    ]) {
      const box = (await shown.boundingBox())!;
      expect(box.y).toBeGreaterThanOrEqual(0);
      expect(box.y + box.height).toBeLessThanOrEqual(DESKTOP.height);
    }
    expect(await page.evaluate(() => document.documentElement.scrollHeight)).toBe(DESKTOP.height);
    await screenshot(page, 'rank');
  });

  it('ranks again when a value of the schematic is changed, and back undoes it', async () => {
    const before = await answer().textContent();
    await field('source resistance').fill('47k');
    await field('source resistance').press('Enter');
    await expect.poll(() => answer().textContent()).not.toBe(before);
    expect(page.url()).toContain('rs=47k');
    expect(await field('source resistance').inputValue()).toBe('47 kΩ');
    await page.goBack();
    await expect.poll(() => answer().textContent()).toBe(before);
    expect(await field('source resistance').inputValue()).toBe('375 Ω');
  });

  it('gives a colleague who gets the address the same view', async () => {
    const before = await answer().textContent();
    await field('source resistance').fill('4k7');
    await field('source resistance').press('Enter');
    await page.waitForURL(/rs=4\.7k/);
    await expect.poll(() => answer().textContent()).not.toBe(before);
    const chosen = await rows().nth(2).locator('strong').textContent();
    const budget = page.getByRole('region', { name: `Noise budget of ${chosen}`, exact: true });
    await rows().nth(2).click();
    await budget.waitFor();
    await page.goto(page.url());
    await budget.waitFor();
    expect(await field('source resistance').inputValue()).toBe('4.7 kΩ');
  });

  it('says at the field what is wrong and keeps the last good ranking', async () => {
    const before = await answer().textContent();
    await field('source resistance').fill('plenty');
    await field('source resistance').press('Enter');
    await page.getByText('“plenty” is not a resistance').waitFor();
    await page
      .getByText(/ranking from before: mend “source resistance”/)
      .last()
      .waitFor();
    expect(await answer().textContent()).toBe(before);
    expect(await rows().count()).toBeGreaterThan(3);
    await screenshot(page, 'rank-refused');
    await field('source resistance').press('Escape');
    await page.getByText('“plenty” is not a resistance').waitFor({ state: 'detached' });
  });

  it('folds out what is left out, with reasons', async () => {
    await page.getByRole('button', { name: /left out$/ }).click();
    const parts = page.getByRole('region', { name: 'Parts left out' });
    await parts
      .getByText(/the stage is supplied with 5\sV to 10\sV/)
      .first()
      .waitFor();
    expect(await parts.getByRole('row').count()).toBeGreaterThan(20);
    await screenshot(page, 'rank-left-out');
  });

  it('says what to change where nothing is left to rank', async () => {
    await field('channels, at least').fill('16');
    await field('channels, at least').press('Enter');
    await page.getByRole('heading', { name: 'No part is ranked.' }).waitFor();
    await page.getByText(/All \d+ parts are left out/).waitFor();
    await screenshot(page, 'rank-nothing');
  });

  it('loads the rest of a long ranking while it is scrolled', async () => {
    await page.getByRole('button', { name: /both libraries/ }).waitFor();
    await page.goto('/rank?stage=non-inverting');
    await rows().first().waitFor();
    const last = () => rows().last().getAttribute('aria-rowindex').then(Number);
    await rows().nth(4).hover();
    await expect
      .poll(async () => {
        await page.mouse.wheel(0, 4000);
        return last();
      })
      .toBeGreaterThan(110);
  });

  it.each(['CSV', 'SVG', 'PNG'] as const)('saves a chart as %s', async (format) => {
    await page.getByRole('button', { name: 'Save the chart “Noise over source resistance”' }).click();
    const [download] = await Promise.all([
      page.waitForEvent('download'),
      page.getByRole('menuitem', { name: `as ${format}` }).click(),
    ]);
    expect(download.suggestedFilename()).toBe(`noise-over-source-resistance.${format.toLowerCase()}`);
    const content = await readFile(await download.path());
    const checks = {
      CSV: () =>
        expect(content.toString()).toMatch(/^source resistance \(Ω\),source floor \(V\),.+\r\n1,[\d.e-]+,/),
      SVG: () => expect(content.toString()).toMatch(/^<svg[^>]*>[\s\S]+<path/),
      PNG: () => expect(content.subarray(1, 4).toString()).toBe('PNG'),
    };
    checks[format]();
    expect(content.length).toBeGreaterThan(2000);
  });

  it('works by keyboard alone', async () => {
    await page.keyboard.press('?');
    await page.getByRole('dialog', { name: 'Keyboard' }).waitFor();
    await page.keyboard.press('Escape');
    await page.getByRole('dialog', { name: 'Keyboard' }).waitFor({ state: 'hidden' });
    const before = await answer().textContent();
    await page.keyboard.press('g');
    await page.keyboard.press('s');
    await page.keyboard.type('2k2');
    await page.keyboard.press('Enter');
    await page.waitForURL(/rs=2\.2k/);
    await expect.poll(() => answer().textContent()).not.toBe(before);
    await page.keyboard.press('Tab');
    expect(await page.evaluate(() => document.activeElement?.getAttribute('aria-label'))).toBe(
      'source capacitance',
    );
    await field('source capacitance').blur();
    await page.keyboard.press('g');
    await page.keyboard.press('r');
    const selected = page.locator('#ranking [aria-selected="true"]').first();
    const chosen = Number(await selected.getAttribute('row-index'));
    await page.keyboard.press('ArrowDown');
    await expect.poll(() => selected.getAttribute('row-index')).toBe(String(chosen + 1));
    await page.keyboard.press('/');
    await page.keyboard.type('vr-1');
    await expect.poll(() => page.url()).toContain('q=vr-1');
    await expect.poll(() => rows().first().textContent()).toContain('VR-1');
    await field('parts that contain').blur();
    await page.keyboard.press('g');
    await page.keyboard.press('p');
    await page.keyboard.press('ArrowRight');
    await page.keyboard.press('Enter');
    await page.getByRole('tab', { name: 'Frequency', selected: true }).waitFor();
  });
});

describe('the rank page elsewhere', () => {
  it('stacks its parts on a phone and keeps the answer in sight', async () => {
    await start({ viewport: PHONE });
    expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBe(PHONE.width);
    const brief = page.locator('a[href="#answer"]');
    await page.getByText('Quantity').scrollIntoViewIfNeeded();
    expect((await brief.boundingBox())!.y).toBeGreaterThanOrEqual(0);
    await page.getByRole('img', { name: /^Density over frequency/ }).scrollIntoViewIfNeeded();
    await page.evaluate(() => window.scrollTo(0, 0));
    await screenshot(page, 'rank-phone');
    await end();
  });

  it('is readable in the dark', async () => {
    await start({ colorScheme: 'dark' });
    expect(await page.evaluate(() => getComputedStyle(document.documentElement).backgroundColor)).toBe(
      'rgb(23, 24, 27)',
    );
    await screenshot(page, 'rank-dark');
    await end();
  });

  it('holds long names without breaking its columns', async () => {
    open = await visit(browser());
    page = open.page;
    await page.route('**/api/rankings/op-amps', async (route) => {
      const response = await route.fetch();
      const ranking = await response.json();
      for (const { part } of ranking.items) {
        part.partNumber = `${part.partNumber}-<b>EXTENDED</b>-TEMPERATURE-RANGE-TAPE-AND-REEL`;
        part.manufacturer = 'The Tarnfield Associated Semiconductor Manufactory & Sons';
      }
      await route.fulfill({ response, json: ranking });
    });
    await signIn(page, 'engineer', '/rank');
    await rows().first().waitFor();
    expect(await answer().textContent()).toContain('<b>EXTENDED</b>');
    expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBe(DESKTOP.width);
    await screenshot(page, 'rank-long-names');
    await end();
  });
});
