import { parentPort, workerData } from 'node:worker_threads';
import type { WorkerNews, WorkerStart, WorkerTask } from './protocol.js';
import { workOn } from './work.js';

// The runner alone starts this file, and speaks the types of protocol.ts.
const work = workOn(workerData as WorkerStart, (news) => {
  parentPort?.postMessage(news);
});

parentPort?.on('message', (task: WorkerTask) => {
  work(task);
});

const ready: WorkerNews = { kind: 'ready' };
parentPort?.postMessage(ready);
