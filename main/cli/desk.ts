import type { Brief } from '../../src/job/job.js';
import type { Report } from '../../src/report/report.js';

/** The engine's one call: sizes a job, telling its progress material by material. */
export type SizeJob = (brief: Brief, onProgress?: (done: number, of: number, materialName: string) => void) => Report;

/** What the command line needs of the machine, so that a test can stand in for it. */
export interface Desk {
  /** standard output */
  out(text: string): void;
  /** standard error */
  err(text: string): void;
  /** whether standard error is a terminal */
  readonly terminal: boolean;
  /** the folder against which relative paths are read */
  readonly folder: string;
  /** the engine, fetched when it is needed */
  engine(): Promise<SizeJob>;
}

/** Exit statuses of the command line. */
export const EXIT = Object.freeze({ found: 0, failed: 1, wrong: 2, nothingFits: 3 });

/** A mistake in the job or the call, already in sentences for the user. */
export class CallError extends Error {
  override readonly name = 'CallError';

  constructor(readonly sentences: readonly string[]) {
    super(sentences.join('\n'));
  }
}
