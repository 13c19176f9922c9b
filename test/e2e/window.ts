import { existsSync, mkdirSync, mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import type { Page } from 'playwright-core';
import { expect } from 'vitest';
import { rootFolder } from '../../main/files/assets.js';
import type { Report } from '../../src/report/report.js';
import { close, openPage, putState, STATE, type Opening, type Run } from './open.js';

/** The app in a browser, over a host and a folder of its own. */
export interface OpenWindow {
  readonly page: Page;
  /** the app's own folder */
  readonly folder: string;
  /** every run that the window asked for, in order */
  readonly runs: readonly Run[];
  /** what the app remembers; null before there is anything */
  readonly remembered: () => Record<string, unknown> | null;
  /** Does something that has the job sized, and gives the run once its report is here. */
  readonly sized: (act: () => Promise<unknown>) => Promise<Run & { report: Report }>;
  /** Ends page and host, and opens both again over the same folder. */
  readonly restart: () => Promise<void>;
}

const ARTEFACTS = path.join(rootFolder(), 'test', 'artefacts');

/** The file of a picture that a test leaves behind, to be looked at. */
export function artefact(name: string): string {
  mkdirSync(ARTEFACTS, { recursive: true });
  return path.join(ARTEFACTS, `${name}.png`);
}

function nameOfTest(): string {
  return (expect.getState().currentTestName ?? 'test').replace(/[^a-z0-9]+/gi, '-').slice(0, 80);
}

/** Opens the app, does something with it, and closes it; fails where the page met an error or asked for anything else. */
export async function inWindow(opening: Opening, act: (window: OpenWindow) => Promise<void>): Promise<void> {
  const folder = mkdtempSync(path.join(tmpdir(), 'wringwall-window-'));
  putState(folder, opening);
  const faults: string[] = [];
  const runs: Run[] = [];
  let opened = await openPage(opening, folder, faults, runs);
  const window: OpenWindow = {
    get page() {
      return opened.page;
    },
    folder,
    runs,
    remembered: () => {
      const file = path.join(folder, STATE);
      return existsSync(file) ? (JSON.parse(readFileSync(file, 'utf8')) as Record<string, unknown>) : null;
    },
    sized: async (doIt) => {
      const before = runs.length;
      await doIt();
      await expect.poll(() => runs.length > before && runs.at(-1)?.over, { timeout: 30_000 }).toBe(true);
      const run = runs.at(-1);
      if (run === undefined || run.report === null) throw new Error('the run gave no report');
      return { ...run, report: run.report };
    },
    restart: async () => {
      await close(opened);
      opened = await openPage(opening, folder, faults, runs);
    },
  };
  try {
    await act(window);
  } catch (error) {
    await opened.page.screenshot({ path: artefact(`failed-${nameOfTest()}`) }).catch(() => undefined);
    throw error;
  } finally {
    await close(opened);
    rmSync(folder, { recursive: true, force: true });
  }
  expect(faults, 'errors of the page, or requests that left the host').toEqual([]);
}
