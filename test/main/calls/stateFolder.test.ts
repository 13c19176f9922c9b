import { expect, it } from 'vitest';
import { stateFolder, thisHome, type Home } from '../../../main/calls/stateFolder.js';

const PLACES: readonly (readonly [NodeJS.Platform, Home['env'], string, string])[] = [
  ['linux', {}, '/home/ann', '/home/ann/.local/state/wringwall'],
  ['linux', { XDG_STATE_HOME: '/state' }, '/home/ann', '/state/wringwall'],
  ['linux', { XDG_STATE_HOME: 'state' }, '/home/ann', '/home/ann/.local/state/wringwall'],
  ['freebsd', { XDG_STATE_HOME: '' }, '/home/ann', '/home/ann/.local/state/wringwall'],
  ['darwin', { XDG_STATE_HOME: '/state' }, '/Users/ann', '/Users/ann/Library/Application Support/Wringwall'],
  ['win32', { LOCALAPPDATA: 'D:\\Local' }, 'C:\\Users\\ann', 'D:\\Local\\Wringwall'],
  ['win32', {}, 'C:\\Users\\ann', 'C:\\Users\\ann\\AppData\\Local\\Wringwall'],
];

it.each(PLACES)("on %s with %j is the platform's own", (platform, env, home, folder) => {
  expect(stateFolder({ platform, env, home })).toBe(folder);
});

it('of this machine is a full path', () => {
  expect(stateFolder(thisHome())).toMatch(/wringwall$/i);
});
