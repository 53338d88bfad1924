import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { BASE_URL, launchBrowser, visit } from './support/browser';
import { mailTo, pathIn } from './support/mail';
import { screenshot } from './support/screenshot';
import { signIn } from './support/session';

let browser: Browser;
beforeAll(async () => {
  browser = await launchBrowser();
});
afterAll(() => browser.close());

const PASSWORD = 'still water runs deep';

async function post(path: string, body: object): Promise<void> {
  const headers = { 'Content-Type': 'application/json' };
  const { status } = await fetch(`${BASE_URL}${path}`, {
    method: 'POST',
    headers,
    body: JSON.stringify(body),
  });
  expect(status).toBe(204);
}

/** Signs a new team up, confirms its admin's address, and shows them their plan. */
async function openNewTeam(page: Page): Promise<void> {
  const email = `plan.${Date.now().toString(36)}@weir.example`;
  await post('/api/auth/sign-up', {
    name: 'Ottilie Weir',
    email,
    password: PASSWORD,
    teamName: 'Weir & Daughters',
  });
  const token = pathIn(await mailTo(email))
    .split('/')
    .at(-1);
  await post('/api/auth/confirm', { token });
  await page.goto('/sign-in?next=/team/plan');
  await page.getByLabel('E-mail').fill(email);
  await page.getByLabel('Password', { exact: true }).fill(PASSWORD);
  await page.getByRole('button', { name: 'Sign in' }).click();
}

/** Lets time pass at the stand-in of the payment service, whose page is at an address. */
async function letPass(page: Page, address: string, span: string): Promise<void> {
  await page.goto(new URL('/', address).href);
  const answered = page.waitForResponse(/\/control\/clock$/);
  await page.getByRole('button', { name: `Let ${span} pass` }).click();
  await answered;
}

const shows = (page: Page, headline: string | RegExp) =>
  page.getByRole('heading', { level: 1, name: headline }).waitFor();

describe('the plan', () => {
  it('is tried without a card, paid for after a card was declined, and cancelled', async () => {
    const { page, problems, close } = await visit(browser);
    await openNewTeam(page);
    await shows(page, 'Free plan');
    await page.goto('/parts');
    await page.getByRole('heading', { level: 1, name: 'Parts' }).waitFor();
    expect(await page.getByRole('link', { name: 'New op-amp' }).count()).toBe(0);

    await page.goto('/team/plan');
    await page.getByRole('button', { name: 'Start the trial' }).click();
    await shows(page, 'Team plan on trial: 14 days left');
    await screenshot(page, 'plan-trial');
    await page.getByLabel('Seats', { exact: true }).fill('3');
    await page.getByText('€57.00 a month').waitFor();
    await page.getByRole('button', { name: 'Go to payment' }).click();

    await page.getByText('Local stand-in for the payment service.').waitFor();
    await page.getByLabel('A card that is declined').check();
    await page.getByRole('button', { name: 'Pay 57.00 EUR' }).click();
    await page.getByText('Your card was declined. Nothing was charged.').waitFor();
    await screenshot(page, 'plan-declined');
    await page.getByLabel('A card that pays', { exact: true }).check();
    await page.getByRole('button', { name: 'Pay 57.00 EUR' }).click();
    await shows(page, 'Team plan, 3 seats');
    await page.getByText('1 of 3 taken').waitFor();
    await page.getByRole('table', { name: 'Invoices' }).getByText('€57.00').waitFor();
    await page.getByRole('link', { name: 'Parts' }).click();
    await page.getByRole('link', { name: 'New op-amp' }).waitFor();

    await page.goto('/team/plan');
    await page.getByRole('button', { name: 'Card and cancellation' }).click();
    await page.getByRole('button', { name: 'Cancel now' }).click();
    await page.getByText('There is no running subscription.').waitFor();
    await page.getByRole('link', { name: 'Back to the application' }).click();
    await shows(page, 'Read-only: the plan is cancelled');
    await page.getByRole('link', { name: 'Parts' }).click();
    await page.getByText('Read-only, for the plan is cancelled').waitFor();
    expect(await page.getByRole('link', { name: 'New op-amp' }).count()).toBe(0);
    expect(problems).toEqual([]);
    await close();
  });
  it('is past due for two weeks when a card fails, then read-only until it is paid', async () => {
    const { page, problems, close } = await visit(browser, { expected: [402] });
    await openNewTeam(page);
    await page.getByRole('button', { name: 'Go to payment' }).click();
    await page.getByLabel('A card that pays once').check();
    await page.getByRole('button', { name: /^Pay / }).click();
    await shows(page, 'Team plan, one seat');
    await page.getByRole('button', { name: 'Card and cancellation' }).click();
    await page.getByRole('heading', { name: 'Your subscription' }).waitFor();
    const portal = page.url();

    await letPass(page, portal, '31 days');
    await page.goto('/team/plan?from=portal');
    await shows(page, 'Team plan: a payment is missing');
    await page.getByRole('link', { name: 'Parts' }).click();
    await page
      .getByText(/A payment for the team’s plan is missing: the team is read-only in \d+ days/)
      .waitFor();
    await page.getByRole('link', { name: 'New op-amp' }).waitFor();
    await screenshot(page, 'plan-past-due');

    await letPass(page, portal, '15 days');
    await page.goto('/team/plan?from=portal');
    await shows(page, 'Read-only: a payment is missing');
    await page.goto('/parts/new');
    await page.getByText('Your team is read-only now').waitFor();
    await screenshot(page, 'plan-read-only');

    await page.goto(portal);
    await page.getByLabel('A card that pays', { exact: true }).check();
    await page.getByRole('button', { name: 'Use this card, and pay what is open' }).click();
    await page.getByRole('link', { name: 'Back to the application' }).click();
    await shows(page, 'Team plan, one seat');
    expect(problems).toEqual([]);
    await close();
  });

  it('gets another seat for what was said before', async () => {
    const { page, problems, close } = await visit(browser);
    await signIn(page, 'admin', '/team/plan');
    await shows(page, /^Team plan, \d+ seats/);
    const seats = Number(await page.getByLabel('Seats', { exact: true }).inputValue());
    await page.getByLabel('Seats', { exact: true }).fill(String(seats + 1));
    const said = page.getByText(/now for the rest of this month/);
    const [dueNow] = /€[\d.]+/.exec(String(await said.textContent())) ?? [];
    await screenshot(page, 'plan-seats');
    await page.getByRole('button', { name: `Change to ${seats + 1} seats` }).click();
    await shows(page, `Team plan, ${seats + 1} seats`);
    const newest = page.getByRole('table', { name: 'Invoices' }).getByRole('row').nth(1);
    await newest.getByText(String(dueNow)).waitFor();
    expect(problems).toEqual([]);
    await close();
  });
});
