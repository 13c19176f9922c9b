import type { Browser } from 'playwright-core';
import { afterAll, beforeAll } from 'vitest';
import { launchBrowser } from './browser.js';

/** One browser for all tests of a file. */
export function useBrowser(): () => Browser {
  let browser: Browser | null = null;
  beforeAll(async () => {
    browser = await launchBrowser();
  });
  afterAll(async () => {
    await browser?.close();
  });
  return () => {
    if (browser === null) throw new Error('the browser has not started');
    return browser;
  };
}
