import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import type { useJob } from '../../../renderer/stores/job.js';
import { EDIT_WAIT, STALE_AFTER, useRun } from '../../../renderer/stores/run.js';
import { begin, ledDesk, sized, smallJob, type LedRun } from '../window.js';

let job: ReturnType<typeof useJob>;
let run: ReturnType<typeof useRun>;
let desk: ReturnType<typeof ledDesk>;

beforeEach(() => {
  vi.useFakeTimers();
  job = begin();
  run = useRun();
  desk = ledDesk();
  run.connect(desk);
});
afterEach(() => {
  vi.useRealTimers();
});

function last(): LedRun {
  const found = desk.runs.at(-1);
  if (found === undefined) throw new Error('nothing was asked');
  return found;
}

/** Ends the last run with the report of its job. */
async function finish(): Promise<void> {
  last().end(sized(last().job).end);
  await vi.advanceTimersByTimeAsync(0);
}

async function edit(torque: string): Promise<void> {
  job.edit('loads.0.torque', torque);
  await vi.advanceTimersByTimeAsync(EDIT_WAIT);
}

const old = (): readonly string[] => Array.from(run.shown?.old ?? []).sort();

describe('the run', () => {
  it('sizes at once what it begins with', async () => {
    expect(run.status).toBe('running');
    expect(run.shown).toBeNull();
    expect(last().job).toBe(job.document);
    await finish();
    expect(run.status).toBe('done');
    expect(run.report?.candidates).toHaveLength(3);
    expect(run.shown?.complete).toBe(true);
    expect(run.elapsed).toBeGreaterThanOrEqual(0);
  });

  it('waits after an edit for the next one, and sizes the last', async () => {
    await finish();
    job.edit('loads.0.torque', '800 N·m');
    await vi.advanceTimersByTimeAsync(EDIT_WAIT - 1);
    job.edit('loads.0.torque', '700 N·m');
    expect(run.status).toBe('waiting');
    await vi.advanceTimersByTimeAsync(EDIT_WAIT - 1);
    expect(desk.runs).toHaveLength(1);
    await vi.advanceTimersByTimeAsync(1);
    expect(desk.runs).toHaveLength(2);
    expect(last().job).toBe(job.document);
  });

  it('does not size a job in error, and goes on with the sound one', async () => {
    await edit('900 mm');
    expect(desk.runs).toHaveLength(1);
    await finish();
    expect(run.status).toBe('done');
    expect(run.stale).toBe(false);
  });

  it('hears nothing more of a run that was overtaken', async () => {
    const first = last();
    await edit('800 N·m');
    first.update({ kind: 'progress', done: 2, of: 3, material: 'late' });
    first.end({ kind: 'superseded' });
    await vi.advanceTimersByTimeAsync(0);
    expect(run.progress).toBeNull();
    expect(run.status).toBe('running');
    await finish();
    expect(run.report?.job.loads[0]?.torque).toBe(800);
  });

  it('ends a hundred fast edits with the report of the last', async () => {
    for (let torque = 801; torque <= 900; torque += 1) {
      job.edit('loads.0.torque', `${torque} N·m`);
      await vi.advanceTimersByTimeAsync(torque % 7 === 0 ? EDIT_WAIT : 10);
    }
    job.edit('loads.0.torque', '555 N·m');
    await vi.advanceTimersByTimeAsync(EDIT_WAIT);
    const [latest, ...earlier] = desk.runs.toReversed();
    for (const run of earlier) run.end(sized(run.job).end);
    latest?.end(sized(latest.job).end);
    await vi.advanceTimersByTimeAsync(0);
    const expected = sized(job.document).end;
    expect(expected.kind === 'report' && run.report).toEqual(expected.kind === 'report' && expected.report);
    expect(run.report?.job.loads[0]?.torque).toBe(555);
  });

  it('shows old results as they are for a while, then weak, with what comes in taking their places', async () => {
    await finish();
    await edit('800 N·m');
    const { updates } = sized(last().job);
    const [first] = updates;
    if (first?.kind !== 'candidate') throw new Error('no candidate');
    last().update(first);
    await vi.advanceTimersByTimeAsync(STALE_AFTER - 1);
    expect(run.stale).toBe(false);
    expect(run.shown?.complete).toBe(true);
    await vi.advanceTimersByTimeAsync(1);
    expect(run.stale).toBe(true);
    expect(run.shown?.complete).toBe(false);
    expect(run.shown?.job.loads[0]?.torque).toBe(800);
    expect(old()).toEqual(['al-2024-t3', 'steel-4130-n']);
    expect(run.shown?.candidates.find(({ material }) => material === 'al-6061-t6')).toEqual(first.candidate);
    await finish();
    expect(run.stale).toBe(false);
    expect(old()).toEqual([]);
  });

  it('shows the first results as they come, lightest first', () => {
    for (const update of sized(last().job).updates) last().update(update);
    const masses = run.shown?.candidates.map(({ design }) => design?.mass ?? 0) ?? [];
    expect(masses).toHaveLength(3);
    expect(masses).toEqual(masses.toSorted((one, other) => one - other));
  });

  it('shows fronts as they are found, held against those that are there', () => {
    expect(run.front?.points).toEqual([]);
    const fronts = sized(last().job).updates.flatMap((update) => (update.kind === 'front' ? [update] : []));
    let count = 0;
    for (const front of fronts) {
      last().update(front);
      count += front.points.length;
      expect(run.front?.points).toHaveLength(count);
    }
    const end = sized(last().job).end;
    expect(run.front).toEqual(end.kind === 'report' ? { job: end.report.job, ...end.report.front } : null);
    last().update({ kind: 'restarted', reason: 'begun anew' });
    expect(run.front?.points).toEqual([]);
  });

  it('leaves out at once a material that the job in flight does not have', async () => {
    await finish();
    job.edit('materials', ['al-2024-t3']);
    await vi.advanceTimersByTimeAsync(EDIT_WAIT + STALE_AFTER);
    expect(run.shown?.candidates.map(({ material }) => material)).toEqual(['al-2024-t3']);
  });

  it('tells how far it is, and that it was begun anew', () => {
    last().update({ kind: 'progress', done: 1, of: 3, material: 'steel' });
    expect(run.progress).toEqual({ done: 1, of: 3, material: 'steel' });
    for (const update of sized(last().job).updates) last().update(update);
    last().update({ kind: 'restarted', reason: 'begun anew' });
    expect(run.sentence).toBe('begun anew');
    expect(run.shown).toBeNull();
  });

  it('stops when told, and can be started again', async () => {
    await finish();
    await edit('800 N·m');
    run.stop();
    expect(last().stopped).toBe(true);
    last().end({ kind: 'stopped' });
    await vi.advanceTimersByTimeAsync(0);
    expect(run.status).toBe('stopped');
    expect(run.stale).toBe(true);
    run.start();
    await finish();
    expect(run.report?.job.loads[0]?.torque).toBe(800);
  });

  it('says why it failed', async () => {
    last().end({ kind: 'failed', sentence: 'the worker died' });
    await vi.advanceTimersByTimeAsync(0);
    expect([run.status, run.sentence]).toEqual(['failed', 'the worker died']);
    run.start();
    expect(run.sentence).toBeNull();
    last().fail(new Error('no answer'));
    await vi.advanceTimersByTimeAsync(0);
    expect([run.status, run.sentence]).toEqual(['failed', 'no answer']);
    run.start();
    last().end(sized(smallJob({ title: '' })).end);
    await vi.advanceTimersByTimeAsync(0);
    expect(run.sentence).toContain('title');
  });
});
