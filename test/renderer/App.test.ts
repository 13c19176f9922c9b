// @vitest-environment happy-dom
import { mount, type VueWrapper } from '@vue/test-utils';
import { afterEach, beforeEach, expect, it, vi } from 'vitest';
import App from '../../renderer/App.vue';
import { TOKENS } from '../../renderer/theme/tokens.js';
import type { useJob } from '../../renderer/stores/job.js';
import { useRun } from '../../renderer/stores/run.js';
import { useSettings } from '../../renderer/stores/settings.js';
import { begin, quickDesk } from './window.js';

let job: ReturnType<typeof useJob>;
let app: VueWrapper;

beforeEach(async () => {
  vi.useFakeTimers();
  job = begin();
  useRun().connect(quickDesk());
  app = mount(App, { attachTo: document.body });
  await vi.advanceTimersByTimeAsync(0);
});
afterEach(() => {
  app.unmount();
  vi.useRealTimers();
});

function press(key: string, more: KeyboardEventInit = {}): void {
  const target = document.activeElement ?? document.body;
  target.dispatchEvent(new KeyboardEvent('keydown', { key, bubbles: true, cancelable: true, ...more }));
}

const station = (): string | null =>
  document.activeElement?.closest('[data-station]')?.getAttribute('aria-label') ?? null;

it('shows brief, front, wall map, pick and line-up of a sized job', () => {
  expect(app.findAll('[data-station]').map((one) => one.attributes('aria-label'))).toEqual([
    'Brief',
    'Front',
    'Wall map',
    'Pick',
    'Line-up',
  ]);
  expect(app.text()).toContain('all 3 fit');
});

it('goes to a station by its number, and walks round', () => {
  press('2', { altKey: true, code: 'Digit2' });
  expect(station()).toBe('Front');
  press('3', { altKey: true, code: 'Digit3' });
  expect(station()).toBe('Wall map');
  press('4', { altKey: true, code: 'Digit4' });
  expect(station()).toBe('Pick');
  press('F6');
  expect(station()).toBe('Line-up');
  press('F6');
  expect(station()).toBe('Brief');
  press('F6', { shiftKey: true });
  expect(station()).toBe('Line-up');
});

it('undoes and redoes by key', () => {
  job.edit('title', 'another');
  press('z', { ctrlKey: true });
  expect(job.at('title')).toBe('a shaft');
  press('y', { ctrlKey: true });
  expect(job.at('title')).toBe('another');
  press('z', { metaKey: true });
  press('Z', { metaKey: true, shiftKey: true });
  expect(job.at('title')).toBe('another');
});

it('takes the colours of its sheet', async () => {
  const root = document.documentElement.style;
  expect(root.getPropertyValue('--paper')).toBe(TOKENS.paper.paper);
  useSettings().theme = 'blueprint';
  await app.vm.$nextTick();
  expect(root.getPropertyValue('--paper')).toBe(TOKENS.blueprint.paper);
  expect(root.getPropertyValue('--faint-fill')).toBe(TOKENS.blueprint.faintFill);
  expect(root.getPropertyValue('--family-carbon-epoxy')).toBe(TOKENS.families['carbon/epoxy']?.blueprint);
});
