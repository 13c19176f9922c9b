import { chromium, type Browser } from 'playwright-core';
import { findBrowser } from '../../main/browser/findBrowser.js';
import { thisHome } from '../../main/calls/stateFolder.js';
import { rootFolder } from '../../main/files/assets.js';
import { shippedBrowser, type BrowserProgram } from './shippedBrowser.js';

/** Keeps the browser to this machine: it knows no name, and looks for nothing of its own accord. */
const OFFLINE = [
  '--host-resolver-rules=MAP * ~NOTFOUND, EXCLUDE 127.0.0.1',
  '--no-proxy-server',
  '--no-first-run',
  '--no-default-browser-check',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-default-apps',
  '--disable-domain-reliability',
  '--disable-gpu',
  '--disable-quic',
  '--disable-sync',
  '--no-pings',
];

/** A browser refuses to sandbox what runs as root. */
function sandboxArguments(): readonly string[] {
  return process.getuid?.() === 0 ? ['--no-sandbox'] : [];
}

/**
 * The browser of this machine, else the one that comes as a package.
 * @param asked "shipped" asks for the latter; taken from WRINGWALL_TEST_BROWSER
 */
export function browserProgram(asked = process.env['WRINGWALL_TEST_BROWSER']): BrowserProgram {
  const own = asked === 'shipped' ? null : findBrowser(thisHome());
  return own === null ? shippedBrowser(rootFolder()) : { file: own, env: {} };
}

/** Starts a browser without a screen. */
export function launchBrowser(): Promise<Browser> {
  const { file, env } = browserProgram();
  return chromium.launch({
    executablePath: file,
    args: [...OFFLINE, ...sandboxArguments()],
    env: { ...process.env, ...env },
  });
}
