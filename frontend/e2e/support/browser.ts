import { chromium, type Browser, type BrowserContextOptions, type Page } from 'playwright-core';
import { afterAll, beforeAll } from 'vitest';

export const BASE_URL = process.env.E2E_BASE_URL ?? 'http://127.0.0.1:3000';

const FLAGS = [
  '--no-sandbox',
  '--disable-gpu',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
];

export const DESKTOP = { width: 1440, height: 900 };
export const PHONE = { width: 390, height: 844 };

export function launchBrowser(): Promise<Browser> {
  return chromium.launch({
    headless: true,
    executablePath: process.env.CHROMIUM_PATH ?? '/usr/bin/chromium',
    args: FLAGS,
  });
}

/** The browser of a file's journeys, open from the first of them to the last. */
export function openBrowser(): () => Browser {
  let browser: Browser;
  beforeAll(async () => {
    browser = await launchBrowser();
  });
  afterAll(() => browser.close());
  return () => browser;
}

/** A page in a session of its own, and what went wrong in it. */
export interface Visit {
  page: Page;
  /** Errors of the page and of its console; a journey ends by checking that there are none. */
  problems: string[];
  close: () => Promise<void>;
}

/** Opens a page; failed requests whose status is in `expected` don't count as problems. */
export async function visit(
  browser: Browser,
  options: BrowserContextOptions & { expected?: number[] } = {},
): Promise<Visit> {
  const { expected = [], ...contextOptions } = options;
  const context = await browser.newContext({
    baseURL: BASE_URL,
    viewport: DESKTOP,
    locale: 'en-GB',
    reducedMotion: 'reduce',
    ...contextOptions,
  });
  const page = await context.newPage();
  const problems = collectProblems(page, [401, ...expected]);
  return { page, problems, close: () => context.close() };
}

function collectProblems(page: Page, expected: number[]): string[] {
  const problems: string[] = [];
  page.on('pageerror', (error) => problems.push(`page: ${error.message}`));
  page.on('console', (message) => {
    if (message.type() !== 'error' && message.type() !== 'warning') return;
    const status = /status of (\d+)/.exec(message.text())?.[1];
    if (status === undefined || !expected.includes(Number(status)))
      problems.push(`${message.type()}: ${message.text()}`);
  });
  return problems;
}
