import type { Desk } from './desk.js';

/** npm runs a script in the package's own folder; what the user typed is meant from the folder they stand in. */
function startFolder(): string {
  const { npm_lifecycle_event: script, INIT_CWD: typedIn } = process.env;
  return script === 'size' && typedIn !== undefined ? typedIn : process.cwd();
}

/** A reader that has closed its end (as "head" does) is no error; any other fault of standard output is. */
function mindOutput(): void {
  process.stdout.on('error', (error: NodeJS.ErrnoException) => {
    if (error.code === 'EPIPE') return;
    process.stderr.write(`standard output: cannot be written (${error.code ?? 'error'})\n`);
    process.exitCode = 1;
  });
  process.stderr.on('error', () => undefined);
}

/** The desk of this process. */
export function machineDesk(): Desk {
  mindOutput();
  return {
    out: (text) => void process.stdout.write(text),
    err: (text) => void process.stderr.write(text),
    terminal: process.stderr.isTTY,
    folder: startFolder(),
    engine: async () => (await import('../../src/index.js')).sizeJob,
  };
}
