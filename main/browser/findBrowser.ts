import { accessSync, constants, statSync } from 'node:fs';
import path from 'node:path';
import type { Home } from '../calls/stateFolder.js';

/** Variables that name a browser, the app's own first. */
const NAMED_BY = ['WRINGWALL_BROWSER', 'CHROME_PATH'];

/** Names of browsers of the Chromium family on the path of a Unix. */
const ON_PATH = [
  'chromium',
  'chromium-browser',
  'google-chrome-stable',
  'google-chrome',
  'microsoft-edge-stable',
  'microsoft-edge',
  'brave-browser',
  'vivaldi-stable',
];

const MAC_APPS = ['Google Chrome', 'Chromium', 'Microsoft Edge', 'Brave Browser', 'Vivaldi'];

const WINDOWS_PROGRAMS = [
  ['Google', 'Chrome', 'Application', 'chrome.exe'],
  ['Chromium', 'Application', 'chrome.exe'],
  ['Microsoft', 'Edge', 'Application', 'msedge.exe'],
  ['BraveSoftware', 'Brave-Browser', 'Application', 'brave.exe'],
];

function windowsPlaces({ env }: Home): string[] {
  const roots = [env['ProgramFiles'], env['ProgramFiles(x86)'], env['LOCALAPPDATA']];
  const known = roots.filter((root) => root !== undefined && root !== '');
  return known.flatMap((root) => WINDOWS_PROGRAMS.map((parts) => path.win32.join(root ?? '', ...parts)));
}

function macPlaces({ home }: Home): string[] {
  const roots = ['/Applications', path.posix.join(home, 'Applications')];
  return roots.flatMap((root) => MAC_APPS.map((app) => `${root}/${app}.app/Contents/MacOS/${app}`));
}

function unixPlaces({ env }: Home): string[] {
  const folders = (env['PATH'] ?? '').split(':').filter((folder) => folder !== '');
  return ON_PATH.flatMap((name) => folders.map((folder) => path.posix.join(folder, name)));
}

/** Where a browser may be, the likeliest first. */
export function browserPlaces(home: Home): readonly string[] {
  const named = NAMED_BY.map((variable) => home.env[variable] ?? '').filter((place) => place !== '');
  if (named.length > 0) return named;
  if (home.platform === 'win32') return windowsPlaces(home);
  return home.platform === 'darwin' ? macPlaces(home) : unixPlaces(home);
}

function isProgram(place: string): boolean {
  try {
    accessSync(place, constants.X_OK);
    return statSync(place).isFile();
  } catch {
    return false;
  }
}

/** The first browser of the Chromium family that is there, or null. One that a variable names stands alone. */
export function findBrowser(home: Home, isThere: (place: string) => boolean = isProgram): string | null {
  return browserPlaces(home).find(isThere) ?? null;
}
