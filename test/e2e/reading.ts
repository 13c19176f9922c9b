import type { Locator, Page } from 'playwright-core';
import { expect } from 'vitest';
import { inUnit } from '../../src/quantity/format.js';
import type { Candidate, Report } from '../../src/report/report.js';

/** A row of the line-up as it stands on the screen. */
export interface ShownRow {
  /** "m al-6061-t6", or "h tube on the shelf" */
  readonly key: string;
  readonly rank: string;
  readonly size: string;
  readonly mass: string;
  readonly picked: boolean;
}

/** The field with a name. */
export const field = (page: Page, label: string): Locator => page.getByRole('textbox', { name: label, exact: true });

/** A station by its name. */
export const station = (page: Page, name: 'Brief' | 'Pick' | 'Line-up'): Locator =>
  page.getByRole('region', { name, exact: true });

/** The row of a material in the line-up. */
export const row = (page: Page, material: string): Locator => page.locator(`[data-key="m ${material}"]`);

/** The rows of the line-up from top to bottom. */
export function shownRows(page: Page): Promise<readonly ShownRow[]> {
  return page.locator('[data-key]').evaluateAll((rows) =>
    rows.map((element) => {
      const text = (part: string): string => element.querySelector(`.${part}`)?.textContent.trim() ?? '';
      return {
        key: element.getAttribute('data-key') ?? '',
        rank: text('rank'),
        size: text('size'),
        mass: text('mass'),
        picked: element.getAttribute('aria-selected') === 'true',
      };
    }),
  );
}

/** The large mass of the pick, with its unit. */
export async function pickedMass(page: Page): Promise<string> {
  const [number = '', unit = ''] = await station(page, 'Pick')
    .locator('.mass')
    .evaluate((mass) => Array.from(mass.childNodes, (node) => node.textContent?.trim() ?? ''));
  return `${number} ${unit}`;
}

/** The material of the row that is the pick; null where none is. */
export async function pickedKey(page: Page): Promise<string | null> {
  return (await shownRows(page)).find(({ picked }) => picked)?.key ?? null;
}

/** A number in as many decimals as the text that shows it has; at least so many. */
function inDecimalsOf(shown: string, value: number, least: number): string {
  const decimals = shown.split('.')[1]?.length ?? 0;
  return value.toFixed(Math.max(decimals, least));
}

function expectedRow({ material, design }: Candidate, index: number, shown: ShownRow | undefined): Partial<ShownRow> {
  if (design === null) return { key: `m ${material}`, rank: '', size: '', mass: '' };
  const [outer = '', wall = ''] = (shown?.size ?? '').split(' × ');
  const mm = (length: number): number => inUnit(length, 'length', 'mm');
  return {
    key: `m ${material}`,
    rank: String(index + 1),
    size: `${inDecimalsOf(outer, mm(design.outerDiameter), 1)} × ${inDecimalsOf(wall, mm(design.wall), 2)}`,
    mass: inDecimalsOf(shown?.mass ?? '', design.mass, 2),
  };
}

/** Waits until the line-up, in SI units, says what the report says: the order, every rank, size and mass. */
export async function expectShown(page: Page, report: Report): Promise<void> {
  await expect
    .poll(async () => {
      const rows = (await shownRows(page)).filter(({ key }) => key.startsWith('m '));
      const expected = report.candidates.map((candidate, index) => expectedRow(candidate, index, rows[index]));
      return { shown: rows.map(({ key, rank, size, mass }) => ({ key, rank, size, mass })), expected };
    }, WAIT)
    .toSatisfy(({ shown, expected }: { shown: unknown; expected: unknown }) => {
      return JSON.stringify(shown) === JSON.stringify(expected);
    });
}

/** How long a test waits for what must come. */
export const WAIT = { timeout: 15_000, interval: 20 } as const;

/** Waits for a text. */
export async function expectText(locator: Locator, text: string | RegExp): Promise<void> {
  const wanted: unknown = typeof text === 'string' ? expect.stringContaining(text) : expect.stringMatching(text);
  await expect.poll(async () => (await locator.innerText()).replace(/\s+/g, ' '), WAIT).toEqual(wanted);
}
