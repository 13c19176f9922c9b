// @vitest-environment happy-dom
import { enableAutoUnmount, flushPromises, mount, type VueWrapper } from '@vue/test-utils';
import { getActivePinia } from 'pinia';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { nextTick } from 'vue';
import type { JobDocument } from '../../../renderer/job/keyPath.js';
import WallMapStation from '../../../renderer/map/WallMapStation.vue';
import { useJob } from '../../../renderer/stores/job.js';
import { usePick } from '../../../renderer/stores/pick.js';
import { useRun } from '../../../renderer/stores/run.js';
import { useTrial } from '../../../renderer/stores/trial.js';
import { begin, ledDesk, quickDesk, smallJob } from '../window.js';

enableAutoUnmount(afterEach);

const WIDTH = 680;
const HEIGHT = 276;

/** The station on a sheet of the size that it begins with. */
function mounted(): VueWrapper {
  const pinia = getActivePinia();
  if (pinia === undefined) throw new Error('The stores have not begun.');
  const box = { left: 0, top: 0, x: 0, y: 0, right: WIDTH, bottom: HEIGHT, width: WIDTH, height: HEIGHT };
  vi.spyOn(Element.prototype, 'getBoundingClientRect').mockReturnValue({ ...box, toJSON: () => box });
  return mount(WallMapStation, { attachTo: document.body, global: { plugins: [pinia] } });
}

async function sized(job: JobDocument = smallJob()): Promise<VueWrapper> {
  begin(job);
  const desk = quickDesk();
  useTrial().connect(desk);
  useRun().connect(desk);
  await flushPromises();
  return mounted();
}

async function point(station: VueWrapper, type: string, x: number, y: number): Promise<void> {
  const event = new PointerEvent(type, { clientX: x, clientY: y, button: 0, pointerId: 1, bubbles: true });
  station.get('.stand').element.dispatchEvent(event);
  await flushPromises();
}

async function frame(): Promise<void> {
  await new Promise((resolve) => requestAnimationFrame(resolve));
  await nextTick();
}

function texts(station: VueWrapper, figure: string): string[] {
  return station.findAll(`${figure} text`).map((text) => text.text());
}

function colours(station: VueWrapper): string {
  return station
    .findAll('.drawing circle')
    .map((one) => one.attributes('style') ?? '')
    .join(' ');
}

describe('the wall map', () => {
  it('says what will stand here until something is sized', () => {
    begin();
    expect(mounted().get('.note').text()).toBe('The limits of one material will stand here.');
  });

  it('says that it waits while the first run is under way', async () => {
    begin();
    useRun().connect(ledDesk());
    await flushPromises();
    expect(mounted().get('.note').text()).toContain('once its material is sized');
  });

  it('draws the material of the pick, with the cross-hair in copper', async () => {
    const station = await sized();
    expect(station.get('.sentence').text()).toContain(usePick().picked!.name.split(',')[0]);
    expect(texts(station, '.drawing')).toContain('twist 3 deg');
    expect(colours(station)).toContain('var(--copper)');
  });

  it('follows the focus, with the cross-hair in ink', async () => {
    const station = await sized();
    usePick().hover('steel-4130-n');
    await nextTick();
    await frame();
    expect(station.get('.sentence').text()).toContain('4130');
    expect(colours(station)).not.toContain('var(--copper)');
    usePick().hover(null);
    await nextTick();
    await frame();
    expect(colours(station)).toContain('var(--copper)');
  });

  it('keeps the last map while the material is sized anew', async () => {
    begin();
    const desk = ledDesk();
    const quick = quickDesk();
    useRun().connect(quick);
    await flushPromises();
    const station = mounted();
    const before = texts(station, '.drawing');
    useRun().connect(desk);
    await flushPromises();
    await frame();
    expect(texts(station, '.drawing')).toEqual(before);
  });

  it('has no region where nothing fits, and says what stands in the way and what would help', async () => {
    const station = await sized(smallJob({ tube: { length: '1.4 m', outerDiameterMax: '25 mm' } }));
    const said = texts(station, '.drawing').join(' ');
    expect(said).toContain('nothing fits');
    expect(said).toContain('in place of');
    expect(station.find('.drawing path[style*="faint-fill"]').exists()).toBe(false);
  });

  it('shows logarithmic axes on request', async () => {
    const station = await sized();
    const linear = texts(station, '.drawing');
    await station.get('input[value="log"]').setValue();
    await frame();
    expect(texts(station, '.drawing')).not.toEqual(linear);
    expect(texts(station, '.drawing')).toContain('twist 3 deg');
  });
});

describe('the pointer on the wall map', () => {
  it('tells how the tube under it fares, and lets it be when it leaves', async () => {
    const station = await sized();
    await point(station, 'pointermove', 400, 60);
    const [tube, limit] = texts(station, '.overlay');
    expect(tube).toMatch(/^[\d.]+ × [\d.]+ mm, [\d.]+ kg$/);
    expect(limit).toMatch(/^[a-z ]+ [\d.]+ \/ [\d.]+.* \d+ %$/);
    await point(station, 'pointerleave', 400, 60);
    expect(station.find('.overlay').exists()).toBe(false);
  });

  it('makes the curve under it strong, and tells of that limit', async () => {
    const station = await sized();
    const found: string[] = [];
    for (let x = 80; x < 620; x += 3) {
      await point(station, 'pointermove', x, 120);
      const strong = station
        .findAll('.overlay path')
        .some((path) => ['1.6', '2.4'].includes(path.attributes('stroke-width') ?? ''));
      if (strong) found.push(texts(station, '.overlay')[1] ?? '');
    }
    expect(found.some((text) => text.startsWith('twist'))).toBe(true);
    expect(found.some((text) => text.startsWith('outer diameter'))).toBe(true);
    for (const text of found.filter((one) => one.startsWith('twist'))) {
      const percent = Number(/(\d+) %$/.exec(text)?.[1]);
      expect(Math.abs(percent - 100)).toBeLessThan(15);
    }
  });

  it('tries the tubes that it drags over, and leaves the last one on trial', async () => {
    const station = await sized();
    await point(station, 'pointerdown', 300, 100);
    await point(station, 'pointermove', 301, 100);
    expect(useTrial().tube).toBeNull();
    await point(station, 'pointermove', 350, 90);
    const first = useTrial().tube;
    await point(station, 'pointermove', 400, 80);
    await point(station, 'pointerup', 400, 80);
    const last = useTrial().tube!;
    expect(last.outerDiameter).toBeGreaterThan(first!.outerDiameter);
    expect(last.wall).toBeGreaterThan(first!.wall);
    expect(last.material).toBe(usePick().focus);
    expect(texts(station, '.overlay').join(' ')).toContain('trial');
    expect(station.get('[aria-live]').text()).toMatch(/^trial .*(passes|does not pass)/);
    expect(useJob().document['hold']).toBeUndefined();
  });

  it('takes the tube in hand with a click, as one edit that can be undone', async () => {
    await sized().then((station) => clicked(station, 430, 60));
    const held = useJob().document['hold'] as readonly JobDocument[];
    expect(held.length).toBe(1);
    expect(held[0]).toMatchObject({ material: usePick().focus });
    useJob().undo();
    expect(useJob().document['hold']).toBeUndefined();
    expect(useJob().canUndo).toBe(false);
  });

  it('takes nothing in hand outside the plot', async () => {
    await sized().then((station) => clicked(station, 10, 60));
    expect(useJob().document['hold']).toBeUndefined();
  });

  it('tries listed sizes alone where the job has a list', async () => {
    const rows = [60, 70, 80, 90].flatMap((d) =>
      [2, 4].map((t) => ({ outerDiameter: `${String(d)} mm`, wall: `${String(t)} mm` })),
    );
    const station = await sized(smallJob({ sizes: { stock: rows } }));
    await point(station, 'pointerdown', 300, 100);
    await point(station, 'pointermove', 420, 90);
    const { outerDiameter, wall } = useTrial().tube!;
    expect(rows).toContainEqual({
      outerDiameter: `${String(Math.round(outerDiameter * 1e3))} mm`,
      wall: `${String(Math.round(wall * 1e3))} mm`,
    });
  });
});

async function clicked(station: VueWrapper, x: number, y: number): Promise<void> {
  await point(station, 'pointermove', x, y);
  await point(station, 'pointerdown', x, y);
  await point(station, 'pointerup', x, y);
}

describe('the keys of the wall map', () => {
  const press = async (station: VueWrapper, key: string, shiftKey = false): Promise<void> => {
    await station.get('.stand').trigger('keydown', { key, shiftKey });
    await flushPromises();
  };

  it('move the tube on trial by a step from the optimum, by ten with Shift', async () => {
    const station = await sized();
    const { outerDiameter } = usePick().picked!.design!;
    await press(station, 'ArrowUp');
    const first = useTrial().tube!;
    expect(first.outerDiameter).toBe(outerDiameter);
    await press(station, 'ArrowUp');
    const step = useTrial().tube!.wall - first.wall;
    expect(step).toBeGreaterThan(0);
    const before = useTrial().tube!.wall;
    await press(station, 'ArrowDown', true);
    expect(useTrial().tube!.wall).toBeCloseTo(before - 10 * step, 9);
    await press(station, 'ArrowLeft');
    expect(useTrial().tube!.outerDiameter).toBeLessThan(outerDiameter);
  });

  it('let the trial go with Esc, and hold it with Enter', async () => {
    const station = await sized();
    await press(station, 'Enter');
    expect(useJob().document['hold']).toBeUndefined();
    await press(station, 'ArrowUp', true);
    await press(station, 'Escape');
    expect(useTrial().tube).toBeNull();
    expect(station.find('.overlay').exists()).toBe(false);
    await press(station, 'ArrowUp', true);
    await press(station, 'Enter');
    expect((useJob().document['hold'] as readonly JobDocument[]).length).toBe(1);
    expect(useTrial().tube).toBeNull();
  });

  it('are reached by going to the station', async () => {
    const station = await sized();
    station.get<HTMLElement>('section').element.focus();
    expect(document.activeElement).toBe(station.get('.stand').element);
  });
});
