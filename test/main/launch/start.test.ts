import { existsSync, readFileSync } from 'node:fs';
import path from 'node:path';
import { describe, expect, it, vi } from 'vitest';
import { hasDisplay, type StartMeans } from '../../../main/launch/browserStart.js';
import { keptOut } from '../../../main/launch/electronStart.js';
import { start } from '../../../main/launch/start.js';
import { httpDesk } from '../browser/client.js';
import { jobOf } from '../solver/jobs.js';
import { temporaryFolder } from '../temporary.js';
import { builtRoot, put, putProgram } from './builtRoot.js';

interface Started {
  readonly status: Promise<number>;
  readonly said: string[];
  readonly end: () => void;
  readonly folder: string;
}

type Environment = Readonly<Record<string, string>>;

/** Starts over a root of the tests; nothing of this machine's environment is seen. */
function started(argv: readonly string[], root: string, env: Environment = {}, own: Partial<StartMeans> = {}): Started {
  const said: string[] = [];
  const folder = path.join(temporaryFolder(), 'state');
  const note = (line: string): void => void said.push(line);
  let end = (): void => undefined;
  const ended = new Promise<void>((resolve) => {
    end = resolve;
  });
  const home = { platform: 'linux', env, home: folder } as const;
  const status = start(argv, { root, folder, home, isRoot: false, out: note, log: note, ended, ...own });
  return { status, said, end, folder };
}

/** The address that a start prints. */
async function addressOf(said: readonly string[]): Promise<URL> {
  const found = await vi.waitFor(
    () => {
      const address = /http:\S+/.exec(said.join('\n'))?.[0];
      if (address === undefined) throw new Error(`no address in ${said.join(' | ')}`);
      return address;
    },
    { timeout: 10_000 },
  );
  return new URL(found);
}

const SCREEN = { DISPLAY: ':1' };

describe('start', () => {
  it('prints its help, and a sentence for what it does not understand', async () => {
    const help = started(['--help'], '/nowhere');
    expect(await help.status).toBe(0);
    expect(help.said[0]).toContain('npm start');
    const wrong = started(['--wrong'], '/nowhere');
    expect(await wrong.status).toBe(2);
    expect(wrong.said).toEqual(['--wrong: not understood; expected --browser, --no-open or --help']);
  });

  it('with --no-open prints the address of a host that sizes, until it is ended', async () => {
    const { said, status, end } = started(['--no-open'], builtRoot(), SCREEN);
    const address = await addressOf(said);
    const desk = httpDesk({ host: address.host, token: address.hash.slice(1) });
    expect((await desk.follow('size', { job: jobOf() }, () => undefined).done).kind).toBe('report');
    end();
    expect(await status).toBe(0);
    expect(said).toHaveLength(1);
    await expect(fetch(address)).rejects.toThrow();
  });

  it('without a display says so and prints the address', async () => {
    const { said, status, end } = started([], builtRoot());
    await addressOf(said);
    expect(said.slice(0, 2)).toEqual(['Electron needs a display: opening the browser host.', 'There is no display.']);
    end();
    expect(await status).toBe(0);
  });

  it('without a browser says so and prints the address', async () => {
    const { said, end, status } = started(['--browser'], builtRoot(), SCREEN);
    await addressOf(said);
    expect(said[0]).toBe('No browser of the Chromium family was found.');
    end();
    expect(await status).toBe(0);
  });

  it('opens a browser with a profile of its own, and ends when its window is closed', async () => {
    const root = builtRoot();
    const browser = putProgram(root, 'browser', `echo "$@" > "${root}/arguments"`);
    const { said, status, folder } = started(['--browser'], root, { ...SCREEN, WRINGWALL_BROWSER: browser });
    expect(await status).toBe(0);
    expect(said).toEqual(['Wringwall is open in a window of its own; closing it ends the program.']);
    const given = readFileSync(path.join(root, 'arguments'), 'utf8');
    expect(given).toMatch(/--app=http:\/\/127\.0\.0\.1:\d+\/\?ticket=\S{43} /);
    expect(given).not.toContain('#');
    expect(given).toContain(`--user-data-dir=${path.join(folder, 'browser', '1')}`);
    expect(existsSync(path.join(folder, 'browser', '1.lock'))).toBe(false);
  });

  it('prints the address where the browser fails', async () => {
    const root = builtRoot();
    const browser = putProgram(root, 'browser', 'exit 1');
    const { said, status, end } = started(['--browser'], root, { ...SCREEN, WRINGWALL_BROWSER: browser });
    await addressOf(said);
    expect(said[1]).toBe('The browser did not open its window.');
    end();
    expect(await status).toBe(0);
  });

  it('that the user ends on its way opens nothing', async () => {
    const { said, status, end } = started(['--no-open'], builtRoot());
    end();
    expect(await status).toBe(0);
    expect(said).toEqual([]);
  });

  it('builds what is old, and stops with a sentence where that fails', async () => {
    const root = temporaryFolder();
    put(root, 'node_modules/electron-vite/bin/electron-vite.js', `console.error('no such module'); process.exit(1)`);
    const { said, status } = started(['--no-open'], root);
    expect(await status).toBe(1);
    expect(said).toEqual(['Building the window …', 'The window cannot be built:\nno such module']);
  });

  it('tells a damaged installation in a sentence, without a stack', async () => {
    const root = builtRoot();
    put(root, 'node_modules/electron-vite/bin/electron-vite.js', '');
    const { said, status } = started(['--no-open'], path.join(root, 'nowhere'), {}, {});
    expect(await status).toBe(1);
    expect(said.join('\n')).not.toMatch(/^\s+at /m);
  });
});

describe('Electron', () => {
  function rootWithElectron(script: string): string {
    const root = builtRoot();
    put(root, 'node_modules/electron/path.txt', 'electron');
    putProgram(root, 'node_modules/electron/dist/electron', script);
    return root;
  }

  it('runs the built app where its program is there', async () => {
    const root = builtRoot();
    put(root, 'node_modules/electron/path.txt', 'electron');
    putProgram(root, 'node_modules/electron/dist/electron', `echo "$@" > "${root}/arguments"`);
    const { said, status } = started([], root, SCREEN);
    expect(await status).toBe(0);
    expect(said).toEqual([]);
    expect(readFileSync(path.join(root, 'arguments'), 'utf8').trim()).toBe(path.join(root, 'dist', 'main', 'app.js'));
  });

  it("passes on the desk's own lines and not the browser's", async () => {
    const root = rootWithElectron(`echo 'refused wringwall:ask:begin: x' >&2; echo '[1:2] GPU trouble' >&2; exit 0`);
    const { said, status } = started([], root, SCREEN);
    expect(await status).toBe(0);
    expect(said).toEqual(['refused wringwall:ask:begin: x']);
  });

  it('that does not start leaves the browser host, in one line', async () => {
    const { said, status, end } = started([], rootWithElectron('exit 1'), SCREEN);
    await addressOf(said);
    expect(said[0]).toBe('Electron did not start: opening the browser host.');
    end();
    expect(await status).toBe(0);
  });

  it('that cannot be fetched leaves the browser host, in one line', async () => {
    const { said, status, end } = started([], builtRoot(), SCREEN);
    await addressOf(said);
    expect(said.slice(0, 2)).toEqual([
      'Fetching Electron, for ten seconds at most …',
      "Electron's program is not there and could not be fetched: opening the browser host.",
    ]);
    end();
    expect(await status).toBe(0);
  });

  it('is kept out under CI, without a display, and for root', () => {
    const home = (env: Environment, platform: NodeJS.Platform = 'linux') => ({ platform, env, home: '/' });
    expect(keptOut({ home: home({ ...SCREEN, CI: 'true' }), isRoot: false })).toBe('Electron is not used under CI');
    expect(keptOut({ home: home({}), isRoot: false })).toBe('Electron needs a display');
    expect(keptOut({ home: home(SCREEN), isRoot: true })).toBe('Electron does not run as root');
    expect(keptOut({ home: home({ ...SCREEN, CI: 'false' }), isRoot: false })).toBeNull();
    expect(hasDisplay(home({ WAYLAND_DISPLAY: 'wayland-0' }))).toBe(true);
    expect(hasDisplay(home({}, 'darwin'))).toBe(true);
    expect(hasDisplay(home({}, 'win32'))).toBe(true);
  });
});
