import { AxeBuilder } from '@axe-core/playwright';
import type { Page } from 'playwright-core';
import { expect, it } from 'vitest';
import { demo, NOTHING_FITS } from './jobs.js';
import { expectText, field, station } from './reading.js';
import { useBrowser } from './useBrowser.js';
import type { Opening } from './open.js';
import { artefact, inWindow, type OpenWindow } from './window.js';

const browser = useBrowser();

const THEMES = ['paper', 'blueprint'] as const;
/** Widths and heights in CSS px; the last is 1440 × 900 at a zoom of 200 %. */
const SIZES = [
  { width: 1440, height: 900, zoom: 1 },
  { width: 1024, height: 768, zoom: 1 },
  { width: 800, height: 900, zoom: 1 },
  { width: 720, height: 450, zoom: 2 },
] as const;

/** Opens a window whose results are there, and in which everything that can be folded is open. */
function inSizedWindow(opening: Omit<Opening, 'browser'>, act: (window: OpenWindow) => Promise<void>): Promise<void> {
  return inWindow({ browser: browser(), ...opening }, async (window) => {
    await expectText(window.page.getByRole('status'), 'sized in');
    await window.page.evaluate(() => document.fonts.ready.then(() => null));
    await act(window);
  });
}

async function unfold(page: Page): Promise<void> {
  const edit = station(page, 'Brief').getByRole('button', { name: 'edit', exact: true });
  if ((await edit.count()) > 0) await edit.click();
}

/** The findings of axe that are serious or critical, each with what it is about. */
async function seriousFindings(page: Page): Promise<readonly string[]> {
  const { violations } = await new AxeBuilder({ page }).analyze();
  const serious = violations.filter(({ impact }) => impact === 'serious' || impact === 'critical');
  return serious.flatMap(({ id, nodes }) =>
    nodes.map(({ target, failureSummary }) => `${id}: ${target.join(' ')}: ${failureSummary ?? ''}`),
  );
}

async function makeMistake(page: Page): Promise<void> {
  const torque = field(page, 'torque, jam');
  await torque.fill('900 Nmm/s');
  await torque.press('Enter');
}

function chooseTheme(page: Page, theme: string): Promise<void> {
  return page.getByRole('radiogroup', { name: 'sheet' }).getByText(theme).click();
}

it.each([1440, 800])('axe finds nothing serious at %i px, on paper and on blueprint', (width) =>
  inSizedWindow({ width, height: 900 }, async ({ page }) => {
    await unfold(page);
    for (const theme of THEMES) {
      await chooseTheme(page, theme);
      expect(await seriousFindings(page), `sized, ${theme}`).toEqual([]);
    }
    await page.getByRole('button', { name: 'show every load case' }).click();
    await station(page, 'Brief')
      .getByRole('button', { name: /more of the library/ })
      .click();
    await page.getByText('from a stock list').click();
    await makeMistake(page);
    await page.getByRole('button', { name: 'demo jobs' }).click();
    expect(await seriousFindings(page), 'in error, all unfolded').toEqual([]);
    await page.keyboard.press('Escape');
    await chooseTheme(page, 'paper');
    await page.keyboard.press('F1');
    expect(await seriousFindings(page), 'in error, with the keys').toEqual([]);
  }),
);

it('axe finds nothing serious where nothing fits', () =>
  inSizedWindow({ job: NOTHING_FITS }, async ({ page }) => {
    for (const theme of THEMES) {
      await chooseTheme(page, theme);
      await page.screenshot({ path: artefact(`window-nothing-fits-${theme}`) });
      expect(await seriousFindings(page), theme).toEqual([]);
    }
  }));

/** What cannot be seen whole or pressed even after it was scrolled into view. */
function unreachable(page: Page): Promise<readonly string[]> {
  return page.evaluate(() => {
    const controls = Array.from(
      document.querySelectorAll<HTMLElement>('button, input, textarea, [tabindex="0"], [data-key]'),
    );
    const seen = (element: HTMLElement): boolean => {
      // a switch's own input is a dot behind its word
      const target = element.matches('[type=radio], [type=file]') ? (element.closest('label') ?? element) : element;
      target.scrollIntoView({ block: 'center', inline: 'center', behavior: 'instant' });
      const { left, right, top, bottom, width, height } = target.getBoundingClientRect();
      if (width === 0 || height === 0 || left < 0 || right > innerWidth + 0.5) return false;
      const hit = document.elementFromPoint((left + right) / 2, (Math.max(top, 0) + Math.min(bottom, innerHeight)) / 2);
      return (
        hit !== null &&
        (target.contains(hit) || hit.contains(target) || hit.closest('label') === target.closest('label'))
      );
    };
    // a narrow line-up leaves columns out, their headings with them
    return controls
      .filter((element) => element.checkVisibility() && !seen(element))
      .map((element) => element.outerHTML.slice(0, 160));
  });
}

/** Fields of the brief whose value is cut off, or that stick out of their station. */
function cutOff(page: Page): Promise<readonly string[]> {
  return station(page, 'Brief').evaluate((brief) => {
    const edge = brief.getBoundingClientRect().right - 16;
    const fields = Array.from(brief.querySelectorAll<HTMLInputElement>('input[type=text]:not(.words)'));
    const pen = document.createElement('canvas').getContext('2d');
    const isCut = (input: HTMLInputElement): boolean => {
      if (pen === null) throw new Error('there is no canvas');
      pen.font = getComputedStyle(input).font;
      return pen.measureText(input.value).width > input.clientWidth + 0.01;
    };
    const isOut = (input: HTMLInputElement): boolean =>
      input.closest('.scroll') === null && input.getBoundingClientRect().right > edge + 0.5;
    return fields
      .filter((input) => isCut(input) || isOut(input))
      .map(({ ariaLabel, value }) => `${ariaLabel ?? ''}: ${value}`);
  });
}

it.each(SIZES)('everything can be reached at $width × $height, zoomed $zoom', ({ width, height, zoom }) =>
  inSizedWindow({ width, height, zoom, job: demo('control-surface') }, async ({ page }) => {
    await page.screenshot({ path: artefact(`window-${width}`), fullPage: true });
    await unfold(page);
    const wide = (): Promise<number> =>
      page.evaluate(() => document.documentElement.scrollWidth - document.documentElement.clientWidth);
    expect(await wide()).toBeLessThanOrEqual(0);
    expect(await page.getByRole('textbox').count()).toBeGreaterThan(25);
    expect(await unreachable(page)).toEqual([]);
    expect(await cutOff(page)).toEqual([]);
    await page.getByRole('radiogroup', { name: 'units' }).getByText('US').click();
    await expectText(station(page, 'Pick').locator('.mass'), 'lb');
    await page.screenshot({ path: artefact(`window-${width}-us-unfolded`), fullPage: true });
    expect(await wide()).toBeLessThanOrEqual(0);
    expect(await unreachable(page)).toEqual([]);
    expect(await cutOff(page)).toEqual([]);
  }),
);

it('pictures of each station and of the whole window, on paper and on blueprint', () =>
  inSizedWindow({}, async ({ page, sized }) => {
    for (const theme of THEMES) {
      await chooseTheme(page, theme);
      await page.mouse.move(0, 0);
      await page.screenshot({ path: artefact(`window-1440-${theme}`) });
      await page.getByRole('banner').screenshot({ path: artefact(`head-${theme}`) });
      for (const name of ['Brief', 'Pick', 'Line-up'] as const) {
        const picture = await station(page, name).screenshot({ path: artefact(`${name.toLowerCase()}-${theme}`) });
        expect(picture.length).toBeGreaterThan(5000);
      }
    }
    await page.keyboard.press('F1');
    await page.screenshot({ path: artefact('keys-blueprint') });
    await page.keyboard.press('Escape');
    await page.getByRole('button', { name: 'demo jobs' }).click();
    await page.screenshot({ path: artefact('demo-jobs-blueprint') });
    await sized(() => page.getByRole('button', { name: String(demo('tracker')['title']) }).click());
    await chooseTheme(page, 'paper');
    await page.screenshot({ path: artefact('window-tracker') });
    const torque = field(page, 'torque, storm, row stowed');
    await torque.fill('900 Nmm/s');
    await torque.press('Enter');
    await page.screenshot({ path: artefact('window-mistake') });
  }));
