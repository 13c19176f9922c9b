import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import type { useJob } from '../../../renderer/stores/job.js';
import { usePick } from '../../../renderer/stores/pick.js';
import { useRun } from '../../../renderer/stores/run.js';
import { begin, quickDesk, smallJob } from '../window.js';

const HOLD = [{ name: 'on the shelf', material: 'steel-4130-n', outerDiameter: '80 mm', wall: '2 mm' }];
const STEEL = { material: 'steel-4130-n' };

let job: ReturnType<typeof useJob>;
let pick: ReturnType<typeof usePick>;

async function start(changes = {}): Promise<void> {
  vi.useFakeTimers();
  job = begin(smallJob({ hold: HOLD, ...changes }));
  pick = usePick();
  useRun().connect(quickDesk());
  await Promise.resolve();
  await Promise.resolve();
}

beforeEach(() => start());
afterEach(() => {
  vi.useRealTimers();
});

describe('the pick', () => {
  it('is the lightest where none was chosen', () => {
    expect(pick.byHand).toBe(false);
    expect(pick.picked?.pick).toEqual({ material: pick.lightest?.material });
    expect(pick.picked?.design).toBe(pick.lightest?.design);
    expect(pick.isPick({ material: pick.lightest?.material ?? '' })).toBe(true);
    expect(pick.isPick(STEEL)).toBe(false);
  });

  it('is chosen by an edit of the job, which can be undone', () => {
    pick.choose(STEEL);
    expect(job.document['pick']).toEqual(STEEL);
    expect(pick.picked?.name).toBe('Steel 4130 normalised, tube, wall to 0.188 in');
    expect(pick.byHand).toBe(true);
    job.undo();
    expect(pick.byHand).toBe(false);
    job.redo();
    pick.takeLightest();
    expect(job.document).not.toHaveProperty('pick');
  });

  it('may be a design in hand', () => {
    pick.choose({ held: 'on the shelf' });
    expect(pick.picked?.name).toBe('on the shelf');
    expect(pick.picked?.material.id).toBe('steel-4130-n');
    expect(pick.picked?.design?.outerDiameter).toBe(0.08);
    expect(pick.isPick({ held: 'on the shelf' })).toBe(true);
    expect(pick.isPick({ held: 'another' })).toBe(false);
    expect(pick.isPick(STEEL)).toBe(false);
  });

  it('cannot be changed while the job is in error', () => {
    job.edit('title', undefined);
    expect(pick.available).toBe(false);
    pick.choose(STEEL);
    pick.apply({ path: 'tube.outerDiameterMax', from: '90 mm', to: '99 mm' });
    expect(pick.byHand).toBe(false);
    expect(job.at('tube.outerDiameterMax')).toBe('90 mm');
  });

  it('applies what lets something fit as one undoable edit', () => {
    pick.apply({ path: 'tube.outerDiameterMax', from: '90 mm', to: '99 mm' });
    expect(job.at('tube.outerDiameterMax')).toBe('99 mm');
    job.undo();
    expect(job.at('tube.outerDiameterMax')).toBe('90 mm');
  });

  it('shows the first conflict where nothing fits', async () => {
    await start({ tube: { length: '1.4 m', outerDiameterMax: '20 mm' } });
    expect(pick.lightest).toBeNull();
    expect(pick.picked?.feasible).toBe(false);
    expect(pick.picked?.noFit?.conflict.length).toBeGreaterThan(0);
  });
});

describe('the focus', () => {
  it('is the pick’s material, until another is kept or hovered over', () => {
    const lightest = pick.lightest?.material;
    expect(pick.focus).toBe(lightest);
    pick.keep('al-2024-t3');
    pick.hover('steel-4130-n');
    expect(pick.focus).toBe('steel-4130-n');
    pick.hover(null);
    expect(pick.focus).toBe('al-2024-t3');
    pick.keep('not of this job');
    expect(pick.focus).toBe(lightest);
    pick.keep(null);
    expect(pick.focus).toBe(lightest);
    expect(pick.byHand).toBe(false);
  });
});
