import { parseArgs } from 'node:util';

/** What `npm start` is asked for. */
export interface StartCall {
  readonly help: boolean;
  /** the browser host, even where Electron's program is there */
  readonly browser: boolean;
  /** the browser host, and no window: its address is printed */
  readonly noOpen: boolean;
}

const OPTIONS = {
  help: { type: 'boolean', short: 'h' },
  browser: { type: 'boolean' },
  'no-open': { type: 'boolean' },
} as const;

export const START_HELP = `Opens Wringwall.

npm start [-- options]

  --browser   use a browser's window, even where Electron is there
  --no-open   open no window: print the address for a browser of your own
  --help      print this

Electron is used where its program is there or arrives within ten seconds, else a browser of the Chromium family
(WRINGWALL_BROWSER or CHROME_PATH names one), else the address is printed. The environment variable CI=true keeps
Electron out. To size a job file without a window: npm run size -- --help
`;

/** Reads the arguments after the program's name; what is wrong with them as a sentence. */
export function readStartCall(argv: readonly string[]): StartCall | string {
  try {
    const { values } = parseArgs({ args: [...argv], options: OPTIONS, strict: true, allowPositionals: false });
    const { help = false, browser = false, 'no-open': noOpen = false } = values;
    return { help, browser, noOpen };
  } catch {
    return `${argv.join(' ')}: not understood; expected --browser, --no-open or --help`;
  }
}
