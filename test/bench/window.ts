import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import type { Page } from 'playwright-core';
import { EDIT_WAIT } from '../../renderer/stores/run.js';
import { launchBrowser } from '../e2e/browser.js';
import buildWindow from '../e2e/built.js';
import { TWELVE_METALS, type JobDocument } from '../e2e/jobs.js';
import { close, openPage, putState } from '../e2e/open.js';
import { atMost, shown, table } from './table.js';
import { longestTask } from './trace.js';

const EYE_TARGET = 100;
const TASK_TARGET = 50;
const WARMING = 15;
const EDITS = 60;

/** One edit: a key that steps the torque, and the time from it until the frame that shows the new mass is drawn, ms. */
async function edit(page: Page): Promise<number> {
  const drawn = page.evaluate(
    () =>
      new Promise<number>((resolve) => {
        const mass = document.querySelector('.mass');
        if (mass === null) throw new Error('there is no pick');
        let pressed = 0;
        window.addEventListener('keydown', ({ timeStamp }) => (pressed = timeStamp), { capture: true, once: true });
        const observer = new MutationObserver(() => {
          observer.disconnect();
          requestAnimationFrame(() => {
            // a message comes after the frame is drawn
            const { port1, port2 } = new MessageChannel();
            port1.onmessage = () => {
              resolve(performance.now() - pressed);
            };
            port2.postMessage(null);
          });
        });
        observer.observe(mass, { characterData: true, childList: true, subtree: true });
      }),
  );
  await page.keyboard.press('Shift+ArrowUp');
  return drawn;
}

/** Collects the tasks of the main thread that take longer than 50 ms, from the page's first moment. */
function collectLongTasks(page: Page): Promise<unknown> {
  return page.addInitScript(() => {
    const long: number[] = [];
    Object.assign(window, { long });
    new PerformanceObserver((list) => {
      long.push(...list.getEntries().map(({ duration }) => duration));
    }).observe({ type: 'longtask', buffered: true });
  });
}

interface Measured {
  /** from the key to the drawn frame without the wait before sizing, ms, rising */
  readonly times: readonly number[];
  /** tasks of more than 50 ms while the page opens and shows its first results, ms */
  readonly opening: readonly number[];
  /** those while edits are made */
  readonly editing: readonly number[];
  /** the longest task while edits are made, ms */
  readonly longest: number;
}

function longTasks(page: Page): Promise<readonly number[]> {
  return page.evaluate(() => ('long' in window ? (window.long as number[]) : []));
}

async function measure(job: JobDocument): Promise<Measured> {
  const browser = await launchBrowser();
  const folder = mkdtempSync(path.join(tmpdir(), 'wringwall-bench-'));
  putState(folder, { browser, job });
  const faults: string[] = [];
  const opened = await openPage({ browser, prepare: collectLongTasks }, folder, faults, []);
  try {
    const { page } = opened;
    await page.getByRole('status').filter({ hasText: 'sized in' }).waitFor();
    await page.getByRole('textbox', { name: 'torque, start' }).focus();
    const opening = await longTasks(page);
    const times: number[] = [];
    for (let i = 0; i < WARMING + EDITS; i++) {
      const time = await edit(page);
      if (i >= WARMING) times.push(time - EDIT_WAIT);
    }
    const longest = await longestTask(browser, page, async () => {
      for (let i = 0; i < 10; i++) await edit(page);
    });
    const editing = (await longTasks(page)).slice(opening.length);
    if (faults.length > 0) throw new Error(faults.join('\n'));
    return { times: times.sort((a, b) => a - b), opening, editing, longest };
  } finally {
    await close(opened);
    await browser.close();
    rmSync(folder, { recursive: true, force: true });
  }
}

/** How long the window takes to show what an edit comes to. */
export async function windowTimes(): Promise<string> {
  await buildWindow();
  const { times, opening, editing, longest } = await measure(TWELVE_METALS);
  const at = (part: number): number => times[Math.floor(part * (times.length - 1))] ?? Number.NaN;
  const worst = Math.max(longest, ...editing);
  const first = opening.length === 0 ? `under ${TASK_TARGET}` : shown(Math.max(...opening));
  return table(`Window, twelve metals: from a key to the drawn frame, without its own wait of ${EDIT_WAIT} ms`, [
    ['', 'ms', 'target'],
    ['median', shown(at(0.5)), atMost(at(0.5), EYE_TARGET)],
    ['nine in ten within', shown(at(0.9)), ''],
    ['longest task while editing', shown(worst), atMost(worst, TASK_TARGET)],
    ['longest task while opening', first, atMost(Math.max(0, ...opening), TASK_TARGET)],
  ]);
}
