import type { SizeEnd, SizeUpdate } from '../contract.js';

/** What a worker is started with. */
export interface WorkerStart {
  /** the shipped metal records and stock lists, as their files hold them */
  readonly records: readonly unknown[];
  readonly stockLists: readonly unknown[];
  /** one Int32: the number of the run that is wanted; a worker reads it between steps, since it hears nothing else */
  readonly wanted: SharedArrayBuffer;
}

/** What a worker is sent: a job to size, under a run's number. */
export interface WorkerTask {
  readonly run: number;
  readonly job: unknown;
}

/** How a run ends in a worker. */
export type WorkerEnd = Extract<SizeEnd, { kind: 'report' | 'refused' | 'failed' }>;

/** What a worker says: first that it is ready; after `end` or `left` it waits for the next task. */
export type WorkerNews = { readonly kind: 'ready' } | RunNews;

/** What a worker says of a run. */
export type RunNews =
  | { readonly run: number; readonly kind: 'update'; readonly update: SizeUpdate }
  | { readonly run: number; readonly kind: 'end'; readonly end: WorkerEnd }
  /** the run was no longer wanted */
  | { readonly run: number; readonly kind: 'left' };
