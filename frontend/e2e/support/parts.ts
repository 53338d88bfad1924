import type { Page } from 'playwright-core';

const LISTS = {
  'op-amp': {
    path: '/parts',
    figures: { 'voltage noise e_n': '3n3', 'gain–bandwidth product GBW': '40 MHz' },
  },
  resistor: { path: '/parts/resistors', figures: { 'resistance R': '4k7', 'power rating P_r': '125 mW' } },
};

/** A part number that no other run has used. */
export function uniqueNumber(): string {
  return `E2E-${Date.now().toString(36)}-${Math.random().toString(36).slice(2, 6)}`;
}

export async function fill(page: Page, label: string, text: string): Promise<void> {
  await page.getByLabel(label, { exact: true }).fill(text);
}

/** Fills in the form of a new part, and gives the address of its page. */
export async function createPart(
  page: Page,
  partNumber: string,
  kind: keyof typeof LISTS = 'op-amp',
): Promise<string> {
  const { path, figures } = LISTS[kind];
  await page.goto(`${path}/new`);
  await fill(page, 'manufacturer', 'Harbour Test Works');
  await fill(page, 'part number', partNumber);
  for (const [label, text] of Object.entries(figures)) await fill(page, label, text);
  await page.getByRole('button', { name: 'Add to your library' }).click();
  await page.getByRole('heading', { level: 1, name: partNumber }).waitFor();
  return page.url();
}

export async function removePart(page: Page, address: string): Promise<void> {
  await page.goto(address);
  await page.getByRole('button', { name: 'Delete' }).click();
  await page.getByText('is deleted').first().waitFor();
}
