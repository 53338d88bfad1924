import type { Page } from 'playwright-core';
import { describe, expect, it } from 'vitest';
import { openBrowser, visit, type Visit } from './support/browser';
import { signIn } from './support/session';

const browser = openBrowser();
let open: Visit;
let page: Page;

const heading = (name: string) => page.getByRole('heading', { name, exact: true });

async function choose(action: string) {
  await page.getByRole('button', { name: /named conditions$/ }).click();
  await page.getByRole('menuitem', { name: action, exact: true }).click();
}

async function giveName(name: string) {
  await page.getByLabel('Name of the conditions').fill(name);
  await page.keyboard.press('Enter');
}

describe('named conditions', () => {
  it('are saved, changed, renamed, deleted and brought back', async () => {
    open = await visit(browser(), { expected: [409] });
    page = open.page;
    await signIn(page, 'engineer', '/rank?stage=non-inverting&rs=1.5k');
    await heading('Conditions without a name').waitFor();
    const [first, second] = [`Journey ${Date.now()}`, `Journey ${Date.now()} renamed`];

    await choose('Save as…');
    await giveName('River geophone');
    await page.getByText(/conditions of this name already/).waitFor();
    await giveName(first);
    await heading(first).waitFor();

    await page.getByLabel('gain', { exact: true }).fill('37');
    await page.keyboard.press('Enter');
    await page.getByRole('button', { name: /^changed/ }).waitFor();
    await choose('Save the changes');
    await page.getByRole('button', { name: /^saved/ }).waitFor();

    await choose('Rename…');
    await giveName(second);
    await heading(second).waitFor();

    await choose('Delete');
    await heading('Conditions without a name').waitFor();
    await page.getByRole('button', { name: 'Undo' }).click();
    await heading(second).waitFor();
    await page.reload();
    await heading(second).waitFor();
    expect(await page.getByLabel('gain', { exact: true }).inputValue()).toBe('37');

    await choose('River geophone');
    await heading('River geophone').waitFor();
    await page.goBack();
    await heading(second).waitFor();
    await choose('Delete');
    await heading('Conditions without a name').waitFor();
    await open.close();
    expect(open.problems).toEqual([]);
  });

  it('are offered without saving to who may not save', async () => {
    open = await visit(browser());
    page = open.page;
    await signIn(page, 'purchasing', '/rank');
    await heading('River geophone').waitFor();
    await page.getByRole('button', { name: /named conditions$/ }).click();
    await page.getByRole('menuitem', { name: 'Hydrophone' }).waitFor();
    expect(await page.getByRole('menuitem', { name: 'Save as…' }).count()).toBe(0);
    await open.close();
    expect(open.problems).toEqual([]);
  });
});
