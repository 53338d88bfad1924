import { describe, expect, it } from 'vitest';
import { openBrowser, PHONE, visit } from './support/browser';
import { mailTo, pathIn } from './support/mail';
import { screenshot } from './support/screenshot';

const PASSWORD = 'four quiet brown owls';
const NEW_PASSWORD = 'five quiet brown owls';

const browser = openBrowser();

describe('an account of one’s own', () => {
  it('is signed up for, confirmed by e-mail, given a new password, and ended in another browser', async () => {
    const { page, problems, close } = await visit(browser(), { expected: [400, 410] });
    const email = `nell.${Date.now()}@weir.example`;
    const signIn = async (password: string) => {
      await page.goto('/sign-in?next=/account');
      await page.getByLabel('E-mail').fill(email);
      await page.getByLabel('Password', { exact: true }).fill(password);
      await page.keyboard.press('Enter');
    };

    await page.goto('/sign-in');
    await page.getByRole('link', { name: 'Sign up' }).click();
    await page.getByLabel('Your name').fill('Nell Weir');
    await page.getByLabel('E-mail').fill(email);
    await page.getByLabel('Password', { exact: true }).fill('leavemealone');
    await page.getByLabel('Your team’s name').fill('Weir & Daughter');
    await page.keyboard.press('Enter');
    await page.getByText('everybody tries first').waitFor();
    await screenshot(page, 'sign-up');
    await page.getByLabel('Password', { exact: true }).fill(PASSWORD);
    await page.keyboard.press('Enter');
    await page.getByRole('heading', { name: 'Check your mail' }).waitFor();
    await screenshot(page, 'check-your-mail');

    const confirmation = pathIn(await mailTo(email));
    await page.goto(confirmation);
    await page.getByRole('button', { name: 'Confirm the address' }).click();
    await page.getByText('The address is confirmed').waitFor();
    await page.goto(confirmation);
    await page.getByRole('alert').getByText('has been used').waitFor();

    await page.goto('/reset-password');
    await page.getByLabel('E-mail').fill(email);
    await page.keyboard.press('Enter');
    await page.getByRole('heading', { name: 'Check your mail' }).waitFor();
    await expect
      .poll(async () => pathIn(await mailTo(email)), { timeout: 30_000 })
      .toMatch(/^\/reset-password\//);
    await page.goto(pathIn(await mailTo(email)));
    await page.getByRole('textbox', { name: 'New password' }).fill(NEW_PASSWORD);
    await page.keyboard.press('Enter');
    await page.getByText('Your password is set').waitFor();

    await signIn(PASSWORD);
    await page.getByText('don’t match an account').waitFor();
    await signIn(NEW_PASSWORD);
    await page.getByRole('heading', { name: 'Nell Weir' }).waitFor();

    const phone = await visit(browser(), { viewport: PHONE });
    await phone.page.goto('/sign-in?next=/account');
    await phone.page.getByLabel('E-mail').fill(email);
    await phone.page.getByLabel('Password', { exact: true }).fill(NEW_PASSWORD);
    await phone.page.keyboard.press('Enter');
    await phone.page.getByRole('heading', { name: 'Nell Weir' }).waitFor();
    await page.reload();
    await page.getByRole('button', { name: 'End all others' }).click();
    await page.getByRole('button', { name: 'End all others' }).waitFor({ state: 'hidden' });
    await screenshot(page, 'account-of-ones-own');
    await phone.page.getByRole('button', { name: 'Change: Name' }).click();
    await phone.page.getByLabel('Your name').fill('Nell the Second');
    await phone.page.keyboard.press('Enter');
    const again = phone.page.getByRole('dialog', { name: 'Your session is over' });
    await again.locator('input[type=password]:focus').waitFor();
    await screenshot(phone.page, 'session-over-narrow');
    expect([...problems, ...phone.problems]).toEqual([]);
    await phone.close();
    await close();
  });
});
