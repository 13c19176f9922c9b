import { describe, expect, it } from 'vitest';
import { browserPlaces, findBrowser } from '../../../main/browser/findBrowser.js';

const LINUX = { platform: 'linux', env: { PATH: '/usr/local/bin:/usr/bin' }, home: '/home/ann' } as const;

describe('a browser', () => {
  it('is looked for on the path, folder by folder', () => {
    expect(browserPlaces(LINUX).slice(0, 2)).toEqual(['/usr/local/bin/chromium', '/usr/bin/chromium']);
    expect(findBrowser(LINUX, (place) => place === '/usr/bin/chromium')).toBe('/usr/bin/chromium');
    expect(findBrowser(LINUX, () => false)).toBeNull();
  });

  it('that a variable names stands alone, the own variable first', () => {
    const env = { ...LINUX.env, CHROME_PATH: '/opt/one', WRINGWALL_BROWSER: '/opt/two' };
    expect(browserPlaces({ ...LINUX, env })).toEqual(['/opt/two', '/opt/one']);
    expect(
      findBrowser({ ...LINUX, env: { ...LINUX.env, CHROME_PATH: '/opt/one' } }, (place) => place !== '/opt/one'),
    ).toBeNull();
  });

  it('has its places on macOS and Windows', () => {
    expect(browserPlaces({ platform: 'darwin', env: {}, home: '/Users/ann' })).toContain(
      '/Users/ann/Applications/Chromium.app/Contents/MacOS/Chromium',
    );
    const env = { ProgramFiles: 'C:\\Program Files' };
    expect(browserPlaces({ platform: 'win32', env, home: 'C:\\Users\\ann' })).toContain(
      'C:\\Program Files\\Chromium\\Application\\chrome.exe',
    );
  });

  it('is a program: a folder or a text of the name is passed over', () => {
    const env = { WRINGWALL_BROWSER: import.meta.dirname, CHROME_PATH: import.meta.filename };
    expect(findBrowser({ ...LINUX, env })).toBeNull();
    expect(findBrowser({ ...LINUX, env: { WRINGWALL_BROWSER: process.execPath } })).toBe(process.execPath);
  });
});
