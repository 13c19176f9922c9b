import type { Followed, SizeEnd, SizeUpdate } from '../contract.js';
import type { WorkerEntry } from './entry.js';
import type { RunNews, WorkerStart } from './protocol.js';
import { newRun, type Run } from './run.js';
import { startThread, type Thread } from './thread.js';

/** What a runner is made of. */
export interface RunnerOptions {
  readonly entry: WorkerEntry;
  readonly library: Omit<WorkerStart, 'wanted'>;
  /** milliseconds in which a worker must leave a run that is no longer wanted; default 500 */
  readonly patience?: number;
  /** MB that a worker may take; default 1024 */
  readonly memory?: number;
}

const PATIENCE = 500;
const MEMORY = 1024;
/** How often a run's worker is started again before the run is given up. */
const MOST_RESTARTS = 2;
/** The number of no run. */
const NONE = 0;

/**
 * Sizes the jobs of one window in a worker thread, one at a time: a new run supersedes the one in flight, which a
 * number in shared memory tells the busy worker. A worker that does not heed it in time is ended, and one that dies is
 * started again with the run it died under.
 */
export class Runner {
  readonly #options: RunnerOptions;
  readonly #wanted = new Int32Array(new SharedArrayBuffer(4));
  #thread: Thread | null = null;
  #isReady = false;
  #isClosed = false;
  #count = NONE;
  /** the run that the worker has */
  #current: Run | null = null;
  /** the run that waits until the worker is ready and free */
  #next: Run | null = null;
  #patience: NodeJS.Timeout | undefined;

  constructor(options: RunnerOptions) {
    this.#options = options;
  }

  /** Sizes a job document; the run in flight, if any, ends as superseded at once. */
  size(job: unknown, onUpdate: (update: SizeUpdate) => void): Followed<SizeEnd> {
    this.#count += 1;
    const run = newRun(this.#count, job, onUpdate);
    this.#abandon(this.#next, { kind: 'superseded' });
    this.#abandon(this.#current, { kind: 'superseded' });
    this.#next = run;
    this.#advance();
    return {
      done: run.done,
      stop: () => {
        this.#abandon(run, { kind: 'stopped' });
      },
    };
  }

  /** Starts the worker and lets it size a job that nobody waits for, so that the first run finds it warm. */
  warm(job: unknown): void {
    this.size(job, () => undefined);
  }

  /** Ends the worker; runs that have not ended end as stopped. */
  async close(): Promise<void> {
    this.#isClosed = true;
    this.#abandon(this.#next, { kind: 'stopped' });
    this.#abandon(this.#current, { kind: 'stopped' });
    clearTimeout(this.#patience);
    const thread = this.#thread;
    this.#thread = null;
    await thread?.kill();
  }

  /** Gives the waiting run to the worker, if there is one and the worker is free. */
  #advance(): void {
    if (this.#next === null || this.#current !== null) return;
    if (this.#isClosed) {
      this.#abandon(this.#next, { kind: 'stopped' });
      return;
    }
    this.#thread ??= this.#start();
    if (!this.#isReady) return;
    this.#current = this.#next;
    this.#next = null;
    Atomics.store(this.#wanted, 0, this.#current.number);
    this.#thread.size({ run: this.#current.number, job: this.#current.job });
  }

  #abandon(run: Run | null, end: SizeEnd): void {
    if (run === null || run.hasEnded()) return;
    run.end(end);
    if (run === this.#next) this.#next = null;
    if (run !== this.#current) return;
    Atomics.store(this.#wanted, 0, NONE);
    this.#patience = setTimeout(() => {
      this.#replaceThread();
    }, this.#options.patience ?? PATIENCE);
  }

  /** The worker is free, or there is none. */
  #free(): void {
    clearTimeout(this.#patience);
    this.#current = null;
    this.#advance();
  }

  /** Ends a worker that does not leave an unwanted run. */
  #replaceThread(): void {
    void this.#thread?.kill();
    this.#thread = null;
    this.#free();
  }

  #start(): Thread {
    this.#isReady = false;
    const { entry, library, memory = MEMORY } = this.#options;
    const { records, stockLists } = library;
    const start = { records, stockLists, wanted: this.#wanted.buffer };
    return startThread(
      { entry, memory, start },
      {
        ready: () => {
          this.#isReady = true;
          this.#advance();
        },
        news: (news) => {
          this.#hear(news);
        },
        died: (reason) => {
          this.#mourn(reason);
        },
      },
    );
  }

  #hear(news: RunNews): void {
    const run = this.#current;
    if (run?.number !== news.run) return;
    if (news.kind === 'update') {
      run.tell(news.update);
      return;
    }
    if (news.kind === 'end') run.end(news.end);
    this.#free();
  }

  /** The worker died: its run, or the one that waited for it to start, begins anew or is given up. */
  #mourn(reason: string): void {
    this.#thread = null;
    const run = this.#current ?? this.#next;
    if (run !== null && !run.hasEnded()) this.#begin(run, reason);
    this.#free();
  }

  #begin(run: Run, reason: string): void {
    run.deaths += 1;
    if (run.deaths > MOST_RESTARTS) {
      if (run === this.#next) this.#next = null;
      run.end({ kind: 'failed', sentence: `The solver stopped ${run.deaths} times (${reason}). The job is kept.` });
      return;
    }
    this.#next = run;
    this.#current = null;
    run.tell({ kind: 'restarted', reason: `The solver stopped (${reason}) and was started again.` });
  }
}
