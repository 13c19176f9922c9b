import type { Page } from 'playwright-core';
import { expect, it } from 'vitest';
import { demo, PLAIN } from './jobs.js';
import { expectText, field, pickedKey, row, shownRows, station, WAIT } from './reading.js';
import { useBrowser } from './useBrowser.js';
import { inWindow } from './window.js';

const browser = useBrowser();

/** What every field and tick of the window says, and whether the pick was chosen: what is known before the job is sized. */
async function said(page: Page): Promise<readonly string[]> {
  const fields = await page.locator('input, textarea, [role=checkbox]').evaluateAll((all) =>
    all.map((one) => {
      const name =
        one.getAttribute('aria-label') ?? one.getAttribute('data-material') ?? one.getAttribute('name') ?? '';
      if (one instanceof HTMLInputElement && ['checkbox', 'radio'].includes(one.type)) {
        return `${name} ${one.value}: ${one.checked}`;
      }
      const value = one instanceof HTMLInputElement || one instanceof HTMLTextAreaElement ? one.value : '';
      return `${name}: ${value}`;
    }),
  );
  const choice = await station(page, 'Pick').getByRole('heading', { level: 2 }).innerText();
  return [...fields, `chosen: ${/chosen by hand/i.test(choice)}`];
}

/** The name of what has the keyboard. */
function focused(page: Page): Promise<string> {
  return page.evaluate(() => {
    const { activeElement } = document;
    return (
      activeElement?.getAttribute('aria-label') ??
      activeElement?.getAttribute('data-key') ??
      activeElement?.textContent.trim() ??
      ''
    );
  });
}

async function fill(page: Page, label: string, text: string): Promise<void> {
  await field(page, label).fill(text);
  await field(page, label).press('Enter');
}

const EDITS: readonly (readonly [what: string, edit: (page: Page) => Promise<void>])[] = [
  ['a torque', (page) => fill(page, 'torque, jam', '1.3 kN·m')],
  ['a mistake', (page) => fill(page, 'length between fittings', '1.8 kg')],
  ['the mistake mended', (page) => fill(page, 'length between fittings', '1700 mm')],
  ['a title', (page) => fill(page, 'job title', 'Another shaft')],
  ['a number', (page) => fill(page, 'document number', 'TS-7')],
  ['an empty field', (page) => fill(page, 'axial, one motor out', '')],
  ['a factor', (page) => fill(page, 'ultimate factor, jam', '1.4')],
  ['the hand', (page) => page.getByRole('checkbox', { name: /^reversing, jam/ }).click()],
  ['a new case', (page) => page.getByRole('button', { name: 'add a case' }).click()],
  ['a copy', (page) => page.getByRole('button', { name: 'copy jam' }).click()],
  ['a case removed', (page) => page.getByRole('button', { name: 'remove jam', exact: true }).click()],
  ['no speed', (page) => fill(page, 'fastest running speed', '')],
  ['a material out', (page) => page.locator('[data-material="al-7075-t6"]').click()],
  ['a price', (page) => fill(page, 'price of Aluminium 6061-T6, drawn tube', '6.50')],
  ['stock sizes', (page) => page.getByText('from a stock list').click()],
  ['another list', (page) => page.getByRole('radiogroup', { name: 'stock list' }).locator('label').first().click()],
  ['a knock-down', (page) => fill(page, 'torsion buckling knock-down', '0.6')],
  ['a note', (page) => page.getByRole('textbox', { name: 'note', exact: true }).fill('Turned by hand.')],
  ['a pick', (page) => row(page, 'steel-4130-n').dblclick()],
  [
    'another job',
    async (page) => {
      await page.getByRole('button', { name: 'demo jobs' }).click();
      await page.getByRole('button', { name: String(demo('tracker')['title']) }).click();
    },
  ],
];

it('every edit is undone and done again by the keyboard', () =>
  inWindow({ browser: browser() }, async ({ page }) => {
    await expect.poll(() => pickedKey(page), WAIT).toBe('m al-6061-t6');
    const states: (readonly string[])[] = [];
    const keep = async (): Promise<void> => {
      states.push(await said(page));
    };
    await keep();
    for (const [what, edit] of EDITS) {
      await edit(page);
      await page.keyboard.press('Alt+1');
      await keep();
      expect(states.at(-1), what).not.toEqual(states.at(-2));
    }
    for (let at = EDITS.length - 1; at >= 0; at--) {
      await page.keyboard.press('Control+Z');
      await expect.poll(() => said(page), { ...WAIT, message: `undo ${EDITS[at]?.[0] ?? ''}` }).toEqual(states[at]);
    }
    expect(await page.getByRole('button', { name: 'undo' }).isDisabled()).toBe(true);
    await expect.poll(() => pickedKey(page), WAIT).toBe('m al-6061-t6');
    for (let at = 1; at <= EDITS.length; at++) {
      await page.keyboard.press(at % 2 === 0 ? 'Control+Y' : 'Control+Shift+Z');
      await expect.poll(() => said(page), { ...WAIT, message: `redo ${EDITS[at - 1]?.[0] ?? ''}` }).toEqual(states[at]);
    }
    expect(await page.getByRole('button', { name: 'redo' }).isDisabled()).toBe(true);
    await expect.poll(() => pickedKey(page), WAIT).toBe('m steel-e355-n');
  }));

it('keys lead to every station, round them, and are listed', () =>
  inWindow({ browser: browser() }, async ({ page }) => {
    await expectText(page.getByRole('status'), 'sized in');
    await page.keyboard.press('Alt+2');
    expect(await focused(page)).toMatch(/^Fronts: /);
    await page.keyboard.press('Alt+3');
    expect(await focused(page)).toMatch(/^Wall map: /);
    await page.keyboard.press('Alt+4');
    expect(await focused(page)).toBe('Pick');
    await page.keyboard.press('Alt+1');
    expect(await focused(page)).toBe('Brief');
    await page.keyboard.press('Alt+5');
    await expect.poll(() => focused(page), WAIT).toBe('m al-6061-t6');
    await page.keyboard.press('F6');
    expect(await focused(page)).toBe('Brief');
    await page.keyboard.press('Shift+F6');
    await expect.poll(() => focused(page), WAIT).toBe('m al-6061-t6');
    await page.keyboard.press('Shift+F6');
    expect(await focused(page)).toBe('Pick');

    await page.keyboard.press('F1');
    const keys = page.getByRole('group', { name: 'keys' });
    await expectText(keys, 'Alt+1');
    await page.keyboard.press('Escape');
    await expect.poll(() => keys.count(), WAIT).toBe(0);
  }));

it('from a first start to a new pick with the keyboard alone', () =>
  inWindow({ browser: browser() }, async ({ page, sized }) => {
    await expect.poll(() => pickedKey(page), WAIT).toBe('m al-6061-t6');
    await page.keyboard.press('Alt+1');
    for (let tabs = 0; (await focused(page)) !== 'torque, jam'; tabs++) {
      expect(tabs).toBeLessThan(10);
      await page.keyboard.press('Tab');
    }
    await page.keyboard.type('3000 N·m');
    const { report } = await sized(() => page.keyboard.press('ArrowUp'));
    expect(report.job.loads[1]?.torque).toBe(3001);
    await expect.poll(() => pickedKey(page), WAIT).toBe('m al-7075-t6');
    await page.keyboard.press('Escape');
    expect(await field(page, 'torque, jam').inputValue()).toBe('1150 N·m');

    // a material is left out
    for (let tabs = 0; !(await page.evaluate(() => document.activeElement?.matches('.tick') ?? false)); tabs++) {
      expect(tabs).toBeLessThan(60);
      await page.keyboard.press('Tab');
    }
    await page.keyboard.press('ArrowDown');
    const fewer = await sized(() => page.keyboard.press('Space'));
    expect(fewer.report.candidates.map(({ material }) => material)).not.toContain('al-7075-t6');

    // and another chosen
    await page.keyboard.press('Alt+5');
    await page.keyboard.press('End');
    const chosen = await sized(() => page.keyboard.press('Enter'));
    expect(chosen.report.pick).toEqual({ material: 'stainless-17-4ph-h1025' });
    await expectText(station(page, 'Pick'), 'Stainless steel 17-4PH');
  }));

it('Tab comes to every control once, in the order of the stations, and each shows that it has the keyboard', () =>
  inWindow({ browser: browser(), job: PLAIN }, async ({ page }) => {
    await expectText(page.getByRole('status'), 'sized in');
    const seen: string[] = [];
    await page.keyboard.press('Tab');
    for (let name = await mark(page); name !== ''; name = await mark(page)) {
      seen.push(name);
      await page.keyboard.press('Tab');
    }
    const stations = seen.map((name) => name.split(' ')[0] ?? '');
    expect(stations.filter((name, index) => name !== stations[index - 1])).toEqual([
      'head',
      'Brief',
      'Front',
      'Wall',
      'Line-up',
    ]);
    expect(seen.filter((name) => name.endsWith('!'))).toEqual([]);
    expect((await shownRows(page)).length).toBe(3);
  }));

/** Names the control that has the keyboard by its station, once; with a "!" where nothing marks it. */
function mark(page: Page): Promise<string> {
  return page.evaluate(() => {
    const element = document.activeElement;
    if (!(element instanceof HTMLElement) || element === document.body || element.dataset['seen'] !== undefined)
      return '';
    element.dataset['seen'] = '';
    const where = element.closest('[data-station]')?.getAttribute('aria-label') ?? 'head';
    const marker = element.matches('[type=radio]') ? (element.nextElementSibling ?? element) : element;
    const { outlineStyle, borderBottomWidth, boxShadow } = getComputedStyle(marker);
    const thick = borderBottomWidth === '2px' || boxShadow !== 'none';
    const marked = outlineStyle !== 'none' || (element.matches('input, textarea') && thick);
    return `${where} ${element.getAttribute('aria-label') ?? element.textContent.trim()}${marked ? '' : '!'}`;
  });
}
