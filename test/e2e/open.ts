import { writeFileSync } from 'node:fs';
import path from 'node:path';
import type { Browser, BrowserContext, Page } from 'playwright-core';
import { openHost, type BrowserHost } from '../../main/browser/host.js';
import { openDesk, type Desk, type WindowService } from '../../main/calls/desk.js';
import type { SizeEnd } from '../../main/contract.js';
import { rootFolder } from '../../main/files/assets.js';
import { builtWorker, type WorkerEntry } from '../../main/solver/entry.js';
import { readWindowFiles } from '../../main/windowFiles.js';
import type { Report } from '../../src/report/report.js';
import { demo, type JobDocument } from './jobs.js';

const DIST = path.join(rootFolder(), 'dist');

/** How a window is opened. */
export interface Opening {
  readonly browser: Browser;
  /** the job that it was left with, as if from an earlier start; without one it is a first start */
  readonly job?: JobDocument;
  readonly theme?: 'paper' | 'blueprint';
  /** of the page, CSS px; default 1440 × 900 */
  readonly width?: number;
  readonly height?: number;
  /** device pixels of a CSS pixel: 2 is a zoom of 200 % */
  readonly zoom?: number;
  readonly worker?: WorkerEntry;
  /** done with the page before it goes anywhere */
  readonly prepare?: (page: Page) => Promise<unknown>;
}

/** A run that the window asked for, and its report once that is whole. */
export interface Run {
  readonly job: JobDocument;
  report: Report | null;
  /** it has ended, be it with a report or not */
  over: boolean;
}

/** The file in the app's own folder that holds what it remembers. */
export const STATE = 'state.json';

/** Writes what an earlier start would have left in the app's own folder. */
export function putState(folder: string, { job, theme }: Opening): void {
  if (job === undefined && theme === undefined) return;
  const kept = job ?? demo('interconnect');
  const state = { version: 1, job: kept, sound: kept, settings: { theme: theme ?? 'paper', units: 'SI' } };
  writeFileSync(path.join(folder, STATE), JSON.stringify(state));
}

/** What no test may meet: an error in the page or its console, or a request that leaves the host. */
function watch(page: Page, origin: string, faults: string[]): void {
  page.on('console', (message) => {
    if (['error', 'warning'].includes(message.type())) faults.push(`console: ${message.text()}`);
  });
  page.on('pageerror', (error) => faults.push(`page: ${error.message}`));
  page.on('request', (request) => {
    if (!request.url().startsWith(`${origin}/`)) faults.push(`request: ${request.url()}`);
  });
}

/** A desk that keeps every run which a window asks it for. */
function keepingRuns(desk: Desk, runs: Run[]): Desk {
  const openWindow = (): WindowService => {
    const service = desk.openWindow();
    const follow: WindowService['follow'] = (name, args, onLine) => {
      const run: Run = { job: (args as { readonly job: JobDocument }).job, report: null, over: false };
      runs.push(run);
      return service.follow(name, args, (line) => {
        if ('end' in line) {
          const end = line.end as SizeEnd;
          run.report = end.kind === 'report' ? end.report : null;
          run.over = true;
        }
        onLine(line);
      });
    };
    return { ...service, follow };
  };
  return { ...desk, openWindow };
}

/** A page over a host of its own. */
export interface Opened {
  readonly host: BrowserHost;
  readonly context: BrowserContext;
  readonly page: Page;
}

/** Opens host and page. Faults of the page and refusals of the host are added to `faults`, runs to `runs`. */
export async function openPage(opening: Opening, folder: string, faults: string[], runs: Run[]): Promise<Opened> {
  const { browser, width = 1440, height = 900, zoom = 1, worker = builtWorker(path.join(DIST, 'main')) } = opening;
  const log = (line: string): void => void faults.push(`host: ${line}`);
  const [desk, files] = await Promise.all([
    openDesk({ worker, folder, log }),
    readWindowFiles(path.join(DIST, 'renderer')),
  ]);
  const host = await openHost({ desk: keepingRuns(desk, runs), files, log });
  const context = await browser.newContext({ viewport: { width, height }, deviceScaleFactor: zoom });
  const page = await context.newPage();
  page.setDefaultTimeout(15_000);
  watch(page, `http://${host.gate.host}`, faults);
  await opening.prepare?.(page);
  await page.goto(host.address);
  await page.locator('.sheet').waitFor();
  return { host, context, page };
}

export async function close({ host, context }: Opened): Promise<void> {
  await context.close();
  await host.close();
}
