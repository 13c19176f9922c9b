// @vitest-environment happy-dom
import { type DOMWrapper, enableAutoUnmount, flushPromises, mount, type VueWrapper } from '@vue/test-utils';
import { getActivePinia } from 'pinia';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { nextTick } from 'vue';
import LineUpStation from '../../../renderer/lineup/LineUpStation.vue';
import type { JobDocument } from '../../../renderer/job/keyPath.js';
import { useJob } from '../../../renderer/stores/job.js';
import { usePick } from '../../../renderer/stores/pick.js';
import { EDIT_WAIT, useRun } from '../../../renderer/stores/run.js';
import { useSettings } from '../../../renderer/stores/settings.js';
import { begin, quickDesk, RECORDS, smallJob } from '../window.js';

enableAutoUnmount(afterEach);

/** A line-up of a job that is sized. */
async function sized(job: JobDocument = smallJob()): Promise<VueWrapper> {
  begin(job);
  useRun().connect(quickDesk());
  await flushPromises();
  const pinia = getActivePinia();
  if (pinia === undefined) throw new Error('The stores have not begun.');
  return mount(LineUpStation, { attachTo: document.body, global: { plugins: [pinia] } });
}

/** Lets an edit wait for the next one, and be sized. */
async function afterEdit(): Promise<void> {
  vi.advanceTimersByTime(EDIT_WAIT);
  await flushPromises();
}

function rows(station: VueWrapper): DOMWrapper<Element>[] {
  return station.findAll('[data-key]');
}

function names(station: VueWrapper): string[] {
  return rows(station).map((row) => row.get('.material').text());
}

function heading(station: VueWrapper, words: string): DOMWrapper<Element> {
  const found = station.findAll('[role=columnheader]').find((one) => one.text().startsWith(words));
  if (found === undefined) throw new Error(`There is no heading "${words}".`);
  return found;
}

beforeEach(() => {
  vi.useFakeTimers();
});

afterEach(() => {
  vi.useRealTimers();
});

const SMALL = ['Aluminium 2024-T3', 'Aluminium 6061-T6', 'Steel 4130 normalised'];

describe('the line-up', () => {
  it('says what will stand here before anything is sized', () => {
    begin();
    const pinia = getActivePinia();
    const station = mount(LineUpStation, { global: { plugins: pinia === undefined ? [] : [pinia] } });
    expect(station.text()).toContain('One row for each material will stand here.');
  });

  it('lists materials lightest first, with rank, size, mass, what is over the lightest, twist and limits', async () => {
    const station = await sized();
    expect(names(station)).toEqual(SMALL);
    const [first, second] = rows(station);
    expect(first?.get('.rank').text()).toBe('1');
    expect(first?.get('.over').text()).toBe('lightest');
    expect(second?.get('.size').text()).toMatch(/^90\.00 × \d\.\d{3}$/);
    expect(second?.get('.over').text()).toMatch(/^\d\.\d{3} kg ?\+\d+ %$/);
    expect(second?.get('.twist').text()).toBe('3.00');
    expect(second?.get('.governs').text()).toBe('twist, outer diameter');
  });

  it('marks the pick, and no other row', async () => {
    const station = await sized(smallJob({ pick: { material: 'steel-4130-n' } }));
    expect(rows(station).map((row) => row.attributes('aria-selected'))).toEqual(['false', 'false', 'true']);
    expect(rows(station).map((row) => row.classes('picked'))).toEqual([false, false, true]);
  });

  it('follows the units', async () => {
    const station = await sized();
    useSettings().units = 'US';
    await nextTick();
    expect(heading(station, 'mass').text()).toBe('mass, lb');
    expect(rows(station)[1]?.get('.size').text()).toMatch(/^3\.5433 × 0\.\d{4}$/);
  });

  it('has a column of costs where something has a price, and none where nothing has', async () => {
    const without = await sized();
    expect(without.find('.costless').exists()).toBe(true);
    const record = RECORDS.find((one) => (one as { id: string }).id === 'al-6061-t6') as object;
    const priced = { ...record, id: 'priced', pricePerKilogram: 6.5 };
    const station = await sized(smallJob({ materials: [priced], currency: 'EUR' }));
    expect(station.find('.costless').exists()).toBe(false);
    expect(heading(station, 'cost').text()).toBe('cost, €');
    expect(rows(station)[0]?.get('.cost').text()).toMatch(/^\d+\.\d\d$/);
  });
});

describe('sorting', () => {
  it('goes by mass at first, and by what a click on a heading says, once up and once down', async () => {
    const station = await sized();
    expect(heading(station, 'mass').attributes('aria-sort')).toBe('ascending');
    await heading(station, 'material').get('button').trigger('click');
    expect(heading(station, 'mass').attributes('aria-sort')).toBe('none');
    expect(heading(station, 'material').attributes('aria-sort')).toBe('ascending');
    expect(names(station)).toEqual(SMALL);
    await heading(station, 'material').get('button').trigger('click');
    expect(heading(station, 'material').attributes('aria-sort')).toBe('descending');
    expect(names(station)).toEqual(SMALL.toReversed());
    expect(rows(station).map((row) => row.get('.rank').text())).toEqual(['3', '2', '1']);
  });
});

describe('the keyboard', () => {
  it('comes to the pick by Tab, walks by Up, Down, Home and End, and keeps the focus as it goes', async () => {
    const station = await sized();
    expect(rows(station).map((row) => row.attributes('tabindex'))).toEqual(['0', '-1', '-1']);
    const walk = async (from: number, key: string): Promise<number> => {
      await rows(station)[from]?.trigger('keydown', { key });
      await nextTick();
      return rows(station).findIndex(({ element }) => element === document.activeElement);
    };
    expect(await walk(0, 'ArrowDown')).toBe(1);
    expect(usePick().focus).toBe('al-6061-t6');
    expect(await walk(1, 'End')).toBe(2);
    expect(await walk(2, 'ArrowDown')).toBe(2);
    expect(await walk(2, 'ArrowUp')).toBe(1);
    expect(await walk(1, 'Home')).toBe(0);
    expect(rows(station).map((row) => row.attributes('tabindex'))).toEqual(['0', '-1', '-1']);
  });

  it('comes to a row when the station itself is come to', async () => {
    const station = await sized();
    station.get<HTMLElement>('section').element.focus();
    await nextTick();
    expect(document.activeElement).toBe(rows(station)[0]?.element);
  });

  it('picks by Enter, as one edit that can be undone', async () => {
    const station = await sized();
    await rows(station)[2]?.trigger('keydown', { key: 'Enter' });
    expect(useJob().document['pick']).toEqual({ material: 'steel-4130-n' });
    expect(rows(station)[2]?.classes('picked')).toBe(true);
    useJob().undo();
    expect(useJob().document['pick']).toBeUndefined();
  });

  it('copies the row by Ctrl+C', async () => {
    const station = await sized();
    await rows(station)[0]?.trigger('keydown', { key: 'c', ctrlKey: true });
    const put = vi.fn();
    const copy = new Event('copy', { cancelable: true });
    Object.defineProperty(copy, 'clipboardData', { value: { setData: put } });
    document.dispatchEvent(copy);
    expect(put).toHaveBeenCalledExactlyOnceWith(
      'text/plain',
      expect.stringMatching(/^1\tAluminium 2024-T3, drawn tube\t90\.00\t/),
    );
  });
});

describe('the pointer', () => {
  it('previews the focus, keeps it with a click, and picks with a double click', async () => {
    const station = await sized();
    const pick = usePick();
    await rows(station)[2]?.trigger('mouseenter');
    expect(pick.focus).toBe('steel-4130-n');
    await station.get('[role=grid]').trigger('mouseleave');
    expect(pick.focus).toBe('al-2024-t3');
    await rows(station)[1]?.trigger('click');
    expect(pick.focus).toBe('al-6061-t6');
    expect(useJob().document['pick']).toBeUndefined();
    await rows(station)[1]?.trigger('dblclick');
    expect(useJob().document['pick']).toEqual({ material: 'al-6061-t6' });
  });
});

describe('while the brief is in error', () => {
  it('keeps the last rows, and neither picks nor applies', async () => {
    const station = await sized(smallJob({ tube: { length: '1.4 m', outerDiameterMax: '25 mm' } }));
    useJob().edit('loads.0.torque', '900 Nmm/s');
    await afterEdit();
    expect(rows(station)).toHaveLength(3);
    await rows(station)[2]?.trigger('keydown', { key: 'Enter' });
    await rows(station)[2]?.trigger('dblclick');
    expect(useJob().document['pick']).toBeUndefined();
    const keys = station.findAll<HTMLButtonElement>('.reason button');
    expect(keys.length).toBeGreaterThan(0);
    expect(keys.every(({ element }) => element.disabled)).toBe(true);
  });
});

describe('a material that nothing fits of', () => {
  const tight = smallJob({ tube: { length: '1.4 m', outerDiameterMax: '40 mm' } });

  it('says why in one sentence, has no rank and stands after the rest, whatever it is sorted by', async () => {
    const station = await sized(tight);
    const last = rows(station).at(-1);
    expect(last?.get('.rank').text()).toBe('');
    expect(last?.get('.reason').text()).toMatch(/^nothing fits: twist and .*; it fits with outer diameter at most \d/);
    await heading(station, 'material').get('button').trigger('click');
    await heading(station, 'material').get('button').trigger('click');
    expect(rows(station).at(-1)?.find('.reason').exists()).toBe(true);
  });

  it('cannot be picked', async () => {
    const station = await sized(tight);
    await rows(station).at(-1)?.trigger('dblclick');
    expect(useJob().document['pick']).toBeUndefined();
  });

  it('fits once a smallest change is applied, by one edit that can be undone', async () => {
    const station = await sized(tight);
    const before = station.findAll('.reason').length;
    const key = rows(station).at(-1)?.get('.reason button');
    expect(key?.attributes('aria-label')).toMatch(/^apply: outer diameter at most .* in place of 40 mm$/);
    await key?.trigger('click');
    await afterEdit();
    expect(station.findAll('.reason').length).toBeLessThan(before);
    useJob().undo();
    expect(useJob().document).toEqual(tight);
  });

  it('is not walked away from by the keys of its own', async () => {
    const station = await sized(tight);
    await rows(station).at(-1)?.get('.reason button').trigger('keydown', { key: 'Home' });
    expect(rows(station).at(-1)?.element.contains(document.activeElement)).toBe(false);
    expect(usePick().focus).toBe(usePick().picked?.material.id);
  });
});

describe('designs in hand', () => {
  it('are ranked if they carry the job, and say what they fail if they do not', async () => {
    const hold = [
      { name: 'stout', material: 'al-6061-t6', outerDiameter: '90 mm', wall: '6 mm' },
      { name: 'slight', material: 'al-6061-t6', outerDiameter: '60 mm', wall: '1 mm' },
    ];
    const station = await sized(smallJob({ hold }));
    expect(rows(station).map((row) => row.get('.rank').text())).toEqual(['1', '2', '3', '4', '']);
    expect(rows(station).at(-1)?.get('.governs').text()).toMatch(/^fails twist \d+ %/);
    await rows(station)[3]?.trigger('keydown', { key: 'Enter' });
    expect(useJob().document['pick']).toEqual({ held: 'stout' });
  });
});

describe('a long line-up', () => {
  it('shows every one of forty designs', async () => {
    const materials = RECORDS.map((one) => (one as { id: string }).id);
    const hold = Array.from({ length: 40 - materials.length }, (_, i) => ({
      name: `tube ${String(i)}`,
      material: materials[0],
      outerDiameter: '80 mm',
      wall: `${String(i + 2)} mm`,
    }));
    const station = await sized(smallJob({ materials, hold }));
    expect(rows(station)).toHaveLength(40);
    expect(new Set(rows(station).map((row) => row.attributes('data-key'))).size).toBe(40);
  });
});
