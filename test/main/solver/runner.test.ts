import { writeFileSync } from 'node:fs';
import path from 'node:path';
import { setTimeout as wait } from 'node:timers/promises';
import { describe, expect, it } from 'vitest';
import { EXIT } from '../../../main/cli/desk.js';
import { run } from '../../../main/cli/run.js';
import type { Followed, SizeEnd, SizeUpdate } from '../../../main/contract.js';
import type { Runner } from '../../../main/solver/runner.js';
import { sizeJob } from '../../../src/index.js';
import type { Report } from '../../../src/report/report.js';
import { temporaryFolder } from '../temporary.js';
import { jobOf, loadCases, metals, type JobDocument } from './jobs.js';
import type { Sabotage } from './unsound.js';
import { SOURCE_WORKER, testRunner, UNSOUND_WORKER } from './workers.js';

interface Heard {
  readonly updates: readonly SizeUpdate[];
  readonly end: SizeEnd;
}

async function sized(runner: Runner, job: unknown): Promise<Heard> {
  const updates: SizeUpdate[] = [];
  const end = await runner.size(job, (update) => updates.push(update)).done;
  return { updates, end };
}

/** The report that the command line prints for a job. */
async function commandLineReport(job: JobDocument): Promise<unknown> {
  const folder = temporaryFolder();
  writeFileSync(path.join(folder, 'job.wring.json'), JSON.stringify(job));
  let printed = '';
  const status = await run(['job.wring.json', '--json', '-', '--quiet'], {
    out: (text) => {
      printed += text;
    },
    err: () => undefined,
    terminal: false,
    folder,
    engine: () => Promise.resolve(sizeJob),
  });
  expect(status).toBe(EXIT.found);
  return JSON.parse(printed);
}

function reportOf(end: SizeEnd): Report {
  if (end.kind !== 'report') throw new Error(`ended as ${end.kind}`);
  return end.report;
}

/** A job under which an unsound worker fails in some way, so many times. */
function sabotaged(how: Sabotage['how'], times: number): { readonly sabotage: Sabotage } {
  return { sabotage: { how, times, marks: path.join(temporaryFolder(), 'marks'), job: jobOf() } };
}

const kindsOf = (updates: readonly SizeUpdate[]): readonly string[] => updates.map(({ kind }) => kind);

describe('a run', () => {
  it('streams each candidate as it is done, as the report then holds it', async () => {
    const { updates, end } = await sized(testRunner(), jobOf());
    const streamed = updates.flatMap((update) => (update.kind === 'candidate' ? [update.candidate] : []));
    const reported = reportOf(end).candidates;
    expect(streamed.map(({ material }) => material)).toEqual(jobOf()['materials']);
    expect(new Set(streamed.map((one) => JSON.stringify(one)))).toEqual(
      new Set(reported.map((one) => JSON.stringify(one))),
    );
  });

  it('tells its progress by material, never backwards, before each step', async () => {
    const { updates } = await sized(testRunner(), jobOf());
    const told = updates.flatMap((update) => (update.kind === 'progress' ? [update] : []));
    expect(told.map(({ done }) => done)).toEqual([0, 0, 0, 0, 1, 2]);
    expect(told.every(({ of }) => of === 3)).toBe(true);
    expect(new Set(told.map(({ material }) => material)).size).toBe(3);
  });

  it('ends with exactly the report of the command line', async () => {
    const { end } = await sized(testRunner(), jobOf());
    expect(JSON.stringify(reportOf(end))).toBe(JSON.stringify(await commandLineReport(jobOf())));
  });

  it('is the same from the source of the worker', async () => {
    const { end } = await sized(testRunner(SOURCE_WORKER), jobOf());
    expect(JSON.stringify(reportOf(end))).toBe(JSON.stringify(await commandLineReport(jobOf())));
  });

  it('refuses a wrong job with its mistakes', async () => {
    const { end } = await sized(testRunner(), jobOf({ loads: [{ name: 'only', torque: '620' }] }));
    expect(end).toMatchObject({ kind: 'refused', problems: [{ path: 'loads.0.torque' }] });
  });

  it('sizes a job of 30 load cases', async () => {
    const { end } = await sized(testRunner(), jobOf({ loads: loadCases(30) }));
    expect(reportOf(end).job.loads).toHaveLength(30);
    expect(reportOf(end).candidates.filter(({ feasible }) => feasible).length).toBeGreaterThan(0);
  });

  it('sizes a job of 40 materials, each streamed', async () => {
    const { updates, end } = await sized(testRunner(), jobOf({ materials: metals(40) }));
    expect(reportOf(end).candidates).toHaveLength(40);
    expect(kindsOf(updates).filter((kind) => kind === 'candidate')).toHaveLength(40);
  });
});

describe('a later run', () => {
  it('supersedes the one in flight at once', async () => {
    const runner = testRunner();
    await sized(runner, jobOf());
    const long = runner.size(jobOf({ materials: metals(40), loads: loadCases(30) }), () => undefined);
    const begun = performance.now();
    const later = runner.size(jobOf(), () => undefined);
    expect(await long.done).toEqual({ kind: 'superseded' });
    expect(performance.now() - begun).toBeLessThan(100);
    expect((await later.done).kind).toBe('report');
  });

  it('is answered after 100 fast edits exactly as the command line answers the last one', async () => {
    const runner = testRunner();
    await sized(runner, jobOf());
    const torques = Array.from({ length: 100 }, (_, index) => `${String(500 + index)} N·m`);
    const ends: Promise<SizeEnd>[] = [];
    const late: string[] = [];
    for (const torque of torques) {
      const at = ends.length;
      const followed = runner.size(jobOf({}, torque), () => {
        if (ends.length > at + 1) late.push(torque);
      });
      ends.push(followed.done);
      await wait(4);
    }
    const all = await Promise.all(ends);
    expect(late).toEqual([]);
    expect(all.slice(0, -1).filter(({ kind }) => kind !== 'superseded' && kind !== 'report')).toEqual([]);
    const last = all.at(-1);
    expect(last?.kind).toBe('report');
    const expected = await commandLineReport(jobOf({}, torques.at(-1)));
    expect(JSON.stringify(last?.kind === 'report' ? last.report : null)).toBe(JSON.stringify(expected));
  });

  it('takes the place of one that waits for the worker to start', async () => {
    const runner = testRunner();
    const first = runner.size(jobOf(), () => undefined);
    const second = runner.size(jobOf(), () => undefined);
    expect(await first.done).toEqual({ kind: 'superseded' });
    expect((await second.done).kind).toBe('report');
  });

  it('ends a worker that does not leave the run before it', async () => {
    const runner = testRunner(UNSOUND_WORKER, { patience: 100 });
    const hung = await new Promise<Followed<SizeEnd>>((resolve) => {
      const followed = runner.size(sabotaged('hang', 1), ({ kind }) => {
        if (kind === 'candidate') resolve(followed);
      });
    });
    const later = await sized(runner, jobOf());
    expect(await hung.done).toEqual({ kind: 'superseded' });
    expect(later.end.kind).toBe('report');
    expect(kindsOf(later.updates)).not.toContain('restarted');
  });
});

describe('stop', () => {
  it('ends the run as stopped at once, and leaves the worker ready for the next', async () => {
    const runner = testRunner();
    await sized(runner, jobOf());
    const updates: SizeUpdate[] = [];
    const followed = runner.size(jobOf({ materials: metals(40) }), (update) => {
      updates.push(update);
      if (update.kind === 'candidate') followed.stop();
    });
    expect(await followed.done).toEqual({ kind: 'stopped' });
    const heard = updates.length;
    expect((await sized(runner, jobOf())).end.kind).toBe('report');
    expect(updates).toHaveLength(heard);
  });

  it('does nothing to a run that has ended, nor to the one after it', async () => {
    const runner = testRunner();
    const first = runner.size(jobOf(), () => undefined);
    await first.done;
    const second = runner.size(jobOf(), () => undefined);
    first.stop();
    expect((await second.done).kind).toBe('report');
    expect((await first.done).kind).toBe('report');
  });

  it('stops a run that waits for the worker to start', async () => {
    const followed = testRunner().size(jobOf(), () => undefined);
    followed.stop();
    expect(await followed.done).toEqual({ kind: 'stopped' });
  });
});

describe('a worker that dies', () => {
  it('in the middle of a run is started again, says so, and the run ends right', async () => {
    const { updates, end } = await sized(testRunner(UNSOUND_WORKER), sabotaged('exit', 1));
    const restarts = updates.filter(({ kind }) => kind === 'restarted');
    expect(restarts).toEqual([
      { kind: 'restarted', reason: 'The solver stopped (it ended with code 7) and was started again.' },
    ]);
    expect(JSON.stringify(reportOf(end))).toBe(JSON.stringify(await commandLineReport(jobOf())));
  });

  it('of an error tells the error, without a stack', async () => {
    const { updates } = await sized(testRunner(UNSOUND_WORKER), sabotaged('throw', 1));
    expect(updates[0]).toEqual({
      kind: 'restarted',
      reason: 'The solver stopped (out of order) and was started again.',
    });
  });

  it('twice still ends right; a third time the run is given up', async () => {
    const twice = await sized(testRunner(UNSOUND_WORKER), sabotaged('exit', 2));
    expect(kindsOf(twice.updates).filter((kind) => kind === 'restarted')).toHaveLength(2);
    expect(twice.end.kind).toBe('report');
    const runner = testRunner(UNSOUND_WORKER);
    const thrice = await sized(runner, sabotaged('exit', 3));
    expect(thrice.end).toEqual({
      kind: 'failed',
      sentence: 'The solver stopped 3 times (it ended with code 7). The job is kept.',
    });
    expect((await sized(runner, jobOf())).end.kind).toBe('report');
  });

  it('before it is ready is given up after as many starts', async () => {
    const { updates, end } = await sized(testRunner('/nowhere/worker.js'), jobOf());
    expect(kindsOf(updates)).toEqual(['restarted', 'restarted']);
    expect(end.kind).toBe('failed');
  });

  it('of memory takes nothing else with it', async () => {
    const { updates, end } = await sized(testRunner(UNSOUND_WORKER, { memory: 128 }), sabotaged('memory', 1));
    expect(kindsOf(updates)).toContain('restarted');
    expect(end.kind).toBe('report');
  });
});

describe('a runner', () => {
  it('that was warmed answers the first run', async () => {
    const runner = testRunner();
    runner.warm(jobOf());
    expect((await sized(runner, jobOf())).end.kind).toBe('report');
  });

  it('that is closed ends its runs as stopped, and takes no more', async () => {
    const runner = testRunner();
    const followed = runner.size(jobOf(), () => undefined);
    await runner.close();
    expect(await followed.done).toEqual({ kind: 'stopped' });
    expect((await sized(runner, jobOf())).end).toEqual({ kind: 'stopped' });
  });
});
