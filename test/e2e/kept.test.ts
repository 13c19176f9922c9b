import { expect, it } from 'vitest';
import { demo, PLAIN } from './jobs.js';
import { expectShown, expectText, field, pickedKey, row, WAIT } from './reading.js';
import { useBrowser } from './useBrowser.js';
import { inWindow } from './window.js';

const browser = useBrowser();

it('unsaved work, units and sheet are there again after a restart', () =>
  inWindow({ browser: browser() }, async (window) => {
    await expectText(window.page.getByRole('status'), 'sized in');
    await field(window.page, 'job title').fill('Shaft in the making');
    const { report } = await window.sized(() => row(window.page, 'steel-4130-n').dblclick());
    await window.page.getByRole('radiogroup', { name: 'units' }).getByText('US').click();
    await window.page.getByRole('radiogroup', { name: 'sheet' }).getByText('blueprint').click();
    const job = { ...demo('interconnect'), title: 'Shaft in the making', pick: { material: 'steel-4130-n' } };
    const settings = { theme: 'blueprint', units: 'US' };
    await expect.poll(() => window.remembered(), WAIT).toMatchObject({ job, settings });

    const before = window.runs.length;
    await window.restart();
    const { page } = window;
    await expect.poll(() => pickedKey(page), WAIT).toBe('m steel-4130-n');
    expect(window.runs[before]?.job).toEqual(job);
    await expect.poll(() => window.runs[before]?.over, WAIT).toBe(true);
    expect(window.runs[before]?.report).toEqual(report);
    expect(await field(page, 'job title').inputValue()).toBe('Shaft in the making');
    expect(await page.getByRole('radio', { name: 'US' }).isChecked()).toBe(true);
    expect(await page.getByRole('radio', { name: 'blueprint' }).isChecked()).toBe(true);
    await page.getByRole('radiogroup', { name: 'units' }).getByText('SI').click();
    await expectShown(page, report);
  }));

it('what was typed last is kept when the window is closed at once', () =>
  inWindow({ browser: browser(), job: PLAIN }, async (window) => {
    await expectText(window.page.getByRole('status'), 'sized in');
    await field(window.page, 'torque, start').fill('1234 N·m');
    await window.page.goto('about:blank');
    await expect.poll(() => window.remembered()?.['job'], WAIT).toMatchObject({ loads: [{ torque: '1234 N·m' }] });
  }));

it('a job that is in error comes back as it was, with the results of the last sound brief', () =>
  inWindow({ browser: browser(), job: PLAIN }, async (window) => {
    await expect.poll(() => pickedKey(window.page), WAIT).toBe('m al-6061-t6');
    const torque = field(window.page, 'torque, start');
    await torque.fill('900 Nmm/s');
    await torque.press('Enter');
    await expect.poll(() => window.remembered()?.['sound'], WAIT).toEqual(PLAIN);
    await expect.poll(() => window.remembered()?.['job'], WAIT).toMatchObject({ loads: [{ torque: '900 Nmm/s' }] });
    await window.restart();
    await expect.poll(() => pickedKey(window.page), WAIT).toBe('m al-6061-t6');
    expect(await field(window.page, 'torque, start').inputValue()).toBe('900 Nmm/s');
    await expectText(window.page.getByRole('banner'), 'shown: the last sound brief');
  }));
