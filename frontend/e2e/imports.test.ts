import type { Page } from 'playwright-core';
import { describe, expect, it } from 'vitest';
import { openBrowser, PHONE, visit } from './support/browser';
import { uniqueNumber } from './support/parts';
import { screenshot } from './support/screenshot';
import { signIn } from './support/session';

const browser = openBrowser();

const HEADINGS = 'Hersteller;Bestellnr.;en @1kHz (nV/rtHz);in typ;GBP [MHz];Bauart';

/** A list as a German spreadsheet writes it: Windows-1252, semicolons, decimal commas, a title above. */
function listOf(partNumber: string): Buffer {
  const rows = [
    `Prüfwerk Süd;${partNumber};1,15;1,4;60;SOIC-8`,
    `Prüfwerk Süd;${partNumber}-B;0,95;1,9;8..12;SOIC-8`,
  ];
  return Buffer.from(`Verstärkerliste;;;;;\r\n${HEADINGS}\r\n${rows.join('\r\n')}\r\n`, 'latin1');
}

async function upload(page: Page, partNumber: string): Promise<void> {
  const file = { name: 'verstärker.csv', mimeType: 'text/csv', buffer: listOf(partNumber) };
  await page.locator('input[type=file]').setInputFiles(file);
  await page.getByRole('heading', { level: 1, name: 'verstärker.csv' }).waitFor();
  await page.getByRole('tab', { name: '1 new' }).waitFor();
}

async function shownInParts(page: Page, partNumber: string): Promise<boolean> {
  await page.goto(`/parts?search=${partNumber}`);
  await page
    .getByText(/found among|There is no|No part/i)
    .first()
    .waitFor();
  return page.getByRole('link', { name: partNumber, exact: true }).isVisible();
}

describe('a list', () => {
  it('is read, mapped, applied and undone on one page', async () => {
    const { page, problems, close } = await visit(browser());
    await signIn(page, 'librarian', '/rank');
    await page.getByRole('navigation', { name: 'Pages' }).getByRole('link', { name: 'Import' }).click();
    const partNumber = uniqueNumber();
    await upload(page, partNumber);
    await page.getByText('Windows-1252').waitFor();
    expect(await page.getByLabel('header line').inputValue()).toBe('2');
    await page
      .getByRole('region', { name: 'Refused' })
      .getByText(/this is a range/)
      .waitFor();

    await page.getByLabel('Bauart becomes').fill('package');
    await page.keyboard.press('Enter');
    await page.getByRole('button', { name: 'Apply 1 row' }).click();
    await page.getByText(/^1 row applied by/).waitFor();
    await screenshot(page, 'import');
    const address = page.url();
    expect(await shownInParts(page, partNumber)).toBe(true);
    await page.getByRole('link', { name: partNumber, exact: true }).click();
    await page.getByText('SOIC-8').first().waitFor();
    await page.getByText('Prüfwerk Süd').first().waitFor();

    await page.goto(address);
    await page.getByRole('button', { name: 'Undo this import' }).click();
    await page.getByText('Now the library is as it was before.').waitFor();
    expect(await shownInParts(page, partNumber)).toBe(false);
    expect(problems).toEqual([]);
    await close();
  });

  it('is checked again in another dialect, and remembers what was said of its headings', async () => {
    const { page, problems, close } = await visit(browser());
    await signIn(page, 'librarian', '/imports');
    await upload(page, uniqueNumber());
    await page.getByLabel('Bauart becomes').fill('description');
    await page.keyboard.press('Enter');
    await page.getByText('Nothing has changed yet.').waitFor();
    await page.getByLabel('Decimal mark').click();
    const told = page.waitForResponse((answer) => answer.request().postData()?.includes('"point"') === true);
    await page.getByTitle('point').click();
    await told;
    await page
      .getByRole('row', { name: /Bauart/ })
      .getByText('description')
      .waitFor();
    await page.getByRole('tab', { name: '1 new' }).waitFor();
    await page.reload();
    await page.getByText('point', { exact: true }).waitFor();
    await page.goto('/imports');
    await upload(page, uniqueNumber());
    await page
      .getByRole('row', { name: /Bauart/ })
      .getByText('description')
      .waitFor();
    expect(problems).toEqual([]);
    await close();
  });

  it('fits a narrow screen, and isn’t for engineers to bring in', async () => {
    const { page, problems, close } = await visit(browser(), { viewport: PHONE });
    await signIn(page, 'engineer', '/imports');
    await page.getByText('Lists of parts are imported by your team’s librarians').waitFor();
    await page
      .getByRole('link', { name: /verstärker/ })
      .first()
      .click();
    await page.getByRole('heading', { level: 1, name: 'verstärker.csv' }).waitFor();
    expect(await page.getByRole('button', { name: /Apply|Undo/ }).count()).toBe(0);
    for (const path of ['/imports', page.url()]) {
      await page.goto(path);
      await page.getByRole('heading', { level: 1 }).waitFor();
      await page.getByText('verstärker.csv').first().waitFor();
      expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBeLessThanOrEqual(
        PHONE.width,
      );
    }
    expect(problems).toEqual([]);
    await close();
  });
});

/** A quotation as a German supplier writes it, for a part of the demo team and for one that nobody knows. */
function quotation(): Buffer {
  const rows = [
    'Hersteller;Typ;Bestellnr.;1;10+;ab 100;Lieferzeit (Wochen)',
    'TARN MICRO;TN 610;Q-1;7,20;6,10;5,30;11',
    'Tarn Micro;TN-610X;Q-2;7,20;6,10;5,30;11',
    'Hallam;HT-2041;Q-3;8,20;1.234,56;5,30;11',
  ];
  return Buffer.from(`${rows.join('\r\n')}\r\n`, 'latin1');
}

describe('a quotation', () => {
  it('is compared with the prices that stand, applied and undone by purchasing', async () => {
    const { page, problems, close } = await visit(browser());
    await signIn(page, 'purchasing', '/rank');
    await page.getByRole('navigation', { name: 'Pages' }).getByRole('link', { name: 'Import' }).click();
    const file = { name: 'angebot.csv', mimeType: 'text/csv', buffer: quotation() };
    await page.locator('input[type=file]').setInputFiles(file);
    await page.getByText(/supplier: a column is needed/).waitFor();
    const supplier = `Brauwerk ${uniqueNumber()}`;
    await page.getByLabel('Supplier of all rows').fill(supplier);
    await page.keyboard.press('Enter');
    await page.getByLabel('Currency of all rows').fill('EUR');
    await page.keyboard.press('Enter');
    await page.getByRole('tab', { name: '1 new' }).waitFor();
    const panel = page.getByRole('tabpanel', { name: 'Rows: new' });
    await panel.getByText(`${supplier} is no supplier of yours yet: applying the list adds it`).waitFor();
    await panel.getByText('from 100 5.30').waitFor();
    const refused = page.getByRole('region', { name: 'Refused' });
    await refused.getByText('your libraries have no such part').waitFor();
    await refused.getByText(/digits in groups/).waitFor();
    await page.getByRole('button', { name: 'Apply 1 row' }).click();
    await page.getByText(/^1 row applied by/).waitFor();
    await screenshot(page, 'import-prices');
    expect(await offersOf(page, supplier)).toBe(1);
    await page.getByRole('button', { name: 'Undo this import' }).click();
    await page.getByText('Now the prices are as they were before.').waitFor();
    expect(await offersOf(page, supplier)).toBe(0);
    expect(problems).toEqual([]);
    await close();
  });
});

/** How many offers of a supplier stand. */
async function offersOf(page: Page, supplier: string): Promise<number> {
  const answer = await page.request.get(`/api/prices?search=${encodeURIComponent(supplier)}`);
  return ((await answer.json()) as { total: number }).total;
}
