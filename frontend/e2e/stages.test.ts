import type { Page } from 'playwright-core';
import { afterEach, describe, expect, it } from 'vitest';
import { DESKTOP, openBrowser, PHONE, visit, type Visit } from './support/browser';
import { screenshot } from './support/screenshot';
import { signIn } from './support/session';

const browser = openBrowser();
let open: Visit;
let page: Page;

afterEach(async () => {
  const { problems, close } = open;
  await close();
  expect(problems).toEqual([]);
});

const answer = () => page.locator('#answer h1');
const says = (text: RegExp | string) => answer().filter({ hasText: text }).waitFor();
const field = (label: string) => page.getByLabel(label, { exact: true });
const rows = (label: string) =>
  page.getByRole('region', { name: label, exact: true }).locator('[row-id]:not([row-id="floor"])');

async function start(path: string, options: Parameters<typeof visit>[1] = {}) {
  open = await visit(browser(), options);
  page = open.page;
  await signIn(page, 'engineer', path);
  await answer().waitFor();
}

async function commit(label: string, text: string) {
  await field(label).fill(text);
  await field(label).press('Enter');
}

describe('whole stages', () => {
  it('are found, selected and searched otherwise, and the address keeps it all', async () => {
    await start('/rank');
    await page.getByText('Whole stages', { exact: true }).click();
    await says(/^Quietest is .+ with [\d.]+\sΩ and [\d.]+\s.?Ω: .+ rms/);
    await rows('Whole stages').first().waitFor();
    await screenshot(page, 'stages');
    expect(await page.evaluate(() => document.documentElement.scrollHeight)).toBe(DESKTOP.height);
    const budget = () => page.getByRole('region', { name: /^Noise budget of/ }).getAttribute('aria-label');
    const ofLeader = await budget();
    await rows('Whole stages').nth(3).click();
    await expect.poll(budget).not.toBe(ofLeader);
    const chosen = await budget();
    const before = await answer().textContent();
    await commit('output drives at least', '20k');
    await expect.poll(() => answer().textContent()).not.toBe(before);
    const after = await answer().textContent();
    await page.reload();
    await expect.poll(() => answer().textContent()).toBe(after);
    await expect.poll(budget).toBe(chosen);
  });

  it('say which gain is nearest where no pair gives the wanted one, and what is then enough', async () => {
    await start('/rank?stage=non-inverting&gain=123.456&view=stages&gtol=0');
    await says('No resistor pair gives a gain of 123.456.');
    const advice = (await page.locator('#answer').textContent())!;
    const enough = /widen the tolerance to ([\d.]+)\s%/.exec(advice)![1];
    await screenshot(page, 'stages-no-gain');
    await commit('gain tolerance', `${enough} %`);
    await page
      .getByText(/^Quietest is /)
      .first()
      .waitFor();
    await page.goBack();
    await says('No resistor pair gives a gain of 123.456.');
  });

  it('have no network in a follower and one resistor in a transimpedance stage', async () => {
    await start('/rank?stage=follower&view=stages');
    expect(await page.locator('#answer').textContent()).toContain('without a network');
    await page.goto('/rank?stage=transimpedance&view=stages');
    await says(/^Quietest is .+ with 1\sMΩ: /);
  });
});

describe('whole stages by price', () => {
  it('are drawn with their frontier, selected there, and handed to the schematic', async () => {
    await start('/rank?stage=non-inverting&view=stages&qty=100&vout=2&within=3dB');
    await page.getByLabel('sorted by').selectOption('price');
    await says(/^Cheapest within 3\sdB of the quietest is .+ with .+: €[\d.]+, /);
    await page.getByRole('tab', { name: 'Price' }).click();
    const chart = page.getByRole('application', { name: /^Noise against price/ });
    await page.getByText(/at 100, .+ rms, on the frontier$/).waitFor();
    await screenshot(page, 'stages-by-price');
    await chart.focus();
    for (let step = 0; step < 3; step++) await chart.press('ArrowLeft');
    const told = await page
      .getByText(/ with .+ at 100, .+ rms/)
      .last()
      .textContent();
    const resistance = / with ([\d.]+\s.?Ω) and /.exec(told!)![1].replace(/\s/, ' ');
    await chart.press('Enter');
    await page.waitForURL(/[?&]part=\d+\.1\.\d+\.\d+/);
    const parts = page.getByRole('region', { name: /^Parts of the stage with/ });
    await parts.getByRole('rowheader', { name: new RegExp(`^${resistance} `) }).waitFor();
    await page.getByRole('button', { name: 'Take this network into the schematic' }).click();
    await says(/^Quietest is [^:]+: [\d.]+\s.V rms/);
    expect((await field('gain resistance').inputValue()).replace(/\s/, ' ')).toBe(resistance);
    expect(await field('noise index of the gain resistors').inputValue()).toMatch(/dB$/);
    await page.goBack();
    await says(/^Cheapest within 3\sdB/);
    await page.waitForURL(/[?&]part=\d+\.1\.\d+\.\d+/);
  });

  it('count only resistors of the technologies that are chosen', async () => {
    await start('/rank?stage=non-inverting&view=stages&by=unitPrice&within=3dB&qty=100');
    await says(/^Cheapest within/);
    const before = await answer().textContent();
    await page.getByRole('button', { name: /^technology of the resistors/ }).click();
    await page.getByRole('checkbox', { name: 'metal film' }).click();
    await expect.poll(() => answer().textContent()).not.toBe(before);
    await rows('Whole stages').filter({ hasText: 'OD-MM-' }).first().waitFor();
    expect(await rows('Whole stages').filter({ hasText: 'OD-C0' }).count()).toBe(0);
  });
});

describe('op-amps by noise and price', () => {
  it('are picked from the chart, which can be saved', async () => {
    await start('/rank?stage=non-inverting&qty=100');
    await page.getByRole('tab', { name: 'Price' }).click();
    const chart = page.getByRole('application', { name: /^Noise against price/ });
    await chart.waitFor();
    await screenshot(page, 'op-amps-by-price');
    const budget = () => page.getByRole('region', { name: /^Noise budget of/ }).getAttribute('aria-label');
    const ofLeader = await budget();
    await chart.click({ position: { x: 20, y: 20 } });
    await expect.poll(budget).not.toBe(ofLeader);
    const [download] = await Promise.all([
      page.waitForEvent('download'),
      (async () => {
        await page.getByRole('button', { name: /^Save the chart “Noise against price”/ }).click();
        await page.getByRole('menuitem', { name: 'as CSV' }).click();
      })(),
    ]);
    expect(download.suggestedFilename()).toBe('noise-against-price.csv');
  });
});

describe('resistors', () => {
  it('are ranked for the schematic’s place, and those over their rating are left out', async () => {
    await start('/rank?stage=non-inverting&rg=100&view=resistors&vr=2');
    await page.getByRole('button', { name: /^as R\s?g$/ }).click();
    await page.waitForURL(/[?&]r=100(&|$)/);
    await rows('Resistors').first().waitFor();
    await page.getByText(/resistors lie within 2\s% of 100\sΩ/).waitFor();
    await screenshot(page, 'resistors');
    await commit('direct voltage', '10 V');
    await page.getByRole('button', { name: /left out$/ }).click();
    await page
      .getByText(/would dissipate 1(\.\d+)?\sW/)
      .first()
      .waitFor();
    await page.getByRole('link').filter({ hasText: /-100R/ }).first().click();
    await page.waitForURL(/\/parts\/resistors\/\d+$/);
  });

  it('fit a phone', async () => {
    await start('/rank?stage=non-inverting&view=resistors&vr=2', { viewport: PHONE });
    await rows('Resistors').first().waitFor();
    expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBe(PHONE.width);
    const number = rows('Resistors').first().getByRole('link');
    expect(await number.evaluate((link) => link.scrollWidth <= link.clientWidth)).toBe(true);
  });
});
