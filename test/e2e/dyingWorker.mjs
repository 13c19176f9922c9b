// The built worker, which dies in the middle of a run once a file "dies" lies beside this one: with the next thing that it
// says of the run. It takes the file away, so that it dies once.
import { existsSync, rmSync } from 'node:fs';
import { parentPort } from 'node:worker_threads';

const mark = new URL('dies', import.meta.url);
const say = parentPort.postMessage.bind(parentPort);

parentPort.postMessage = (news) => {
  say(news);
  if (news.kind !== 'update' || !existsSync(mark)) return;
  rmSync(mark);
  process.exit(7);
};

await import(process.env.WRINGWALL_TEST_WORKER);
