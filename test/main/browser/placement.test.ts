import { mkdirSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { expect, it } from 'vitest';
import { placementIn } from '../../../main/browser/placement.js';
import { temporaryFolder } from '../temporary.js';

function profile(preferences: unknown): string {
  const folder = temporaryFolder();
  mkdirSync(path.join(folder, 'Default'));
  const text = typeof preferences === 'string' ? preferences : JSON.stringify(preferences);
  writeFileSync(path.join(folder, 'Default', 'Preferences'), text);
  return folder;
}

const PLACE = { left: 10, top: 20, right: 1210, bottom: 820, maximized: false, work_area_left: 0 };
const under = (place: unknown): unknown => ({ browser: { app_window_placement: place } });

it('is read from under a name that was split at its dots', () => {
  const place = { '127': { '0': { '0': { '1_/': PLACE } } } };
  expect(placementIn(profile(under(place)))).toEqual({ left: 10, top: 20, width: 1200, height: 800, maximized: false });
});

it('is read from under a name in one piece', () => {
  expect(placementIn(profile(under({ '127.0.0.1_/': { ...PLACE, maximized: true } })))?.maximized).toBe(true);
});

it.each([
  ['', 'no JSON'],
  ['null', 'nothing'],
  [{ browser: 1 }, 'no record'],
  [under({}), 'an empty record'],
  [under({ a: { ...PLACE, right: 11 } }), 'no width'],
  [under({ a: { ...PLACE, top: '20' } }), 'no number'],
])('is none where the file holds %j: %s', (preferences) => {
  expect(placementIn(profile(preferences))).toBeNull();
});

it('is none where there is no file', () => {
  expect(placementIn('/nowhere')).toBeNull();
});
