import { flushPromises } from '@vue/test-utils';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { useJob } from '../../../renderer/stores/job.js';
import { usePick } from '../../../renderer/stores/pick.js';
import { EDIT_WAIT, useRun } from '../../../renderer/stores/run.js';
import { useTrial } from '../../../renderer/stores/trial.js';
import { begin, quickDesk, type ledDesk } from '../window.js';

const TUBE = { material: 'steel-4130-n', outerDiameter: 0.0848172345, wall: 0.00325261 };

let trial: ReturnType<typeof useTrial>;
let desk: ReturnType<typeof ledDesk>;

beforeEach(async () => {
  vi.useFakeTimers();
  begin();
  desk = quickDesk();
  trial = useTrial();
  trial.connect(desk);
  useRun().connect(desk);
  await flushPromises();
});
afterEach(() => {
  vi.useRealTimers();
});

describe('a tube on trial', () => {
  it('is shown as the desk finds it, without being the pick', async () => {
    const before = usePick().picked;
    await trial.attempt(TUBE);
    expect(trial.tube).toEqual(TUBE);
    expect(trial.shown).toMatchObject({
      feasible: true,
      relief: [],
      noFit: null,
      design: { outerDiameter: 0.0848172345 },
    });
    expect(trial.shown?.material.id).toBe('steel-4130-n');
    expect(usePick().picked).toEqual(before);
    expect(useJob().document).not.toHaveProperty('hold');
  });

  it('is let go', async () => {
    await trial.attempt(TUBE);
    trial.end();
    expect([trial.tube, trial.shown]).toEqual([null, null]);
  });

  it('is the last of several that are tried in one breath', async () => {
    const thin = trial.attempt({ ...TUBE, wall: 0.0007 });
    const thick = trial.attempt({ ...TUBE, wall: 0.004 });
    await Promise.all([thin, thick]);
    expect(trial.shown?.design?.wall).toBe(0.004);
    const late = trial.attempt(TUBE);
    trial.end();
    await late;
    expect(trial.shown).toBeNull();
  });

  it('is checked anew when the brief changes, and ends where its material goes', async () => {
    await trial.attempt(TUBE);
    useJob().edit('loads.0.torque', '9 kN·m');
    await flushPromises();
    expect(trial.shown?.feasible).toBe(false);
    useJob().edit('materials', ['al-2024-t3']);
    await flushPromises();
    expect(trial.tube).toBeNull();
  });

  it('shows nothing where the desk does not answer', async () => {
    trial.connect({ ...desk, ask: () => Promise.reject(new Error('gone')) });
    await trial.attempt(TUBE);
    expect(trial.shown).toBeNull();
  });
});

describe('a tube that is held', () => {
  it('is kept in the job under a name, and is the pick, by one edit', async () => {
    await trial.attempt(TUBE);
    await trial.hold(TUBE);
    const job = useJob();
    const [held] = job.document['hold'] as readonly { name: string }[];
    expect(held).toEqual({
      name: '84.82 × 3.253',
      material: 'steel-4130-n',
      outerDiameter: '84.817 mm',
      wall: '3.253 mm',
    });
    expect(job.document['pick']).toEqual({ held: '84.82 × 3.253' });
    expect(trial.tube).toBeNull();
    await vi.advanceTimersByTimeAsync(EDIT_WAIT);
    await flushPromises();
    expect(usePick().picked?.name).toBe('84.82 × 3.253');
    job.undo();
    expect(job.document).not.toHaveProperty('hold');
    expect(job.document).not.toHaveProperty('pick');
  });

  it('fares as it did on trial, though its figures are few', async () => {
    for (const point of useRun().front?.points ?? []) {
      const { material, outerDiameter, wall } = point;
      await trial.attempt({ material, outerDiameter, wall });
      const { feasible } = trial.shown ?? {};
      await trial.hold({ material, outerDiameter, wall });
      await vi.advanceTimersByTimeAsync(EDIT_WAIT);
      await flushPromises();
      expect(useRun().shown?.held[0]?.feasible).toBe(feasible);
      useJob().undo();
      if (!feasible) break;
    }
  });

  it('bears a name of its own where it is held twice', async () => {
    await trial.hold(TUBE);
    await trial.hold(TUBE);
    const held = useJob().document['hold'] as readonly { name: string }[];
    expect(held.map(({ name }) => name)).toEqual(['84.82 × 3.253', '84.82 × 3.253 (2)']);
  });

  it('is not held while the brief is in error', async () => {
    useJob().edit('title', undefined);
    await trial.hold(TUBE);
    expect(useJob().document).not.toHaveProperty('hold');
  });
});
