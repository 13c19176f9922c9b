// @vitest-environment happy-dom
import { createPinia, setActivePinia } from 'pinia';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { beginWith, REMEMBER_WAIT } from '../../renderer/begin.js';
import { useDemos } from '../../renderer/stores/demos.js';
import { useJob } from '../../renderer/stores/job.js';
import { useSettings } from '../../renderer/stores/settings.js';
import { DEMOS, ledDesk, smallJob } from './window.js';

beforeEach(() => {
  vi.useFakeTimers();
  setActivePinia(createPinia());
});
afterEach(() => {
  vi.useRealTimers();
});

describe('a start', () => {
  it('sizes the first demo job where nothing is remembered', async () => {
    const desk = ledDesk();
    await beginWith(desk);
    expect(useJob().document).toBe(DEMOS[0]);
    expect(useDemos().list).toHaveLength(3);
    expect(desk.runs.map(({ job }) => job)).toEqual([DEMOS[0]]);
  });

  it('goes on with the job that was left, in error as it is, beside the results of the last sound one', async () => {
    const desk = ledDesk();
    const job = smallJob({ tube: { length: 'long' } });
    desk.beginning = { version: 1, job, sound: smallJob(), settings: { theme: 'blueprint', units: 'US' } };
    await beginWith(desk);
    expect(useJob().document).toBe(job);
    expect(desk.runs[0]?.job).toEqual(smallJob());
    expect([useSettings().theme, useSettings().units]).toEqual(['blueprint', 'US']);
  });

  it('has each change remembered, a little later or when the window goes', async () => {
    const desk = ledDesk();
    await beginWith(desk);
    const job = useJob();
    job.edit('title', 'one');
    job.edit('title', 'two');
    await vi.advanceTimersByTimeAsync(REMEMBER_WAIT);
    expect(desk.remembered).toMatchObject([{ version: 1, job: { title: 'two' }, settings: { theme: 'paper' } }]);
    useSettings().theme = 'blueprint';
    await vi.advanceTimersByTimeAsync(0);
    window.dispatchEvent(new Event('pagehide'));
    expect(desk.remembered[1]).toMatchObject({ settings: { theme: 'blueprint' } });
    await vi.advanceTimersByTimeAsync(REMEMBER_WAIT);
    window.dispatchEvent(new Event('pagehide'));
    expect(desk.remembered).toHaveLength(2);
  });

  it('remembers a job in error, and what was sound before', async () => {
    const desk = ledDesk();
    await beginWith(desk);
    useJob().edit('title', undefined);
    await vi.advanceTimersByTimeAsync(REMEMBER_WAIT);
    const [state] = desk.remembered as { job: object; sound: object }[];
    expect(state?.job).not.toHaveProperty('title');
    expect(state?.sound).toBe(DEMOS[0]);
  });
});
