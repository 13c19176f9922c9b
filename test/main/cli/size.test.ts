import { spawn } from 'node:child_process';
import { readdirSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { describe, expect, it } from 'vitest';
import { demoJob, rootFolder } from '../../../main/files/assets.js';
import { temporaryFolder } from '../temporary.js';

interface Ended {
  readonly status: number | null;
  readonly out: string;
  readonly err: string;
}

interface Setting {
  /** hang up after the first piece of output */
  readonly closeEarly?: boolean;
  /** as npm sets it for its scripts */
  readonly npm?: { readonly npm_lifecycle_event: string; readonly INIT_CWD: string };
}

/** Runs the program as a user would, in a folder of its own. */
function size(folder: string, argv: readonly string[], { closeEarly = false, npm }: Setting = {}): Promise<Ended> {
  const tsx = path.join(rootFolder(), 'node_modules', 'tsx', 'dist', 'cli.mjs');
  const entry = path.join(rootFolder(), 'main', 'cli', 'size.ts');
  // the test's own npm script must not be taken for the user's
  const env = { ...process.env, npm_lifecycle_event: undefined, INIT_CWD: undefined, ...npm };
  const child = spawn(process.execPath, [tsx, entry, ...argv], { cwd: folder, env });
  let out = '';
  let err = '';
  child.stdout.on('data', (piece: Buffer) => {
    out += piece.toString();
    if (closeEarly) child.stdout.destroy();
  });
  child.stderr.on('data', (piece: Buffer) => (err += piece.toString()));
  return new Promise((resolve) => {
    child.on('close', (status) => {
      resolve({ status, out, err });
    });
  });
}

describe('the program', () => {
  it('prints one JSON document for --json -', async () => {
    const { status, out, err } = await size(temporaryFolder(), [demoJob('interconnect.wring.json'), '--json', '-']);
    expect([status, err]).toEqual([0, '']);
    expect(JSON.parse(out)).toMatchObject({ format: 'wringwall-report', version: 1, pick: { material: 'al-6061-t6' } });
  });

  it('writes beside itself and keeps silent with --quiet', async () => {
    const folder = temporaryFolder();
    const ended = await size(folder, [demoJob('interconnect.wring.json'), '--csv', 'a.csv', '--quiet']);
    expect(ended).toEqual({ status: 0, out: '', err: '' });
    expect(readdirSync(folder)).toEqual(['a.csv']);
  });

  it('refuses garbage with status 2, one sentence and no stack trace', async () => {
    const folder = temporaryFolder();
    writeFileSync(path.join(folder, 'bad.json'), '[{"a":'.repeat(100_000));
    expect(await size(folder, ['bad.json'])).toEqual({
      status: 2,
      out: '',
      err: 'bad.json: line 1, column 97: the values are nested deeper than 32 levels; expected at most 32 levels\n',
    });
  });

  it('is quiet when its reader hangs up', async () => {
    const { err } = await size(temporaryFolder(), [demoJob('interconnect.wring.json'), '--json', '-'], {
      closeEarly: true,
    });
    expect(err).toBe('');
  });

  it('reads names from the folder in which the user called npm', async () => {
    const typedIn = temporaryFolder();
    writeFileSync(path.join(typedIn, 'bad.json'), '');
    const npm = { npm_lifecycle_event: 'size', INIT_CWD: typedIn };
    const { err } = await size(rootFolder(), ['bad.json'], { npm });
    expect(err).toBe('bad.json: the file is empty; expected a JSON document\n');
  });
});
