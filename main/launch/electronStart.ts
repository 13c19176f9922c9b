import { spawn } from 'node:child_process';
import path from 'node:path';
import { createInterface } from 'node:readline';
import { hasDisplay, type StartMeans } from './browserStart.js';
import { electronProgram, electronThere } from './electronProgram.js';

/** A program that ends sooner than this with an error never showed its window, ms. */
const OPENING = 5000;

/** Why Electron is not even looked for, in a clause; null where it is. */
export function keptOut({ home, isRoot }: Pick<StartMeans, 'home' | 'isRoot'>): string | null {
  const { CI = '' } = home.env;
  if (CI !== '' && CI !== 'false' && CI !== '0') return 'Electron is not used under CI';
  if (!hasDisplay(home)) return 'Electron needs a display';
  return isRoot ? 'Electron does not run as root' : null;
}

/** How the desk's own lines begin; what the browser inside says for its makers stays out. */
const OWN_LINE = /^(?:refused|failed:|Wringwall|what was remembered) /;

/** Runs the built app; true where its window had opened. */
function runElectron(program: string, { root, ended, log }: StartMeans): Promise<boolean> {
  const begun = performance.now();
  const child = spawn(program, [path.join(root, 'dist', 'main', 'app.js')], {
    cwd: root,
    stdio: ['ignore', 'ignore', 'pipe'],
  });
  createInterface({ input: child.stderr }).on('line', (line) => {
    if (OWN_LINE.test(line)) log(line);
  });
  void ended.then(() => child.kill());
  return new Promise((resolve) => {
    child.once('error', () => {
      resolve(false);
    });
    child.once('close', (status) => {
      resolve(status === 0 || performance.now() - begun > OPENING);
    });
  });
}

/** Runs the app in Electron until it is closed; else says in a clause why not. */
export async function startInElectron(means: StartMeans, ready: Promise<boolean>): Promise<string | null> {
  const why = keptOut(means);
  if (why !== null) return why;
  if (electronThere(means.root) === null) means.out('Fetching Electron, for ten seconds at most …');
  const [program, isReady] = await Promise.all([electronProgram(means.root), ready]);
  if (!isReady) return null;
  if (program === null) return "Electron's program is not there and could not be fetched";
  return (await runElectron(program, means)) ? null : 'Electron did not start';
}
