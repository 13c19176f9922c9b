import type { Memory } from '../calls/memory.js';
import { FIRST_SIZE, LEAST_SIZE, reachable, readPlacement, type Placement } from './bounds.js';
import type { BrowserWindowApi, ElectronApi } from './electronApi.js';
import { PAGE } from './files.js';
import { holdStill, webPreferences } from './security.js';

function keepPlacement(window: BrowserWindowApi, memory: Memory): void {
  window.on('close', () => {
    const placement: Placement = { bounds: window.getNormalBounds(), maximized: window.isMaximized() };
    // a place that cannot be kept is no reason to keep a window open
    memory.keep(placement).catch(() => undefined);
  });
}

/** Makes the window where it stood last, its page held still; the page is not loaded yet. */
export async function makeWindow(api: ElectronApi, preload: string, memory: Memory): Promise<BrowserWindowApi> {
  const { bounds, maximized } = readPlacement(await memory.recall());
  const place = bounds === null ? FIRST_SIZE : reachable(bounds, api.screen.getDisplayMatching(bounds).workArea);
  const window = new api.BrowserWindow({
    ...place,
    ...LEAST_SIZE,
    title: 'Wringwall',
    show: false,
    autoHideMenuBar: true,
    webPreferences: webPreferences(preload),
  });
  holdStill(window.webContents);
  window.once('ready-to-show', () => {
    if (maximized) window.maximize();
    window.show();
  });
  keepPlacement(window, memory);
  return window;
}

/** Loads the window's page. */
export function loadPage(window: BrowserWindowApi): Promise<void> {
  return window.loadURL(PAGE);
}

/** Brings a window to the front, for a second start of the app. */
export function bringForward(window: BrowserWindowApi): void {
  if (window.isMinimized()) window.restore();
  window.focus();
}
