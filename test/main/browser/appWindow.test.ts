import { mkdirSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { describe, expect, it } from 'vitest';
import { openAppWindow, windowArguments } from '../../../main/browser/appWindow.js';
import { temporaryFolder } from '../temporary.js';

const PROFILE = { folder: '/state/browser/1', release: () => undefined };
const ADDRESS = 'http://127.0.0.1:1/#token';

describe('the arguments of a window', () => {
  it('name the address, a profile of its own, and at first a size', () => {
    const args = windowArguments(ADDRESS, PROFILE, false);
    expect(args).toContain(`--app=${ADDRESS}`);
    expect(args).toContain('--user-data-dir=/state/browser/1');
    expect(args).toContain('--window-size=1440,900');
  });

  it('let the browser reach no machine but this one', () => {
    const args = windowArguments(ADDRESS, PROFILE, false);
    expect(args).toContain('--host-resolver-rules=MAP * ~NOTFOUND, EXCLUDE 127.0.0.1');
    expect(args).toContain('--no-proxy-server');
    expect(args).toContain('--disable-background-networking');
  });

  it('place the window where it stood last', () => {
    const folder = temporaryFolder();
    mkdirSync(path.join(folder, 'Default'));
    const place = { left: 5, top: 6, right: 1005, bottom: 706, maximized: true };
    const preferences = { browser: { app_window_placement: { window: place } } };
    writeFileSync(path.join(folder, 'Default', 'Preferences'), JSON.stringify(preferences));
    const args = windowArguments(ADDRESS, { ...PROFILE, folder }, false);
    expect(args).toEqual(
      expect.arrayContaining(['--window-size=1000,700', '--window-position=5,6', '--start-maximized']),
    );
  });

  it('give the sandbox up for root alone', () => {
    expect(windowArguments(ADDRESS, PROFILE, true).slice(-2)).toEqual(['--no-sandbox', '--test-type']);
    expect(windowArguments(ADDRESS, PROFILE, false)).not.toContain('--no-sandbox');
  });
});

/** Opens a window whose browser is a script. */
async function opened(script: string): Promise<boolean> {
  const file = path.join(temporaryFolder(), 'browser.mjs');
  writeFileSync(file, script);
  return openAppWindow(process.execPath, [file]).closed;
}

describe('a window', () => {
  it('is closed when its browser ends', async () => {
    expect(await opened('process.exit(0)')).toBe(true);
  });

  it('never opened where its browser fails at once, or is not there', async () => {
    expect(await opened('process.exit(1)')).toBe(false);
    expect(await openAppWindow('/nowhere/browser', []).closed).toBe(false);
  });

  it('is closed from here', async () => {
    const window = openAppWindow(process.execPath, ['-e', 'setInterval(() => {}, 1000)']);
    window.close();
    expect(await window.closed).toBe(false);
  });
});
