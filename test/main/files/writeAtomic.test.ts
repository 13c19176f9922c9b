import {
  chmodSync,
  lstatSync,
  mkdirSync,
  readFileSync,
  readdirSync,
  statSync,
  symlinkSync,
  writeFileSync,
} from 'node:fs';
import path from 'node:path';
import { describe, expect, it } from 'vitest';
import { FileError } from '../../../main/files/fileError.js';
import { stageText, writeAll } from '../../../main/files/writeAtomic.js';
import { temporaryFolder } from '../temporary.js';

async function faultOf(work: Promise<unknown>): Promise<unknown> {
  try {
    await work;
    return null;
  } catch (error) {
    return error instanceof FileError ? [error.message, error.mendable] : error;
  }
}

describe('stageText', () => {
  it('leaves the old file until it is committed, and nothing else after', async () => {
    const folder = temporaryFolder();
    const target = path.join(folder, 'out.json');
    writeFileSync(target, 'old');
    const staged = await stageText(target, 'out.json', 'new é');
    expect(readFileSync(target, 'utf8')).toBe('old');
    await staged.commit();
    expect(readFileSync(target, 'utf8')).toBe('new é');
    expect(readdirSync(folder)).toEqual(['out.json']);
  });

  it('leaves nothing behind when it is discarded', async () => {
    const folder = temporaryFolder();
    const staged = await stageText(path.join(folder, 'out.json'), 'out.json', 'new');
    await staged.discard();
    expect(readdirSync(folder)).toEqual([]);
  });

  it('keeps the mode of the file that it replaces', async () => {
    const target = path.join(temporaryFolder(), 'out.json');
    writeFileSync(target, 'old');
    chmodSync(target, 0o646);
    await writeAll([{ target, file: 'out.json', text: 'new' }]);
    expect(statSync(target).mode & 0o777).toBe(0o646);
  });

  it('writes through a link and leaves the link', async () => {
    const folder = temporaryFolder();
    const target = path.join(folder, 'real.json');
    const link = path.join(folder, 'link.json');
    writeFileSync(target, 'old');
    symlinkSync(target, link);
    await writeAll([{ target: link, file: 'link.json', text: 'new' }]);
    expect(lstatSync(link).isSymbolicLink()).toBe(true);
    expect(readFileSync(target, 'utf8')).toBe('new');
  });

  it('writes to a device and leaves it a device', async () => {
    await writeAll([{ target: '/dev/null', file: '/dev/null', text: 'new' }]);
    expect(statSync('/dev/null').isCharacterDevice()).toBe(true);
  });

  it('refuses a folder, and a folder that is not there', async () => {
    const folder = temporaryFolder();
    mkdirSync(path.join(folder, 'sub'));
    expect(await faultOf(stageText(path.join(folder, 'sub'), 'sub', 'x'))).toEqual([
      'sub: this is a folder, not a file',
      true,
    ]);
    expect(await faultOf(stageText(path.join(folder, 'none', 'x'), 'none/x', 'x'))).toEqual([
      'none/x: there is no such file or folder',
      true,
    ]);
    expect(readdirSync(folder)).toEqual(['sub']);
  });

  it('tells a fault of the machine from one that another path would mend', async () => {
    expect(await faultOf(writeAll([{ target: '/dev/full', file: '/dev/full', text: 'x' }]))).toEqual([
      '/dev/full: the disk is full',
      false,
    ]);
  });
});

describe('writeAll', () => {
  it('writes none where one of several cannot be written', async () => {
    const folder = temporaryFolder();
    const target = path.join(folder, 'a.json');
    writeFileSync(target, 'old');
    const work = writeAll([
      { target, file: 'a.json', text: 'new' },
      { target: path.join(folder, 'none', 'b.csv'), file: 'none/b.csv', text: 'new' },
    ]);
    expect(await faultOf(work)).toEqual(['none/b.csv: there is no such file or folder', true]);
    expect(readFileSync(target, 'utf8')).toBe('old');
    expect(readdirSync(folder)).toEqual(['a.json']);
  });
});
