import path from 'node:path';
import type { WorkerEntry } from '../solver/entry.js';
import { Runner } from '../solver/runner.js';
import { tubeChecker } from './check.js';
import { fileMemory } from './memory.js';
import { serveWindow, type Service } from './service.js';
import { readShipped } from './shipped.js';
import { askWork, followWork } from './windowDesk.js';

/** What a desk is made of. */
export interface DeskOptions {
  readonly worker: WorkerEntry;
  /** the app's own folder */
  readonly folder: string;
  /** takes one line, for whoever looks after the program */
  readonly log: (line: string) => void;
}

/** One window's calls, and what ends its worker. */
export interface WindowService extends Service {
  close(): Promise<void>;
}

/** What hosts share: what is shipped, what is remembered, and a runner for each window. */
export interface Desk {
  /** The calls of a new window, its worker already warming. */
  openWindow(): WindowService;
  /** resolves when all that is to be remembered is on disk */
  settled(): Promise<void>;
}

/** Reads what is shipped and makes the desk ready. */
export async function openDesk({ worker, folder, log }: DeskOptions): Promise<Desk> {
  const shipped = await readShipped();
  const check = tubeChecker(shipped);
  const memory = fileMemory(path.join(folder, 'state.json'), 'The state', log);
  return {
    settled: () => memory.settled(),
    openWindow: () => {
      const runner = new Runner({ entry: worker, library: shipped });
      runner.warm(shipped.demos[0]);
      const means = { shipped, memory, runner, check };
      return { ...serveWindow(askWork(means), followWork(means), log), close: () => runner.close() };
    },
  };
}
