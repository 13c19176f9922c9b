import { setImmediate } from 'node:timers/promises';
import { startInBrowser, type StartMeans } from './browserStart.js';
import { build } from './build.js';
import { startInElectron } from './electronStart.js';
import { isBuilt } from './freshness.js';
import { readStartCall, START_HELP, type StartCall } from './startCall.js';

async function buildIfNeeded({ root, out, log }: StartMeans): Promise<boolean> {
  if (isBuilt(root)) return true;
  out('Building the window …');
  const fault = await build(root);
  if (fault !== null) log(`The window cannot be built:\n${fault}`);
  return fault === null;
}

/** Whether the user ended the program while it was still on its way. */
function hasEnded({ ended }: StartMeans): Promise<boolean> {
  return Promise.race([ended.then(() => true), setImmediate(false)]);
}

async function open({ browser, noOpen }: StartCall, means: StartMeans): Promise<number> {
  const built = buildIfNeeded(means);
  if (!browser && !noOpen) {
    const why = await startInElectron(means, built);
    if (why === null) return (await built) ? 0 : 1;
    means.out(`${why}: opening the browser host.`);
  }
  if (!(await built)) return 1;
  if (await hasEnded(means)) return 0;
  await startInBrowser(means, noOpen);
  return 0;
}

/**
 * `npm start`: builds what is missing or old, then opens the window.
 * @returns the exit status; nothing is thrown, and every fault is told in a sentence
 */
export async function start(argv: readonly string[], means: StartMeans): Promise<number> {
  const call = readStartCall(argv);
  if (typeof call === 'string') {
    means.log(call);
    return 2;
  }
  if (call.help) {
    means.out(START_HELP);
    return 0;
  }
  try {
    return await open(call, means);
  } catch (error) {
    means.log(
      `Wringwall cannot start: ${error instanceof Error ? (error.message.split('\n')[0] ?? '') : String(error)}`,
    );
    return 1;
  }
}
