import { setTimeout as wait } from 'node:timers/promises';
import { openAppWindow, windowArguments, type AppWindow } from '../browser/appWindow.js';
import { findBrowser } from '../browser/findBrowser.js';
import type { BrowserHost } from '../browser/host.js';
import { takeProfile } from '../browser/profile.js';
import { serveBuilt } from '../browser/serve.js';
import type { Home } from '../calls/stateFolder.js';

/** What a start needs of the machine. */
export interface StartMeans {
  readonly root: string;
  /** the app's own folder */
  readonly folder: string;
  readonly home: Home;
  readonly isRoot: boolean;
  readonly out: (line: string) => void;
  readonly log: (line: string) => void;
  /** resolves when the user ends the program */
  readonly ended: Promise<void>;
}

/** Whether windows can be shown: a Unix says so in its environment, the others always can. */
export function hasDisplay({ platform, env }: Home): boolean {
  if (platform === 'win32' || platform === 'darwin') return true;
  return [env['DISPLAY'], env['WAYLAND_DISPLAY']].some((display) => display !== undefined && display !== '');
}

/** How long the host goes on when the window is closed: what the page sent last is still on its way, ms. */
const GRACE = 200;

interface Shown {
  readonly window: AppWindow;
  readonly release: () => void;
}

/** Opens the address in a window of a browser, or says in a clause why not. */
function show(host: BrowserHost, { home, folder, isRoot }: StartMeans): Shown | string {
  if (!hasDisplay(home)) return 'There is no display';
  const browser = findBrowser(home);
  if (browser === null) return 'No browser of the Chromium family was found';
  const profile = takeProfile(folder);
  if (profile === null) return 'Too many windows are open';
  return {
    window: openAppWindow(browser, windowArguments(host.ticketAddress(), profile, isRoot)),
    release: profile.release,
  };
}

/** Prints the address and stays until the user ends the program. */
async function stay(host: BrowserHost, { out, ended }: StartMeans): Promise<void> {
  out(`Open this address in a browser on this machine; Ctrl+C ends Wringwall:\n${host.address}`);
  await ended;
}

async function showUntilClosed(host: BrowserHost, means: StartMeans): Promise<void> {
  const shown = show(host, means);
  if (typeof shown === 'string') {
    means.out(`${shown}.`);
    await stay(host, means);
    return;
  }
  means.out('Wringwall is open in a window of its own; closing it ends the program.');
  const opened = await Promise.race([shown.window.closed, means.ended.then(() => true)]);
  shown.window.close();
  shown.release();
  await wait(GRACE);
  if (opened) return;
  means.out('The browser did not open its window.');
  await stay(host, means);
}

/** Runs the browser host until its window is closed, or the user ends the program. */
export async function startInBrowser(means: StartMeans, noOpen: boolean): Promise<void> {
  const host = await serveBuilt(means.root, means.folder, means.log);
  try {
    await (noOpen ? stay(host, means) : showUntilClosed(host, means));
  } finally {
    await host.close();
  }
}
