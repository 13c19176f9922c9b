import { spawn } from 'node:child_process';
import { placementIn, type Placed } from './placement.js';
import type { Profile } from './profile.js';

/** How the window stands: where it stood last, and at first in the size that it is drawn for. */
function placeArguments(placed: Placed | null): readonly string[] {
  if (placed === null) return ['--window-size=1440,900'];
  const { left, top, width, height, maximized } = placed;
  const place = [`--window-size=${width},${height}`, `--window-position=${left},${top}`];
  return maximized ? [...place, '--start-maximized'] : place;
}

/** Keeps a browser to its one window: no first-run pages, no extras, no address but this machine's own. */
const QUIET = [
  '--host-resolver-rules=MAP * ~NOTFOUND, EXCLUDE 127.0.0.1',
  '--no-proxy-server',
  '--no-first-run',
  '--no-default-browser-check',
  '--no-service-autorun',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-component-extensions-with-background-pages',
  '--disable-default-apps',
  '--disable-domain-reliability',
  '--disable-extensions',
  '--disable-features=Translate,OptimizationHints,MediaRouter,AutofillServerCommunication',
  '--disable-quic',
  '--disable-sync',
  '--metrics-recording-only',
  '--no-pings',
  '--password-store=basic',
  '--use-mock-keychain',
];

/** The arguments that open an address as a window without tabs or address bar. */
export function windowArguments(address: string, profile: Profile, isRoot: boolean): readonly string[] {
  return [
    `--app=${address}`,
    `--user-data-dir=${profile.folder}`,
    ...placeArguments(placementIn(profile.folder)),
    ...QUIET,
    // a browser refuses to sandbox what runs as root; "test type" keeps its warning off the window
    ...(isRoot ? ['--no-sandbox', '--test-type'] : []),
  ];
}

/** A browser's window. */
export interface AppWindow {
  /** resolves when the window is closed: true where it had opened */
  readonly closed: Promise<boolean>;
  close(): void;
}

/** A browser that ends sooner than this with an error never showed its window, ms. */
const OPENING = 3000;

/** Opens a browser's window. */
export function openAppWindow(browser: string, args: readonly string[]): AppWindow {
  const begun = performance.now();
  const child = spawn(browser, args, { stdio: 'ignore' });
  const closed = new Promise<boolean>((resolve) => {
    child.once('error', () => {
      resolve(false);
    });
    child.once('exit', (status) => {
      resolve(status === 0 || performance.now() - begun > OPENING);
    });
  });
  return { closed, close: () => void child.kill() };
}
