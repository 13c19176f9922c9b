import { execFileSync } from 'node:child_process';
import { chmodSync, mkdirSync, symlinkSync, truncateSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { describe, expect, it } from 'vitest';
import { FileError } from '../../../main/files/fileError.js';
import { readText } from '../../../main/files/readText.js';
import { temporaryFolder } from '../temporary.js';

const MOST = 1000;
/** a user with no rights of its own, by its usual number */
const NOBODY = 65_534;

async function faultOf(full: string): Promise<unknown> {
  try {
    await readText(full, 'given.json', MOST);
    return null;
  } catch (error) {
    return error instanceof FileError ? [error.message, error.mendable] : error;
  }
}

describe('readText', () => {
  it('reads a file up to the limit, and through a link', async () => {
    const full = path.join(temporaryFolder(), 'a.json');
    const text = `\uFEFF${'é'.repeat(498)}x`;
    writeFileSync(full, text);
    symlinkSync(full, `${full}.link`);
    expect(await readText(`${full}.link`, 'a.json', MOST)).toBe(text);
  });

  it('reads an empty file', async () => {
    const full = path.join(temporaryFolder(), 'a.json');
    writeFileSync(full, '');
    expect(await readText(full, 'a.json', MOST)).toBe('');
  });

  it.each([
    ['one byte too long', 1001],
    ['50 MB', 50_000_000],
    ['1 TB, by its size alone', 1e12],
  ])('refuses a file that is %s', async (_name, size) => {
    const full = path.join(temporaryFolder(), 'a.json');
    writeFileSync(full, 'x');
    truncateSync(full, size);
    expect(await faultOf(full)).toEqual([
      'given.json: the file is longer than 0.001 MB; expected at most 0.001 MB',
      true,
    ]);
  });

  it.each([
    ['bytes that are no UTF-8', [0x7b, 0xc3, 0x28], 'this is a binary file or text in another encoding'],
    ['a binary file', [0x89, 0x50, 0x00, 0xff], 'this is a binary file'],
    ['UTF-16', [0xff, 0xfe, 0x7b, 0x00], 'this is text in UTF-16'],
  ])('refuses %s', async (_name, bytes, wrong) => {
    const full = path.join(temporaryFolder(), 'a.json');
    writeFileSync(full, Uint8Array.from(bytes));
    expect(await faultOf(full)).toEqual([`given.json: ${wrong}; expected text in UTF-8`, true]);
  });

  it('refuses what is not there, a folder, a file for a folder and a link to itself', async () => {
    const folder = temporaryFolder();
    writeFileSync(path.join(folder, 'file'), 'x');
    mkdirSync(path.join(folder, 'folder'));
    symlinkSync(path.join(folder, 'loop'), path.join(folder, 'loop'));
    const names = ['none', 'folder', 'file/x', 'loop', 'x'.repeat(300)];
    expect(await Promise.all(names.map((name) => faultOf(path.join(folder, name))))).toEqual([
      ['given.json: there is no such file or folder', true],
      ['given.json: this is a folder, not a file', true],
      ['given.json: a part of the path is not a folder', true],
      ['given.json: the path goes round in links', true],
      ['given.json: the name is too long', true],
    ]);
  });

  it('refuses devices and pipes without waiting for them', async () => {
    const pipe = path.join(temporaryFolder(), 'pipe');
    execFileSync('mkfifo', [pipe]);
    const expected = ['given.json: this is not a regular file', true];
    expect(await faultOf('/dev/zero')).toEqual(expected);
    expect(await faultOf('/dev/null')).toEqual(expected);
    expect(await faultOf(pipe)).toEqual(expected);
  });

  it('minds the limit while it reads where the size is not known beforehand', async () => {
    // the kernel's own files say that they are empty
    expect(await faultOf('/proc/self/maps')).toEqual([
      'given.json: the file is longer than 0.001 MB; expected at most 0.001 MB',
      true,
    ]);
  });

  it('refuses a file that may not be read', async () => {
    const folder = temporaryFolder();
    const full = path.join(folder, 'a.json');
    writeFileSync(full, '{}');
    chmodSync(full, 0o000);
    chmodSync(folder, 0o755);
    const isSuperUser = process.geteuid?.() === 0;
    // the super-user may read everything, and so steps down for a moment
    if (isSuperUser) process.seteuid?.(NOBODY);
    try {
      expect(await faultOf(full)).toEqual(['given.json: permission is denied', true]);
    } finally {
      if (isSuperUser) process.seteuid?.(0);
    }
  });

  it('escapes what cannot be printed in the name, and keeps a long one whole', () => {
    expect(new FileError(`a\u001b[31m${'b'.repeat(200)}`, 'wrong', true).message).toBe(
      `a\\u{1b}[31m${'b'.repeat(200)}: wrong`,
    );
  });
});
