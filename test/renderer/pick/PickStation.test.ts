// @vitest-environment happy-dom
import { enableAutoUnmount, flushPromises, mount, type VueWrapper } from '@vue/test-utils';
import { getActivePinia } from 'pinia';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { nextTick } from 'vue';
import type { JobDocument } from '../../../renderer/job/keyPath.js';
import PickStation from '../../../renderer/pick/PickStation.vue';
import { useJob } from '../../../renderer/stores/job.js';
import { EDIT_WAIT, useRun } from '../../../renderer/stores/run.js';
import { useSettings } from '../../../renderer/stores/settings.js';
import { CAUTION } from '../../../src/report/words.js';
import { begin, quickDesk, smallJob } from '../window.js';

enableAutoUnmount(afterEach);

function mounted(): VueWrapper {
  const pinia = getActivePinia();
  if (pinia === undefined) throw new Error('The stores have not begun.');
  return mount(PickStation, { attachTo: document.body, global: { plugins: [pinia] } });
}

/** The station of a job that is sized. */
async function sized(job: JobDocument = smallJob()): Promise<VueWrapper> {
  begin(job);
  useRun().connect(quickDesk());
  await flushPromises();
  return mounted();
}

/** How the pick came to be, as the eye reads it. */
function choice(station: VueWrapper): string {
  return station.get('.choice').text().replace(/\s+/g, ' ');
}

async function afterEdit(): Promise<void> {
  vi.advanceTimersByTime(EDIT_WAIT);
  await flushPromises();
}

beforeEach(() => {
  vi.useFakeTimers();
});

afterEach(() => {
  vi.useRealTimers();
});

const loads = [
  { name: 'jam', torque: '900 N·m', twistMax: '3 deg' },
  { name: 'cruise', torque: '420 N·m', axial: '-2 kN' },
];

describe('the pick', () => {
  it('gives the caution before anything is sized, and always', async () => {
    begin();
    expect(mounted().text()).toContain(CAUTION);
    expect((await sized()).text()).toContain(CAUTION);
    const tight = smallJob({ tube: { length: '1.4 m', outerDiameterMax: '25 mm' } });
    expect((await sized(tight)).text()).toContain(CAUTION);
  });

  it('is the lightest by itself, drawn, with its mass', async () => {
    const station = await sized();
    expect(choice(station)).toBe('the lightest');
    expect(station.get('.name strong').text()).toBe('Aluminium 2024-T3');
    expect(station.get('.name').text()).toContain('drawn tube, the lightest of 3');
    expect(station.get('.mass').text()).toMatch(/^\d\.\d{3}kg$/);
    expect(station.get('svg[role=img]').attributes('aria-label')).toMatch(/^Section of the tube to scale: Ø 90\.0/);
  });

  it('may be chosen by hand, with the way back', async () => {
    const station = await sized(smallJob({ pick: { material: 'steel-4130-n' } }));
    expect(choice(station)).toBe('chosen by hand, take the lightest');
    expect(station.get('.name').text()).toMatch(/third of 3, \d\.\d{3} kg over the lightest$/);
    await station.get('.choice button').trigger('click');
    expect(useJob().document['pick']).toBeUndefined();
    expect(choice(station)).toBe('the lightest');
    useJob().undo();
    await nextTick();
    expect(choice(station)).toBe('chosen by hand, take the lightest');
  });

  it('says that what was chosen by hand is the lightest too', async () => {
    const station = await sized(smallJob({ pick: { material: 'al-2024-t3' } }));
    expect(choice(station)).toBe('chosen by hand, and the lightest');
  });

  it('is not changed while the brief is in error; what was sound stays', async () => {
    const station = await sized(smallJob({ pick: { material: 'steel-4130-n' } }));
    useJob().edit('loads.0.torque', 'much');
    await afterEdit();
    expect(station.get<HTMLButtonElement>('.choice button').element.disabled).toBe(true);
    expect(station.find('.mass').exists()).toBe(true);
  });

  it('says the whirl speed only where the job runs', async () => {
    expect((await sized()).get('dl').text()).not.toContain('first whirl');
    expect((await sized(smallJob({ speed: { max: '3000 rpm' } }))).get('dl').text()).toMatch(/first whirl\s*\d+ rpm/);
  });

  it('follows the units', async () => {
    const station = await sized();
    useSettings().units = 'US';
    await nextTick();
    expect(station.get('.mass').text()).toMatch(/lb$/);
    expect(station.get('svg[role=img]').attributes('aria-label')).toContain('in inches');
    expect(station.get('.limits').text()).toContain('lbf·in');
  });

  it('says how surely nothing of the material is lighter', async () => {
    const remarks = (await sized()).get('.remarks');
    expect(remarks.text()).toMatch(
      /Proved lightest of this material to within [\d.]+ parts per million: .*, \d+ evaluations\./,
    );
  });

  it('gives every flag as a sentence', async () => {
    const station = await sized(smallJob({ loads: [{ ...loads[0], reversing: true }] }));
    expect(station.findAll('.flag').map((flag) => flag.text())).toEqual([
      'The load reverses and gives no shear allowable: fatigue is not covered.',
    ]);
  });
});

describe('how full each limit is', () => {
  it('stands fullest first, those that govern in copper, the bar no longer than full', async () => {
    const station = await sized();
    const percents = station.findAll('.limits .percent').map((cell) => Number(cell.text()));
    expect(percents.length).toBeGreaterThan(5);
    expect(percents).toEqual(percents.toSorted((a, b) => b - a));
    expect(station.findAll('.limits .governs th').map((cell) => cell.text())).toEqual(['twist', 'outer diameter']);
    for (const bar of station.findAll<HTMLElement>('.limits u'))
      expect(Number.parseFloat(bar.element.style.width)).toBeLessThanOrEqual(100);
  });

  it('names the load case where there are several, and shows every case where it is asked to', async () => {
    const station = await sized(smallJob({ loads }));
    expect(station.get('.limits th').attributes('title')).toBe('twist, jam');
    const count = station.findAll('.limits tr').length;
    await station.get('.every-case').trigger('click');
    expect(station.findAll('.limits tr').length).toBeGreaterThan(count);
    expect(station.get('.every-case').text()).toBe('show each limit’s fullest case alone');
    await station.get('.every-case').trigger('click');
    expect(station.findAll('.limits tr')).toHaveLength(count);
  });

  it('notes where a percentage is an interaction’s', async () => {
    const both = { ...loads[0], bending: '200 N·m' };
    expect((await sized(smallJob({ loads: [both] }))).get('.limits').text()).toContain('† thrust or bending');
    expect((await sized()).get('.limits').text()).not.toContain('†');
  });
});

describe('what a limit costs', () => {
  it('lists the full limits, the dearest first, with the ease of 1 % written out', async () => {
    const station = await sized();
    const lines = station.findAll('.costs dl > div').map((line) => line.text());
    expect(lines).toHaveLength(2);
    expect(lines[0]).toMatch(/^outer diameter\s*90\.0 to 90\.9 mm\s*\d+\.\d g$/);
    expect(lines[1]).toMatch(/^twist\s*3\.00 to 3\.03 deg\s*\d+\.\d g$/);
    expect(station.get('.costs').text()).toMatch(/The other \w+ are not full\.$/);
  });

  it('is not said of a design in hand', async () => {
    const hold = [{ name: 'shelf', material: 'al-6061-t6', outerDiameter: '60 mm', wall: '2 mm' }];
    const station = await sized(smallJob({ hold, pick: { held: 'shelf' } }));
    expect(station.get('.name').text()).toMatch(
      /^shelf.*in hand, Aluminium 6061-T6, drawn tube, does not carry the job$/,
    );
    expect(station.find('.costs').exists()).toBe(false);
    expect(station.find('.proof').exists()).toBe(false);
  });
});

describe('where nothing fits', () => {
  const tight = smallJob({ tube: { length: '1.4 m', outerDiameterMax: '25 mm' } });

  it('gives way to the conflict, and one line for each smallest change', async () => {
    const station = await sized(tight);
    expect(station.find('.mass').exists()).toBe(false);
    expect(station.find('svg[role=img]').exists()).toBe(false);
    expect(choice(station)).toBe('nothing fits');
    expect(station.get('.conflict').text()).toMatch(/^Nothing fits: twist.* stand against each other\.$/);
    const lines = station.findAll('.nothing li').map((line) => line.text());
    expect(lines[0]).toMatch(/^outer diameter at most\s*25 mm to \d[\d.]* mm\s*apply$/);
  });

  it('fits once a change is applied, by one edit that can be undone', async () => {
    const station = await sized(tight);
    await station.get('.nothing li button').trigger('click');
    await afterEdit();
    expect(station.find('.mass').exists()).toBe(true);
    useJob().undo();
    expect(useJob().document).toEqual(tight);
    await afterEdit();
    expect(station.find('.conflict').exists()).toBe(true);
  });
});
