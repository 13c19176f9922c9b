import { expect, it } from 'vitest';
import { commandLineReport } from './commandLine.js';
import { demo, NOTHING_FITS, PLAIN } from './jobs.js';
import { expectShown, expectText, field, pickedKey, pickedMass, row, shownRows, station, WAIT } from './reading.js';
import { useBrowser } from './useBrowser.js';
import { inWindow } from './window.js';

const browser = useBrowser();

it('begins with a sized demo job', () =>
  inWindow({ browser: browser() }, async ({ page, runs, folder }) => {
    await expectShown(page, commandLineReport(demo('interconnect'), folder));
    expect(runs[0]?.job).toEqual(demo('interconnect'));
    await expectText(page.getByRole('status'), /^5 materials sized in .* all 5 fit$/);
    expect(await field(page, 'torque, jam').inputValue()).toBe('1150 N·m');
    expect(await station(page, 'Pick').getByRole('img').count()).toBe(1);
    expect(await station(page, 'Pick').getByText('What a limit costs').count()).toBe(1);
  }));

it('a torque that is typed changes the pick, to what the command line gives', () =>
  inWindow({ browser: browser() }, async ({ page, sized, folder }) => {
    await expect.poll(() => pickedKey(page), WAIT).toBe('m al-6061-t6');
    const before = await pickedMass(page);
    const { job, report } = await sized(async () => {
      await field(page, 'torque, jam').click();
      await page.keyboard.press('Control+A');
      await page.keyboard.insertText('3 kN·m');
    });
    expect(job['loads']).toMatchObject([{}, { name: 'jam', torque: '3 kN·m' }]);
    expect(report).toEqual(commandLineReport(job, folder));
    await expectShown(page, report);
    expect(await pickedKey(page)).toBe('m al-7075-t6');
    expect(await pickedMass(page)).not.toBe(before);
    await expectText(station(page, 'Pick'), 'the lightest');
  }));

it('another material is chosen by double click or Enter, and the lightest taken again', () =>
  inWindow({ browser: browser(), job: PLAIN }, async ({ page, sized }) => {
    await expect.poll(() => pickedKey(page), WAIT).toBe('m al-6061-t6');
    const chosen = await sized(() => row(page, 'steel-4130-n').dblclick());
    expect(chosen.job['pick']).toEqual({ material: 'steel-4130-n' });
    await expect.poll(() => pickedKey(page), WAIT).toBe('m steel-4130-n');
    await expectText(station(page, 'Pick'), 'chosen by hand, take the lightest');
    expect(await pickedMass(page)).toBe('3.801 kg');

    const taken = await sized(() => station(page, 'Pick').getByRole('button', { name: 'take the lightest' }).click());
    expect(taken.job).not.toHaveProperty('pick');
    expect(await pickedKey(page)).toBe('m al-6061-t6');

    await page.keyboard.press('Alt+5');
    await page.keyboard.press('ArrowUp');
    await page.keyboard.press('Home');
    await page.keyboard.press('ArrowDown');
    const byKey = await sized(() => page.keyboard.press('Enter'));
    expect(byKey.job['pick']).toEqual({ material: 'ti-6al-4v-annealed' });
    await expect.poll(() => pickedKey(page), WAIT).toBe('m ti-6al-4v-annealed');
  }));

it('other units change what is shown, never what was entered', () =>
  inWindow({ browser: browser(), job: PLAIN }, async ({ page, sized, remembered, folder }) => {
    const torque = field(page, 'torque, start');
    const kilograms = commandLineReport(PLAIN, folder).candidates[0]?.design?.mass ?? 0;
    await expect.poll(() => pickedMass(page), WAIT).toBe(`${kilograms.toFixed(3)} kg`);
    await page.getByRole('radiogroup', { name: 'units' }).getByText('US').click();
    await expect.poll(() => torque.inputValue(), WAIT).toBe('7965.7 lbf·in');
    expect(await pickedMass(page)).toBe(`${(kilograms / 0.45359237).toFixed(3)} lb`);
    await expect.poll(() => remembered()?.['settings'], WAIT).toEqual({ theme: 'paper', units: 'US' });
    expect(remembered()?.['job']).toEqual(PLAIN);

    const { job } = await sized(async () => {
      await torque.fill('600 lbf·ft');
      await torque.press('Enter');
    });
    expect(job['loads']).toMatchObject([{ torque: '600 lbf·ft' }]);
    expect(job['tube']).toEqual(PLAIN['tube']);
    await page.getByRole('radiogroup', { name: 'units' }).getByText('SI').click();
    await expect.poll(() => torque.inputValue(), WAIT).toBe('813.49 N·m');
    expect(await field(page, 'length between fittings').inputValue()).toBe('1.8 m');
  }));

it('a bad unit is one sentence in its place; the last sound brief stands, and nothing can be picked', () =>
  inWindow({ browser: browser(), job: PLAIN }, async ({ page, runs, sized }) => {
    const torque = field(page, 'torque, start');
    await expect.poll(() => pickedKey(page), WAIT).toBe('m al-6061-t6');
    await sized(() => row(page, 'steel-4130-n').dblclick());
    await expect.poll(() => pickedKey(page), WAIT).toBe('m steel-4130-n');
    await expectText(page.getByRole('status'), 'sized in');
    const [mass, rows, asked] = [await pickedMass(page), await shownRows(page), runs.length];
    await torque.fill('900 Nmm/s');
    await torque.press('Enter');

    const sentence = page.locator(`#${(await torque.getAttribute('aria-describedby')) ?? ''}`);
    await expectText(sentence, /^[^.]*“900 Nmm\/s”[^.]*\.$/);
    expect(await torque.getAttribute('aria-invalid')).toBe('true');
    await expectText(page.getByRole('banner'), '1 mistake shown: the last sound brief');
    expect(await pickedMass(page)).toBe(mass);
    expect(await shownRows(page)).toEqual(rows);
    expect(await page.getByRole('button', { name: 'take the lightest' }).isDisabled()).toBe(true);
    await row(page, 'ti-6al-4v-annealed').dblclick();
    await row(page, 'ti-6al-4v-annealed').press('Enter');
    expect(await pickedKey(page)).toBe('m steel-4130-n');

    expect(runs.length).toBe(asked);

    const { job } = await sized(async () => {
      await torque.fill('950 N·m');
      await torque.press('Enter');
    });
    expect(job).toMatchObject({ loads: [{ torque: '950 N·m' }], pick: { material: 'steel-4130-n' } });
    expect(await page.getByRole('button', { name: 'take the lightest' }).isEnabled()).toBe(true);
    expect(await torque.getAttribute('aria-invalid')).toBe('false');
  }));

it('a job in which nothing fits says why, is mended by one button, and one undo takes that back', () =>
  inWindow({ browser: browser(), job: NOTHING_FITS }, async ({ page, sized, folder }) => {
    const most = field(page, 'outer diameter at most');
    await expectText(page.getByRole('status'), 'nothing fits');
    await expectText(station(page, 'Pick'), 'stand against each other');
    await expectShown(page, commandLineReport(NOTHING_FITS, folder));
    const keys = station(page, 'Line-up').getByRole('button', { name: /^apply: outer diameter at most/ });
    expect(await keys.count()).toBe(2);

    const mended = await sized(() =>
      row(page, 'steel-4130-n')
        .getByRole('button', { name: /outer diameter/ })
        .click(),
    );
    expect(mended.job['tube']).toEqual({ length: '1.8 m', outerDiameterMax: '48.4 mm' });
    await expectText(page.getByRole('status'), '1 fits, 1 does not');
    await expectShown(page, mended.report);
    expect(await most.inputValue()).toBe('48.4 mm');
    expect(await pickedKey(page)).toBe('m steel-4130-n');

    const back = await sized(() => page.getByRole('button', { name: 'undo' }).click());
    expect(back.job).toEqual(NOTHING_FITS);
    expect(await most.inputValue()).toBe('45 mm');
    await expectText(page.getByRole('status'), 'nothing fits');
    expect(await page.getByRole('button', { name: 'undo' }).isDisabled()).toBe(true);
  }));

it('three demo jobs can be opened, and each is sized', () =>
  inWindow({ browser: browser() }, async ({ page, sized, folder }) => {
    const word = page.getByRole('button', { name: 'demo jobs' });
    const panel = page.getByRole('group', { name: 'demo jobs' });
    await expectText(page.getByRole('status'), 'sized in');
    for (const name of ['tracker', 'control-surface', 'interconnect']) {
      await word.click();
      expect(await panel.getByRole('button').count()).toBe(3);
      const { title } = demo(name);
      const { job, report } = await sized(() => panel.getByRole('button', { name: String(title) }).click());
      expect(job).toEqual(demo(name));
      expect(report).toEqual(commandLineReport(job, folder));
      await expectShown(page, report);
      expect(await panel.count()).toBe(0);
    }
  }));
