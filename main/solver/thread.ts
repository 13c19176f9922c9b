import { Worker } from 'node:worker_threads';
import type { WorkerEntry } from './entry.js';
import type { RunNews, WorkerNews, WorkerStart, WorkerTask } from './protocol.js';

/** What a thread tells its runner: each at most once but `news`, and nothing after `died` or after it was ended. */
export interface ThreadListener {
  ready(): void;
  news(news: RunNews): void;
  died(reason: string): void;
}

/** A worker thread. */
export interface Thread {
  size(task: WorkerTask): void;
  /** ends the thread at once, in the middle of whatever it does */
  kill(): Promise<void>;
}

/** Milliseconds that a thread may take until it is ready. */
const START_LIMIT = 20_000;

const firstLine = (error: unknown): string => (error instanceof Error ? (error.message.split('\n')[0] ?? '') : 'error');

/** What a thread is made of. */
export interface ThreadMeans {
  readonly entry: WorkerEntry;
  /** MB that it may take */
  readonly memory: number;
  readonly start: WorkerStart;
}

/** Starts a worker thread. */
export function startThread({ entry, memory, start }: ThreadMeans, listener: ThreadListener): Thread {
  const resourceLimits = { maxOldGenerationSizeMb: memory };
  const worker = new Worker(entry, { workerData: start, execArgv: [], resourceLimits });
  let isOver = false;
  let reason: string | null = null;

  function over(): boolean {
    const first = !isOver;
    isOver = true;
    clearTimeout(limit);
    return first;
  }
  function die(why: string): void {
    if (over()) listener.died(why);
    void worker.terminate();
  }
  const limit = setTimeout(() => {
    die('it did not start in time');
  }, START_LIMIT);

  worker.on('message', (news: WorkerNews) => {
    if (isOver) return;
    if (news.kind !== 'ready') {
      listener.news(news);
      return;
    }
    clearTimeout(limit);
    listener.ready();
  });
  worker.on('messageerror', (error) => {
    die(firstLine(error));
  });
  worker.on('error', (error) => {
    reason = firstLine(error);
  });
  worker.on('exit', (code) => {
    die(reason ?? `it ended with code ${code}`);
  });

  return {
    size: (task) => {
      worker.postMessage(task);
    },
    kill: async () => {
      over();
      await worker.terminate();
    },
  };
}
