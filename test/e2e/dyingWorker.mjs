// The built worker, which dies in the middle of a run where a file "dies" lies beside this one: when it has sized the tenth
// material of a run, which only a long one has. It takes the file away, so that it dies once.
import { existsSync, rmSync } from 'node:fs';
import { parentPort } from 'node:worker_threads';

const mark = new URL('dies', import.meta.url);
const say = parentPort.postMessage.bind(parentPort);
let run = Number.NaN;
let sized = 0;

parentPort.postMessage = (news) => {
  say(news);
  if (news.kind !== 'update' || news.update.kind !== 'candidate') return;
  sized = news.run === run ? sized + 1 : 1;
  run = news.run;
  if (sized < 10 || !existsSync(mark)) return;
  rmSync(mark);
  process.exit(7);
};

await import(process.env.WRINGWALL_TEST_WORKER);
