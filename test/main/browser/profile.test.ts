import { spawnSync } from 'node:child_process';
import { readdirSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { expect, it } from 'vitest';
import { takeProfile } from '../../../main/browser/profile.js';
import { temporaryFolder } from '../temporary.js';

it('is one for each window that is open, and used again when it is free', () => {
  const folder = temporaryFolder();
  const one = takeProfile(folder);
  const two = takeProfile(folder);
  expect(one?.folder).toBe(path.join(folder, 'browser', '1'));
  expect(two?.folder).toBe(path.join(folder, 'browser', '2'));
  one?.release();
  const again = takeProfile(folder);
  expect(again?.folder).toBe(one?.folder);
});

it('that a process left behind when it died is free', () => {
  const folder = temporaryFolder();
  takeProfile(folder)?.release();
  const { pid } = spawnSync(process.execPath, ['-e', '']);
  writeFileSync(path.join(folder, 'browser', '1.lock'), String(pid));
  expect(takeProfile(folder)?.folder).toBe(path.join(folder, 'browser', '1'));
});

it('with a lock that says nothing is free', () => {
  const folder = temporaryFolder();
  takeProfile(folder)?.release();
  writeFileSync(path.join(folder, 'browser', '1.lock'), 'x');
  expect(takeProfile(folder)?.folder).toBe(path.join(folder, 'browser', '1'));
});

it('is none where too many are taken', () => {
  const folder = temporaryFolder();
  for (let taken = 0; taken < 8; taken++) expect(takeProfile(folder)).not.toBeNull();
  expect(takeProfile(folder)).toBeNull();
  expect(readdirSync(path.join(folder, 'browser'))).toHaveLength(16);
});
