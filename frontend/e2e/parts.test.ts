import type { Page } from 'playwright-core';
import { describe, expect, it } from 'vitest';
import { openBrowser, PHONE, visit } from './support/browser';
import { createPart, fill, removePart, uniqueNumber } from './support/parts';
import { screenshot } from './support/screenshot';
import { signIn } from './support/session';

const browser = openBrowser();

function rows(page: Page) {
  return page.getByRole('region', { name: 'Op-amps' }).locator('a');
}

describe('the parts', () => {
  it('are searched, narrowed and sorted, all of it kept in the address', async () => {
    const { page, problems, close } = await visit(browser());
    await signIn(page, 'engineer', '/parts');
    await rows(page).first().waitFor();
    await page.getByText(/\d+ parts: \d+ curated, \d+ of your own/).waitFor();
    await screenshot(page, 'parts');
    const wanted = (await rows(page).first().textContent()) ?? '';
    await page.getByLabel('Search parts').fill(wanted.toLowerCase().replace('-', ' '));
    await page.getByText(/found among/).waitFor();
    expect(await rows(page).first().textContent()).toBe(wanted);
    await page.goto('/parts?library=curated&inputType=jfet&sort=-voltageNoise');
    await rows(page).first().waitFor();
    await page.getByText(/0 of your own/).waitFor();
    await page.getByLabel('Search parts').fill('no such part');
    await page.getByRole('button', { name: 'show all parts' }).click();
    await page.getByText(/\d+ parts: \d+ curated, \d+ of your own/).waitFor();
    expect(page.url()).not.toContain('library');
    expect(problems).toEqual([]);
    await close();
  });

  it('open by keyboard alone', async () => {
    const { page, problems, close } = await visit(browser());
    await signIn(page, 'engineer', '/parts');
    await rows(page).first().waitFor();
    await page.getByLabel('Search parts').focus();
    const isInGrid = () => page.evaluate(() => document.activeElement?.closest('[role=grid]') !== null);
    for (let step = 0; step < 12 && !(await isInGrid()); step++) await page.keyboard.press('Tab');
    await page.keyboard.press('ArrowDown');
    await page.keyboard.press('ArrowDown');
    await page.keyboard.press('Enter');
    await page.getByLabel('Parameters').waitFor();
    expect(new URL(page.url()).pathname).toMatch(/^\/parts\/\d+$/);
    expect(problems).toEqual([]);
    await close();
  });

  it('are read-only for an engineer, and where they are curated', async () => {
    const { page, problems, close } = await visit(browser());
    await signIn(page, 'engineer', '/parts?library=team');
    await rows(page).first().click();
    await page.getByLabel('Parameters').waitFor();
    expect(await page.getByRole('button', { name: 'Delete' }).count()).toBe(0);
    await page.goto('/parts/new');
    await page.getByRole('heading', { name: 'This can’t be changed here' }).waitFor();
    expect(problems).toEqual([]);
    await close();
  });

  it('are created, edited, deleted and brought back by a librarian', async () => {
    const { page, problems, close } = await visit(browser());
    await signIn(page, 'librarian', '/parts');
    const partNumber = uniqueNumber();
    await createPart(page, partNumber);
    await page.getByText('3.3 nV/√Hz').waitFor();
    await page.getByText('The current noise is unknown').waitFor();
    await screenshot(page, 'part');
    await page.getByRole('link', { name: 'Edit' }).click();
    await fill(page, 'current noise i_n', '1.2 pA/√Hz');
    await screenshot(page, 'part-edit');
    await page.getByRole('button', { name: 'Save' }).click();
    await page.getByText('1.2 pA/√Hz').waitFor();
    await page.getByRole('button', { name: 'Delete' }).click();
    await page.getByText(`${partNumber} is deleted`).waitFor();
    await screenshot(page, 'part-deleted');
    await page.getByRole('button', { name: 'Undo' }).click();
    await page.getByRole('heading', { level: 1, name: partNumber }).waitFor();
    await page.getByText('1.2 pA/√Hz').waitFor();
    await removePart(page, page.url());
    expect(problems).toEqual([]);
    await close();
  });

  it('can’t be entered twice, and the form says so at the field', async () => {
    const { page, problems, close } = await visit(browser(), { expected: [409] });
    await signIn(page, 'librarian', '/parts');
    const partNumber = uniqueNumber();
    const address = await createPart(page, partNumber);
    await page.goto('/parts/new');
    await fill(page, 'manufacturer', 'HARBOUR test works');
    await fill(page, 'part number', partNumber.toLowerCase());
    await fill(page, 'voltage noise e_n', '1 nV/√Hz');
    await page.getByRole('button', { name: 'Add to your library' }).click();
    await page.locator('[aria-invalid=true]').waitFor();
    await screenshot(page, 'part-duplicate');
    page.on('dialog', (dialog) => void dialog.accept());
    await removePart(page, address);
    expect(problems).toEqual([]);
    await close();
  });

  it('show what a second librarian changed meanwhile, value by value', async () => {
    const { page, problems, close } = await visit(browser(), { expected: [409] });
    await signIn(page, 'librarian', '/parts');
    const address = await createPart(page, uniqueNumber());
    const other = await visit(browser());
    await signIn(other.page, 'admin', new URL(address).pathname);
    await page.getByRole('link', { name: 'Edit' }).click();
    await page.getByRole('button', { name: 'Save' }).waitFor();
    await other.page.getByRole('link', { name: 'Edit' }).click();
    await fill(other.page, 'gain–bandwidth product GBW', '55 MHz');
    await fill(other.page, 'package', 'DIP-8');
    await other.page.getByRole('button', { name: 'Save' }).click();
    await other.page.getByText('55 MHz').waitFor();
    await fill(page, 'gain–bandwidth product GBW', '60 MHz');
    await page.getByRole('button', { name: 'Save' }).click();
    await page.getByRole('alertdialog').waitFor();
    await screenshot(page, 'part-stale');
    await page.getByRole('button', { name: 'Save with these values' }).click();
    await page.getByLabel('Parameters').getByText('60 MHz').waitFor();
    await page.getByText(/DIP-8/).waitFor();
    await removePart(page, address);
    expect([...problems, ...other.problems]).toEqual([]);
    await other.close();
    await close();
  });

  it('are chosen, retired in one act and brought back by Undo', async () => {
    const { page, problems, close } = await visit(browser());
    await signIn(page, 'librarian', '/parts');
    const partNumber = uniqueNumber();
    const address = await createPart(page, partNumber);
    await page.goto(`/parts?library=team&search=${partNumber}`);
    await page.getByRole('checkbox', { name: 'Choose all parts listed' }).click();
    const bar = page.getByRole('region', { name: 'Chosen parts' });
    await bar.getByRole('button', { name: 'Retire' }).click();
    await bar.getByText('Retires 1 part: obsolete and not approved.').waitFor();
    await screenshot(page, 'parts-retire');
    await bar.getByRole('button', { name: 'Retire 1 part' }).click();
    await page.getByText(`${partNumber} is retired`).waitFor();
    await page.goto(address);
    await page.getByText(/obsolete · not approved/).waitFor();
    await page.getByRole('button', { name: 'Bring back' }).click();
    await page.getByText(/active · approved/).waitFor();
    await page.getByRole('button', { name: 'Undo' }).click();
    await page.getByText(/obsolete · not approved/).waitFor();
    await removePart(page, address);
    expect(problems).toEqual([]);
    await close();
  });

  it('warn before unsaved changes are left', async () => {
    const { page, problems, close } = await visit(browser());
    await signIn(page, 'librarian', '/parts/new');
    await fill(page, 'part number', 'half written');
    await page.getByRole('navigation').getByRole('link', { name: 'Parts' }).click();
    await page.getByRole('button', { name: 'Stay here' }).click();
    expect(await page.getByLabel('part number', { exact: true }).inputValue()).toBe('half written');
    await page.getByRole('navigation').getByRole('link', { name: 'Parts' }).click();
    await page.getByRole('button', { name: 'Leave, lose the changes' }).click();
    await page.getByRole('heading', { name: 'Parts' }).waitFor();
    expect(problems).toEqual([]);
    await close();
  });

  it('fit a narrow screen', async () => {
    const { page, problems, close } = await visit(browser(), { viewport: PHONE });
    await signIn(page, 'librarian', '/parts');
    await rows(page).first().waitFor();
    await screenshot(page, 'parts-narrow');
    for (const path of ['/parts', '/parts/1', '/parts/new']) {
      await page.goto(path);
      await page.getByRole('heading', { level: 1 }).waitFor();
      expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBeLessThanOrEqual(
        PHONE.width,
      );
    }
    expect(problems).toEqual([]);
    await close();
  });
});
