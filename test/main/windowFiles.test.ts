import { mkdirSync, symlinkSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { expect, it } from 'vitest';
import { readWindowFiles } from '../../main/windowFiles.js';
import { temporaryFolder } from './temporary.js';

function built(files: Readonly<Record<string, string>>): string {
  const folder = temporaryFolder();
  mkdirSync(path.join(folder, 'assets'));
  for (const [name, text] of Object.entries(files)) writeFileSync(path.join(folder, name), text);
  return folder;
}

it('are the files of the folder by the paths that ask for them, with their types, and the page', async () => {
  const files = await readWindowFiles(built({ 'index.html': '<p>', 'assets/a.js': '1', 'assets/b.woff2': '2' }));
  expect([...files.keys()].sort()).toEqual(['/', '/assets/a.js', '/assets/b.woff2', '/index.html']);
  expect(files.get('/')).toBe(files.get('/index.html'));
  expect(files.get('/assets/a.js')?.type).toBe('text/javascript; charset=utf-8');
  expect(files.get('/assets/b.woff2')?.type).toBe('font/woff2');
});

it('leave out what a window is not built of, and what only points elsewhere', async () => {
  const folder = built({ 'index.html': '<p>', 'assets/a.js.map': '{}', '.env': 'x', 'run.sh': 'x' });
  symlinkSync('/etc/hostname', path.join(folder, 'assets', 'host.json'));
  expect([...(await readWindowFiles(folder)).keys()].sort()).toEqual(['/', '/index.html']);
});

it('are refused without a page', async () => {
  await expect(readWindowFiles(built({ 'assets/a.js': '1' }))).rejects.toThrow('its page is missing');
});
