import type { Role } from '@roothertz/common/access';
import type { Page } from 'playwright-core';

export const PASSWORD = 'quiet-bench-2026';

export function emailOf(role: Role): string {
  return `${role}@tarnfield.example`;
}

/** Signs a demo account in through the form, and waits until the asked page is shown. */
export async function signIn(page: Page, role: Role, path = '/parts'): Promise<void> {
  await page.goto(`/sign-in?next=${encodeURIComponent(path)}`);
  await page.getByLabel('E-mail').fill(emailOf(role));
  await page.getByLabel('Password', { exact: true }).fill(PASSWORD);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await page.getByRole('navigation', { name: 'Pages' }).waitFor();
}
