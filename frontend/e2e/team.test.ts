import type { Page } from 'playwright-core';
import { describe, expect, it } from 'vitest';
import { openBrowser, PHONE, visit } from './support/browser';
import { mailTo, pathIn } from './support/mail';
import { screenshot } from './support/screenshot';
import { signIn } from './support/session';

const browser = openBrowser();

async function invite(page: Page, email: string): Promise<void> {
  await page.getByLabel('E-mail').fill(email);
  await page.getByRole('button', { name: 'Send invitation' }).click();
  await page.getByText(`An invitation is on its way to ${email}.`).waitFor();
}

describe('the team', () => {
  it('invites a colleague by e-mail, who joins, gets a role and is removed again', async () => {
    const email = `nell.${Date.now().toString(36)}@weir.example`;
    const { page, problems, close } = await visit(browser());
    await signIn(page, 'admin', '/team');
    await invite(page, email);
    await page.getByRole('region', { name: 'Open invitations' }).getByText(email).waitFor();
    await screenshot(page, 'team');

    const guest = await visit(browser(), { expected: [409] });
    const path = pathIn(await mailTo(email));
    await guest.page.goto(path);
    await guest.page.getByLabel('Your name').fill('Nell Weir');
    await guest.page.getByLabel('Password').fill('still water runs deep');
    await screenshot(guest.page, 'invitation');
    await guest.page.getByRole('button', { name: 'Make the account and join' }).click();
    await guest.page.getByRole('navigation', { name: 'Pages' }).waitFor();
    expect(await guest.page.getByRole('link', { name: 'Import' }).count()).toBe(0);

    await page.reload();
    const row = page.getByRole('row', { name: new RegExp(email) });
    await row.getByText('Nell Weir').waitFor();
    await page.getByLabel('Roles of Nell Weir').click();
    await page.getByTitle('librarian', { exact: true }).last().click();
    await page.getByText('Nell Weir is now librarian, engineer').waitFor();
    await page.keyboard.press('Escape');
    await guest.page.goto('/imports');
    await guest.page.getByRole('navigation').getByRole('link', { name: 'Import' }).waitFor();

    await page.getByRole('button', { name: 'Remove Nell Weir' }).click();
    await page.getByRole('button', { name: 'Remove', exact: true }).click();
    await row.waitFor({ state: 'detached' });
    await guest.page.goto('/parts');
    await guest.page.getByRole('heading', { name: 'Sign in' }).waitFor();
    await guest.page.goto(path);
    await guest.page.getByText('This invitation has been accepted already').waitFor();

    await page.getByRole('link', { name: 'Audit trail' }).click();
    await page
      .getByRole('row', { name: /Ingrid Marlowe removed Nell Weir/ })
      .first()
      .waitFor();
    await page
      .getByRole('row', { name: /Nell Weir joined the team/ })
      .first()
      .waitFor();
    await screenshot(page, 'trail');
    expect([...problems, ...guest.problems]).toEqual([]);
    await guest.close();
    await close();
  });

  it('shows the others who is in it, on a narrow screen too', async () => {
    const { page, problems, close } = await visit(browser(), { viewport: PHONE });
    await signIn(page, 'engineer', '/team');
    await page.getByRole('row', { name: /Ingrid Marlowe.*team admin/ }).waitFor();
    expect(await page.getByRole('button', { name: 'Send invitation' }).count()).toBe(0);
    expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBeLessThanOrEqual(PHONE.width);
    await screenshot(page, 'team-narrow');
    await page.goto('/team/trail');
    await page.getByText('admins see who did what').waitFor();
    expect(problems).toEqual([]);
    await close();
  });
});
