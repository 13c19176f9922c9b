// @vitest-environment happy-dom
import { mount, type VueWrapper } from '@vue/test-utils';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import HeadStrip from '../../../renderer/shell/HeadStrip.vue';
import { KEY_LINES } from '../../../renderer/shell/keys.js';
import { useDemos } from '../../../renderer/stores/demos.js';
import type { useJob } from '../../../renderer/stores/job.js';
import { STALE_AFTER, useRun } from '../../../renderer/stores/run.js';
import { useSettings } from '../../../renderer/stores/settings.js';
import { begin, DEMOS, ledDesk, sized, smallJob } from '../window.js';

let job: ReturnType<typeof useJob>;
let desk: ReturnType<typeof ledDesk>;
let head: VueWrapper;

beforeEach(() => {
  vi.useFakeTimers();
  job = begin();
  useDemos().list = DEMOS;
  desk = ledDesk();
  useRun().connect(desk);
  head = mount(HeadStrip, { props: { narrow: false }, attachTo: document.body });
});
afterEach(() => {
  head.unmount();
  vi.useRealTimers();
});

const says = (): string => head.get('.run').text().replace(/\s+/g, ' ');
const key = (text: string) => {
  const found = head.findAll('button').find((one) => one.text() === text);
  if (found === undefined) throw new Error(`There is no key "${text}".`);
  return found;
};

async function finish(): Promise<void> {
  const run = desk.runs.at(-1);
  run?.end(sized(run.job).end);
  await vi.advanceTimersByTimeAsync(0);
}

describe('the run cell', () => {
  it('tells how far the first run is, and how it ended', async () => {
    desk.runs[0]?.update({ kind: 'progress', done: 1, of: 4, material: 'Steel 4130' });
    await vi.advanceTimersByTimeAsync(0);
    expect(says()).toMatch(/sizing 2 of 4 ?Steel 4130/);
    expect(head.get<HTMLElement>('.bar i').element.style.width).toBe('25%');
    await finish();
    expect(says()).toMatch(/3 materials sized in .* s ?all 3 fit/);
  });

  it('stays as it was while an answer comes fast, then counts, and can be stopped', async () => {
    await finish();
    job.edit('loads.0.torque', '800 N·m');
    await vi.advanceTimersByTimeAsync(150 + STALE_AFTER - 1);
    expect(says()).toContain('sized in');
    await vi.advanceTimersByTimeAsync(1);
    expect(says()).toContain('sizing');
    await key('stop').trigger('click');
    expect(desk.runs[1]?.stopped).toBe(true);
    desk.runs[1]?.end({ kind: 'stopped' });
    await vi.advanceTimersByTimeAsync(0);
    expect(says()).toContain('stopped');
    await key('size again').trigger('click');
    expect(desk.runs).toHaveLength(3);
  });

  it('says that the brief is in error and which results are shown', async () => {
    await finish();
    job.edit('loads.0.torque', '9 mm');
    await vi.advanceTimersByTimeAsync(0);
    expect(says()).toContain('1 mistake');
    expect(says()).toContain('the last sound brief');
  });

  it('says why a run failed', async () => {
    desk.runs[0]?.end({ kind: 'failed', sentence: 'The worker died three times.' });
    await vi.advanceTimersByTimeAsync(0);
    expect(says()).toContain('The worker died three times.');
  });
});

describe('the head', () => {
  it('edits title, number and revision in place', async () => {
    await head.get('[aria-label="job title"]').setValue('Another shaft');
    await head.get('[aria-label="document number"]').setValue('7');
    await head.get('[aria-label="revision"]').setValue('B');
    expect(job.document).toMatchObject({ title: 'Another shaft', number: '7', revision: 'B' });
  });

  it('undoes and redoes', async () => {
    expect(key('undo').attributes('disabled')).toBeDefined();
    job.edit('title', 'Another');
    await head.vm.$nextTick();
    await key('undo').trigger('click');
    expect(job.document).toEqual(smallJob());
    await key('redo').trigger('click');
    expect(job.at('title')).toBe('Another');
  });

  it('switches units and sheet', async () => {
    await head.get('[name="units"][value="US"]').setValue(true);
    await head.get('[name="sheet"][value="blueprint"]').setValue(true);
    expect([useSettings().units, useSettings().theme]).toEqual(['US', 'blueprint']);
  });

  it('opens a demo job, which undo takes back', async () => {
    await key('demo jobs').trigger('click');
    await key('Torque tube of a sun tracker, one half row').trigger('click');
    expect(job.document).toBe(DEMOS[2]);
    expect(key('demo jobs').attributes('aria-expanded')).toBe('false');
    job.undo();
    expect(job.document).toEqual(smallJob());
  });

  it('lists its keys at F1, until Escape', async () => {
    window.dispatchEvent(new KeyboardEvent('keydown', { key: 'F1', cancelable: true }));
    await vi.advanceTimersByTimeAsync(0);
    for (const line of KEY_LINES) expect(head.text()).toContain(line.does);
    await head.get('[role="group"]').trigger('keydown', { key: 'Escape' });
    expect(head.find('[role="group"]').exists()).toBe(false);
    expect(document.activeElement).toBe(key('keys').element);
  });
});
