import { describe, expect, it } from 'vitest';
import { openBrowser, PHONE, visit } from './support/browser';
import { screenshot } from './support/screenshot';
import { emailOf, signIn } from './support/session';

const browser = openBrowser();

describe('the session', () => {
  it('leads through the sign-in to the page that was asked for, and ends with the sign-out', async () => {
    const { page, problems, close } = await visit(browser());
    await page.goto('/account');
    await page.getByRole('heading', { name: 'Sign in' }).waitFor();
    await screenshot(page, 'sign-in');
    await signIn(page, 'engineer', '/account');
    expect(new URL(page.url()).pathname).toBe('/account');
    await page.getByRole('list', { name: 'Account' }).getByText(emailOf('engineer')).waitFor();
    await screenshot(page, 'account');
    await page.getByRole('button', { name: 'Sign out' }).click();
    await page.getByRole('heading', { name: 'Sign in' }).waitFor();
    await page.goto('/parts');
    await page.getByRole('heading', { name: 'Sign in' }).waitFor();
    expect(problems).toEqual([]);
    await close();
  });

  it('refuses a wrong password at the form, by keyboard alone', async () => {
    const { page, problems, close } = await visit(browser());
    await page.goto('/sign-in');
    await page.getByLabel('E-mail').waitFor();
    await page.keyboard.type('nobody@tarnfield.example');
    await page.keyboard.press('Tab');
    await page.keyboard.type('wrong');
    await page.keyboard.press('Enter');
    await page.getByText('E-mail and password don’t match an account').waitFor();
    await screenshot(page, 'sign-in-refused');
    expect(problems).toEqual([]);
    await close();
  });

  it('keeps the chosen theme over a reload', async () => {
    const { page, problems, close } = await visit(browser());
    await signIn(page, 'reviewer', '/account');
    await page.getByRole('radio', { name: 'Dark' }).check();
    await page.reload();
    await page.getByRole('radio', { name: 'Dark', checked: true }).waitFor();
    const paper = await page.evaluate(() => getComputedStyle(document.documentElement).backgroundColor);
    expect(paper).toBe('rgb(23, 24, 27)');
    await screenshot(page, 'account-dark');
    expect(problems).toEqual([]);
    await close();
  });

  it('puts the rail on top of a narrow screen without anything running out of it', async () => {
    const { page, problems, close } = await visit(browser(), { viewport: PHONE });
    await signIn(page, 'engineer', '/account');
    const width = await page.evaluate(() => document.documentElement.scrollWidth);
    expect(width).toBeLessThanOrEqual(PHONE.width);
    await screenshot(page, 'account-narrow');
    expect(problems).toEqual([]);
    await close();
  });

  it('skips to the page by keyboard', async () => {
    const { page, problems, close } = await visit(browser());
    await signIn(page, 'engineer', '/account');
    await page.reload();
    await page.getByRole('heading', { level: 1 }).waitFor();
    await page.keyboard.press('Tab');
    await page.keyboard.press('Enter');
    expect(await page.evaluate(() => document.activeElement?.id)).toBe('main');
    expect(problems).toEqual([]);
    await close();
  });
});
