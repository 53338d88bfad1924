import { describe, expect, it } from 'vitest';
import { openBrowser, PHONE, visit } from './support/browser';
import { createPart, removePart, uniqueNumber } from './support/parts';
import { screenshot } from './support/screenshot';
import { signIn } from './support/session';

const browser = openBrowser();

describe('the library work', () => {
  it('fills in what the ranking misses, and settles what looks like one part', async () => {
    const { page, problems, close } = await visit(browser());
    await signIn(page, 'librarian', '/parts');
    const number = `${uniqueNumber()}-1`;
    const first = await createPart(page, `${number}0`);
    const second = await createPart(page, `${number}O`);

    await page.goto(`/parts/completeness?library=team&search=${number}`);
    await page.getByText('2 parts, 0 complete').waitFor();
    await page.getByRole('button', { name: 'current noise 2' }).click();
    await page.getByLabel(`current noise of ${number}0`).fill('1.2 pA/√Hz');
    await page.getByLabel(`current noise of ${number}0`).press('Tab');
    await page.getByRole('button', { name: 'current noise 1' }).waitFor();
    await screenshot(page, 'parts-completeness');
    await page.getByText(`current noise of ${number}0 is stated`).waitFor();
    await page.getByRole('button', { name: 'Undo' }).click();
    await page.getByRole('button', { name: 'current noise 2' }).waitFor();

    await page.getByRole('link', { name: 'Duplicates' }).click();
    const pair = page.getByRole('article', { name: new RegExp(`${number}[0O] and ${number}[0O]`) });
    await pair.getByText('part numbers that read alike').waitFor();
    await screenshot(page, 'parts-duplicates');
    await pair.getByRole('button', { name: 'Keep both' }).click();
    const kept = page.getByRole('alert').filter({ hasText: 'are both kept' });
    await kept.waitFor();
    await pair.waitFor({ state: 'detached' });
    await kept.getByRole('button', { name: 'Undo' }).click();
    await pair.getByRole('button', { name: `Retire ${number}O` }).click();
    await page.getByText(`${number}O is retired`).waitFor();
    await pair.waitFor({ state: 'detached' });

    await removePart(page, first);
    await removePart(page, second);
    expect(problems).toEqual([]);
    await close();
  });

  it('fits a narrow screen', async () => {
    const { page, problems, close } = await visit(browser(), { viewport: PHONE });
    await signIn(page, 'engineer', '/parts');
    for (const path of ['/parts/completeness?library=team', '/parts/resistors/duplicates']) {
      await page.goto(path);
      await page.getByRole('table').first().waitFor();
      expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBeLessThanOrEqual(
        PHONE.width,
      );
    }
    expect(problems).toEqual([]);
    await close();
  });
});
