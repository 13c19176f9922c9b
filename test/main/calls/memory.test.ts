import { existsSync, mkdirSync, readdirSync, readFileSync, statSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { describe, expect, it } from 'vitest';
import { fileMemory, type Memory } from '../../../main/calls/memory.js';
import { temporaryFolder } from '../temporary.js';

function memory(folder = temporaryFolder()): { memory: Memory; file: string; log: string[] } {
  const log: string[] = [];
  const file = path.join(folder, 'own', 'state.json');
  return { memory: fileMemory(file, 'The state', (line) => log.push(line)), file, log };
}

describe('a memory', () => {
  it('holds nothing before anything was kept, and makes no folder for it', async () => {
    const { memory: own, file } = memory();
    expect(await own.recall()).toBeNull();
    expect(existsSync(path.dirname(file))).toBe(false);
  });

  it('gives back what was kept last, in a folder that nobody else reads', async () => {
    const { memory: own, file } = memory();
    await own.keep({ a: 1 });
    await own.keep({ b: 2 });
    expect(await own.recall()).toEqual({ b: 2 });
    expect(readdirSync(path.dirname(file))).toEqual(['state.json']);
    expect(statSync(path.dirname(file)).mode & 0o077).toBe(0);
  });

  it('writes the last of many that come at once, and settles when it is written', async () => {
    const { memory: own, file } = memory();
    for (let edit = 0; edit < 50; edit++) void own.keep({ edit });
    await own.settled();
    expect(readFileSync(file, 'utf8')).toBe('{"edit":49}');
  });

  it('refuses what is no JSON and keeps what it has', async () => {
    const { memory: own } = memory();
    await own.keep(1);
    await expect(own.keep(new Map())).rejects.toThrow('The state is not a JSON value');
    expect(await own.recall()).toBe(1);
  });

  it.each(['{"a":', '', '\u0000'])('that is damaged (%j) is put aside, and the log says so', async (text) => {
    const { memory: own, file, log } = memory();
    mkdirSync(path.dirname(file));
    writeFileSync(file, text);
    expect(await own.recall()).toBeNull();
    expect(readFileSync(`${file}.damaged`, 'utf8')).toBe(text);
    expect(log).toHaveLength(1);
    expect(await own.recall()).toBeNull();
    expect(log).toHaveLength(1);
  });

  it('goes on after a write that failed', async () => {
    const { memory: own, file } = memory();
    mkdirSync(file, { recursive: true });
    await expect(own.keep(1)).rejects.toThrow('this is a folder, not a file');
    await expect(own.keep(2)).rejects.toThrow('this is a folder, not a file');
    await own.settled();
  });
});
