import { appendFileSync, readFileSync } from 'node:fs';
import { parentPort, workerData } from 'node:worker_threads';
import type { RunNews, WorkerStart } from '../../../main/solver/protocol.js';
import { workOn } from '../../../main/solver/work.js';

/** What a job of the tests may ask its worker to do, in place of sizing it to the end. */
export interface Sabotage {
  /** after the first candidate: end, loop for ever, or eat all memory; `throw`: fail before it begins */
  readonly how: 'exit' | 'hang' | 'memory' | 'throw';
  /** how often, before the job is sized like any other */
  readonly times: number;
  /** a file in which the times are counted, since a worker that dies forgets */
  readonly marks: string;
  readonly job: unknown;
}

/** A worker that does as its job's sabotage says, and otherwise sizes the job as any worker does. */
let sabotage: Sabotage | null = null;

function isTime({ marks, times }: Sabotage): boolean {
  appendFileSync(marks, '.');
  return readFileSync(marks, 'utf8').length <= times;
}

function act({ how }: Sabotage): void {
  const hoard: unknown[] = [];
  if (how === 'exit') process.exit(7);
  for (;;) if (how === 'memory') hoard.push(new Array(100_000).fill(hoard.length));
}

function say(news: RunNews): void {
  parentPort?.postMessage(news);
  const isCandidate = news.kind === 'update' && news.update.kind === 'candidate';
  if (isCandidate && sabotage !== null && isTime(sabotage)) act(sabotage);
}

const work = workOn(workerData as WorkerStart, say);

parentPort?.on('message', ({ run, job }: { readonly run: number; readonly job: { readonly sabotage?: Sabotage } }) => {
  sabotage = job.sabotage ?? null;
  if (sabotage?.how === 'throw' && isTime(sabotage)) throw new Error('out of order');
  work({ run, job: sabotage === null ? job : sabotage.job });
});
parentPort?.postMessage({ kind: 'ready' });
