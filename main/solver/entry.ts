import path from 'node:path';

/** The module that a worker thread runs: a full path. */
export type WorkerEntry = string;

/** The worker as the build bundles it into the folder of the built main process. */
export function builtWorker(folder: string): WorkerEntry {
  return path.join(folder, 'worker.js');
}
