import { stateFolder, thisHome } from './calls/stateFolder.js';
import { rootFolder } from './files/assets.js';
import { start } from './launch/start.js';

const home = thisHome();

/** Ctrl+C, or a polite end from outside. */
const ended = new Promise<void>((resolve) => {
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP'] as const) {
    process.on(signal, () => {
      resolve();
    });
  }
});

process.exitCode = await start(process.argv.slice(2), {
  root: rootFolder(),
  folder: stateFolder(home),
  home,
  isRoot: process.getuid?.() === 0,
  out: (line) => {
    console.log(line);
  },
  log: (line) => {
    console.error(line);
  },
  ended,
});
