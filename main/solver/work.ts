import type { Brief } from '../../src/job/job.js';
import { readJob } from '../../src/job/read.js';
import { buildLibrary, buildStockLists, rowsById } from '../../src/material/library.js';
import { sizeSteps } from '../../src/sizing/size.js';
import type { SizeUpdate } from '../contract.js';
import type { RunNews, WorkerEnd, WorkerStart, WorkerTask } from './protocol.js';

/** Tells the progress before each step: first every material is sized, then every front is found. */
function progress(brief: Brief, step: number): SizeUpdate {
  const { materials } = brief.job;
  const of = materials.length;
  return { kind: 'progress', done: Math.max(0, step - of), of, material: materials[step % of]?.name ?? '' };
}

/** Sizes a sound job step by step; null where the run is no longer wanted. */
function sizeBrief(brief: Brief, isWanted: () => boolean, tell: (update: SizeUpdate) => void): WorkerEnd | null {
  const steps = sizeSteps(brief);
  const last = 2 * brief.job.materials.length;
  for (let step = 0; isWanted(); step++) {
    if (step < last) tell(progress(brief, step));
    const { done, value } = steps.next();
    if (done) return { kind: 'report', report: value };
    tell(value);
  }
  return null;
}

/** An error of the engine's own: the same job would meet it again, so that nothing is gained by a new start. */
function failure(error: unknown): WorkerEnd {
  const said = error instanceof Error ? error.message.split('\n')[0] : String(error);
  return { kind: 'failed', sentence: `The solver met an error of its own (${said ?? ''}). The job is kept.` };
}

/**
 * A worker's whole work, apart from its thread: answers each task with its updates and then `end`, or `left` as soon as
 * the run is no longer wanted.
 */
export function workOn(start: WorkerStart, say: (news: RunNews) => void): (task: WorkerTask) => void {
  const stock = rowsById(buildStockLists(start.stockLists));
  const library = buildLibrary(start.records, stock);
  const wanted = new Int32Array(start.wanted);

  function size({ run, job }: WorkerTask): WorkerEnd | null {
    const isWanted = (): boolean => Atomics.load(wanted, 0) === run;
    if (!isWanted()) return null;
    const read = readJob(job, library, stock);
    if (!read.ok) return { kind: 'refused', problems: read.problems };
    return sizeBrief(read.brief, isWanted, (update) => {
      say({ run, kind: 'update', update });
    });
  }

  function sizeOrFail(task: WorkerTask): WorkerEnd | null {
    try {
      return size(task);
    } catch (error) {
      return failure(error);
    }
  }

  return (task) => {
    const end = sizeOrFail(task);
    say(end === null ? { run: task.run, kind: 'left' } : { run: task.run, kind: 'end', end });
  };
}
