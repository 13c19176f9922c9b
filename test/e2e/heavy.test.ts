import { copyFileSync, existsSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { afterEach, expect, it, vi } from 'vitest';
import { rootFolder } from '../../main/files/assets.js';
import { commandLineReport } from './commandLine.js';
import { FORTY_MATERIALS, HEAVY, LONG, THIRTY_LOADS } from './jobs.js';
import { expectShown, expectText, field, pickedKey, row, shownRows, station, WAIT } from './reading.js';
import { useBrowser } from './useBrowser.js';
import { inWindow } from './window.js';

const browser = useBrowser();

afterEach(() => {
  vi.unstubAllEnvs();
});

it('a long run fills the window as it goes, can be stopped, and be begun again', () =>
  inWindow({ browser: browser(), job: LONG }, async ({ page, runs }) => {
    const head = page.getByRole('banner');
    await expectText(head, /sizing \d+ of 40/);
    await expect.poll(async () => (await shownRows(page)).length, WAIT).toBeGreaterThan(2);
    await page.getByRole('button', { name: 'stop' }).click();
    await expectText(head, 'stopped');
    expect(runs.map(({ over, report }) => ({ over, report }))).toEqual([{ over: true, report: null }]);
    expect((await shownRows(page)).length).toBeGreaterThan(2);

    await page.getByRole('button', { name: 'size again' }).click();
    await expectText(head, /sizing \d+ of 40/);
    // the window answers while the run goes on, and an edit takes its place
    await field(page, 'job title').fill('Another title');
    await expect.poll(() => runs.length, WAIT).toBe(3);
    expect(runs[2]?.job['title']).toBe('Another title');
    await page.getByRole('button', { name: 'stop' }).click();
    await expectText(head, 'stopped');
  }));

it('a hundred fast edits end in what the command line gives for the last', () =>
  inWindow({ browser: browser(), job: FORTY_MATERIALS }, async ({ page, runs, folder }) => {
    const torque = field(page, 'torque, start');
    await torque.focus();
    for (let edit = 1; edit <= 100; edit++) {
      await page.keyboard.press('ArrowUp');
      // some of the edits find a run in flight, which they overtake
      const begun = runs.length;
      if (edit % 20 === 0) await expect.poll(() => runs.length, WAIT).toBeGreaterThan(begun);
    }
    expect(await torque.inputValue()).toBe('1000 N·m');
    const wanted = { ...FORTY_MATERIALS, loads: [{ name: 'start', torque: '1000 N·m', twistMax: '3 deg' }] };
    await expect.poll(() => runs.at(-1)?.report ?? null, { timeout: 30_000 }).not.toBeNull();
    expect(runs.at(-1)?.job).toEqual(wanted);
    const report = commandLineReport(wanted, folder);
    expect(runs.at(-1)?.report).toEqual(report);
    await expectShown(page, report);
    await page.keyboard.press('Control+Z');
    expect(await torque.inputValue()).toBe('900 N·m');
  }));

it('thirty load cases: every one can be read and edited', () =>
  inWindow({ browser: browser(), job: THIRTY_LOADS }, async ({ page, sized }) => {
    await expectText(page.getByRole('status'), 'sized in');
    const last = field(page, 'torque, case 30');
    const { job, report } = await sized(async () => {
      await last.fill('2 kN·m');
      await last.press('Enter');
    });
    expect(await last.evaluate((input) => input.getBoundingClientRect().right)).toBeLessThan(328);
    expect((job['loads'] as readonly unknown[]).length).toBe(30);
    await expectShown(page, report);
    await station(page, 'Pick').getByRole('button', { name: 'show every load case' }).click();
    await expect
      .poll(() => station(page, 'Pick').getByRole('row', { name: 'case 30' }).count(), WAIT)
      .toBeGreaterThan(3);
    const fewer = await sized(() => page.getByRole('button', { name: 'remove case 30', exact: true }).click());
    expect((fewer.job['loads'] as readonly unknown[]).length).toBe(29);
    expect(await last.count()).toBe(0);
  }));

it('forty materials: each has its row, and can be chosen and left out', () =>
  inWindow({ browser: browser(), job: FORTY_MATERIALS }, async ({ page, sized, folder }) => {
    await expectShown(page, commandLineReport(FORTY_MATERIALS, folder));
    const heaviest = (await shownRows(page)).at(-1)?.key.slice(2) ?? '';
    await sized(() => row(page, heaviest).dblclick());
    await expect.poll(() => pickedKey(page), WAIT).toBe(`m ${heaviest}`);
    const { job, report } = await sized(() => page.locator(`[data-material="${heaviest}"]`).click());
    expect((job['materials'] as readonly unknown[]).length).toBe(39);
    expect(job).not.toHaveProperty('pick');
    await expectShown(page, report);
  }));

it('a worker that dies in the middle of a run is started again, the window says so, and the job is kept', async () => {
  const folder = mkdtempSync(path.join(tmpdir(), 'wringwall-dying-'));
  const worker = path.join(folder, 'dyingWorker.mjs');
  copyFileSync(path.join(import.meta.dirname, 'dyingWorker.mjs'), worker);
  vi.stubEnv('WRINGWALL_TEST_WORKER', path.join(rootFolder(), 'dist', 'main', 'worker.js'));
  writeFileSync(path.join(folder, 'dies'), '');
  try {
    await inWindow({ browser: browser(), job: HEAVY, worker }, async ({ page, runs, folder: own }) => {
      await expectText(page.getByRole('banner'), 'The solver stopped (it ended with code 7) and was started again.');
      expect(existsSync(path.join(folder, 'dies'))).toBe(false);
      await expectText(page.getByRole('status'), '40 materials sized in');
      const report = commandLineReport(HEAVY, own);
      expect(runs).toEqual([{ job: HEAVY, report, over: true }]);
      await expectShown(page, report);
    });
  } finally {
    rmSync(folder, { recursive: true, force: true });
  }
});
