// @vitest-environment happy-dom
import { enableAutoUnmount, flushPromises, mount, type VueWrapper } from '@vue/test-utils';
import { getActivePinia } from 'pinia';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { nextTick } from 'vue';
import FrontStation from '../../../renderer/front/FrontStation.vue';
import { useJob } from '../../../renderer/stores/job.js';
import { usePick } from '../../../renderer/stores/pick.js';
import { EDIT_WAIT, useRun } from '../../../renderer/stores/run.js';
import { useTrial } from '../../../renderer/stores/trial.js';
import { begin, quickDesk, smallJob } from '../window.js';

enableAutoUnmount(afterEach);

async function sized(job = smallJob()): Promise<VueWrapper> {
  begin(job);
  const desk = quickDesk();
  useTrial().connect(desk);
  useRun().connect(desk);
  await flushPromises();
  return mounted();
}

function mounted(): VueWrapper {
  const pinia = getActivePinia();
  if (pinia === undefined) throw new Error('The stores have not begun.');
  return mount(FrontStation, { attachTo: document.body, props: { number: 2 }, global: { plugins: [pinia] } });
}

async function press(station: VueWrapper, ...keys: readonly string[]): Promise<void> {
  for (const key of keys) await station.get('.stand').trigger('keydown', { key });
  await flushPromises();
}

const live = (station: VueWrapper): string => station.get('[aria-live]').text();

beforeEach(() => {
  vi.useFakeTimers();
});
afterEach(() => {
  vi.useRealTimers();
});

describe('the front', () => {
  it('says what will stand there before anything is sized', () => {
    begin();
    expect(mounted().text()).toContain('one line for each material will stand here');
  });

  it('is drawn against what the job says, changed by an edit that can be undone', async () => {
    const station = await sized();
    expect(station.get('h2').text()).toContain('the lightest tube at every twist');
    await station.get('input[value=outerDiameter]').setValue();
    expect(useJob().at('front.against')).toBe('outerDiameter');
    await vi.advanceTimersByTimeAsync(EDIT_WAIT);
    await flushPromises();
    expect(useRun().front?.against).toBe('outerDiameter');
    expect(station.get('h2').text()).toContain('every outer diameter');
    useJob().undo();
    await nextTick();
    expect(station.get<HTMLInputElement>('input[value=twist]').element.checked).toBe(true);
  });

  it('says why there is none against cost where nothing has a price', async () => {
    const station = await sized(smallJob({ front: { against: 'cost' } }));
    expect(station.text()).toContain('no material has a price');
  });

  it('switches between log and linear, and folds families', async () => {
    const station = await sized();
    const words = () => station.findAll('.switches button').map((button) => button.text());
    expect(words()).toEqual(['linear axis', 'fold families']);
    for (const button of station.findAll('.switches button')) await button.trigger('click');
    expect(words()).toEqual(['log axis', 'unfold families']);
    const alone = await sized(
      smallJob({ materials: ['al-6061-t6', 'steel-4130-n'], front: { against: 'outerDiameter' } }),
    );
    expect(alone.findAll('.switches button')).toHaveLength(0);
  });
});

describe('the keyboard in the front', () => {
  it('walks lines and rungs, previews the focus, and is heard', async () => {
    const station = await sized();
    await press(station, 'ArrowUp');
    const first = live(station);
    expect(first).toMatch(/^[A-Z].*: twist [\d.]+ deg, [\d.]+ kg; [\d.]+ × [\d.]+, .* governs/);
    await press(station, 'ArrowLeft');
    expect(live(station)).not.toBe(first);
    expect(live(station).split(':')[0]).toBe(first.split(':')[0]);
    await press(station, 'ArrowDown', 'ArrowDown');
    expect(live(station).split(':')[0]).not.toBe(first.split(':')[0]);
    expect(useRun().front?.job.materials.find(({ id }) => id === usePick().focus)?.name).toContain(
      live(station).split(':')[0],
    );
    await station.get('.stand').trigger('blur');
    expect(usePick().focus).toBe(usePick().picked?.material.id);
  });

  it('tries a tube with Space, and lets it go with Escape', async () => {
    const station = await sized();
    await press(station, 'ArrowLeft', ' ');
    expect(useTrial().shown?.design?.outerDiameter).toBeGreaterThan(0);
    await press(station, 'Escape');
    expect(useTrial().shown).toBeNull();
  });

  it('holds a tube with Enter, and makes it the pick', async () => {
    const station = await sized();
    await press(station, 'ArrowLeft', 'Enter');
    const [held] = useJob().document['hold'] as readonly { name: string }[];
    expect(useJob().document['pick']).toEqual({ held: held?.name });
    await vi.advanceTimersByTimeAsync(EDIT_WAIT);
    await flushPromises();
    expect(usePick().picked?.name).toBe(held?.name);
  });

  it('leaves other keys alone', async () => {
    const station = await sized();
    const event = new KeyboardEvent('keydown', { key: 'ArrowLeft', altKey: true, cancelable: true });
    station.get('.stand').element.dispatchEvent(event);
    expect(event.defaultPrevented).toBe(false);
  });
});
