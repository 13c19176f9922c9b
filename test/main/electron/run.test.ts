import { writeFileSync } from 'node:fs';
import path from 'node:path';
import { describe, expect, it, vi } from 'vitest';
import { PAGE } from '../../../main/electron/files.js';
import { temporaryFolder } from '../temporary.js';
import { jobOf, loadCases, metals } from '../solver/jobs.js';
import { ElectronDouble, PageDouble } from './double.js';
import { openedApp, testApp } from './opened.js';

describe('the window', () => {
  it('runs its page in the sandbox, apart from the preload, without Node', async () => {
    const { electron } = await testApp();
    expect(electron.window.options.webPreferences).toEqual({
      preload: '/built/preload.cjs',
      contextIsolation: true,
      sandbox: true,
      nodeIntegration: false,
      nodeIntegrationInWorker: false,
      nodeIntegrationInSubFrames: false,
      webSecurity: true,
      allowRunningInsecureContent: false,
      webviewTag: false,
      spellcheck: false,
    });
    expect(electron.app.done).toContain('sandbox');
  });

  it('loads its own page and shows it when it is ready', async () => {
    const { window } = (await testApp()).electron;
    expect(window.done).toEqual([`load ${PAGE}`]);
    expect(window.options.show).toBe(false);
    window.emit('ready-to-show');
    expect(window.done).toContain('show');
  });

  it('goes to no other address, opens no other window, holds no page within the page', async () => {
    const page = (await testApp()).electron.window.webContents;
    expect(page.isRefused('will-navigate')).toBe(true);
    expect(page.isRefused('will-attach-webview')).toBe(true);
    expect(page.openHandler?.()).toEqual({ action: 'deny' });
  });

  it('gets no power and downloads nothing', async () => {
    const { defaultSession } = (await testApp()).electron.session;
    const answers: boolean[] = [];
    defaultSession.request?.(null, 'media', (granted) => answers.push(granted));
    expect(answers).toEqual([false]);
    expect(defaultSession.check?.()).toBe(false);
    expect(defaultSession.device?.()).toBe(false);
    expect(defaultSession.isRefused('will-download')).toBe(true);
  });

  it('stands where it stood last', async () => {
    const folder = temporaryFolder();
    const first = await openedApp(folder);
    first.electron.window.bounds = { x: 30, y: 40, width: 1200, height: 800 };
    first.electron.window.maximized = true;
    first.electron.window.emit('close');
    await first.close();
    await vi.waitFor(async () => {
      const { electron, close } = await openedApp(folder);
      await close();
      expect(electron.window.options).toMatchObject({ x: 30, y: 40, width: 1200, height: 800 });
      electron.window.emit('ready-to-show');
      expect(electron.window.done).toContain('maximize');
    });
  });

  it('has its first size where what was remembered cannot be read', async () => {
    const folder = temporaryFolder();
    writeFileSync(path.join(folder, 'window.json'), '{"bounds":');
    const { electron, log, close } = await openedApp(folder);
    await close();
    expect(electron.window.options).toMatchObject({ width: 1440, height: 900 });
    expect(log[0]).toMatch(/^what was remembered cannot be read and is put aside as window.json.damaged: /);
  });
});

describe('the app', () => {
  it('settles folder, sandbox and scheme before it is ready', async () => {
    const { electron, folder } = await testApp();
    expect(electron.app.done).toEqual([`path userData ${path.join(folder, 'electron')}`, 'lock', 'sandbox', 'ready']);
    expect(electron.schemes).toEqual([{ scheme: 'wringwall', privileges: { standard: true, secure: true } }]);
  });

  it('runs once: a second start ends, and brings the first to the front', async () => {
    const second = new ElectronDouble();
    second.app.isFirst = false;
    await testApp({}, second);
    expect(second.windows).toEqual([]);
    expect(second.app.done.at(-1)).toBe('quit');
    const { electron } = await testApp();
    electron.window.minimized = true;
    electron.app.emit('second-instance');
    expect(electron.window.done.slice(-2)).toEqual(['restore', 'focus']);
  });

  it('has the least menu that macOS wants, and none elsewhere', async () => {
    expect((await testApp()).electron.menus).toEqual([null]);
    expect((await testApp({ platform: 'darwin' })).electron.menus).toEqual([
      [{ role: 'appMenu' }, { role: 'editMenu' }, { role: 'windowMenu' }],
    ]);
  });

  it('quits when its window is closed, once all is written', async () => {
    const { electron } = await testApp();
    electron.window.emit('close');
    electron.window.webContents.destroyed = true;
    electron.window.emit('closed');
    electron.app.emit('window-all-closed');
    expect(electron.app.done.at(-1)).toBe('stay');
    await vi.waitFor(() => {
      expect(electron.app.done.at(-1)).toBe('quit');
    });
  });

  it('stops the run of a window that is closed', async () => {
    const { electron } = await testApp();
    const job = jobOf({ materials: metals(40), loads: loadCases(30) });
    electron.send(electron.callFrom(), 'wringwall:follow:size', 1, { job });
    const page = electron.window.webContents;
    await vi.waitFor(() => {
      expect(page.sent.length).toBeGreaterThan(0);
    });
    page.destroyed = true;
    electron.window.emit('closed');
    const heard = page.sent.length;
    await new Promise((resolve) => setTimeout(resolve, 100));
    expect(page.sent).toHaveLength(heard);
  });
});

describe('the scheme', () => {
  it('serves the window with the policy, and nothing else', async () => {
    const answer = (await testApp()).electron.protocols.get('wringwall');
    const got = answer?.({ url: PAGE, method: 'GET' });
    expect(got?.status).toBe(200);
    expect(got?.headers.get('content-security-policy')).toContain("default-src 'none'");
    expect(got?.headers.get('content-type')).toBe('text/html; charset=utf-8');
    expect(answer?.({ url: `${PAGE}package.json`, method: 'GET' }).status).toBe(404);
    expect(answer?.({ url: `${PAGE}../main/app.js`, method: 'GET' }).status).toBe(404);
    expect(answer?.({ url: 'wringwall://other/', method: 'GET' }).status).toBe(403);
    expect(answer?.({ url: PAGE, method: 'POST' }).status).toBe(405);
  });
});

const ASK = 'wringwall:ask:begin';
const FOLLOW = 'wringwall:follow:size';

describe('a call', () => {
  const strangers: readonly (readonly [string, Parameters<ElectronDouble['callFrom']>[0]])[] = [
    ['another page', { sender: new PageDouble(2) }],
    ['a frame that is gone', { senderFrame: null }],
    ['a frame within the page', { senderFrame: { url: PAGE, parent: { url: PAGE, parent: null } } }],
    ['a page from elsewhere', { senderFrame: { url: 'https://wringwall.example/', parent: null } }],
    ['another host of the scheme', { senderFrame: { url: 'wringwall://other/', parent: null } }],
    ['a frame without an address', { senderFrame: { url: '', parent: null } }],
  ];

  it.each(strangers)('from %s is refused, and the log says so', async (_name, own) => {
    const { electron, log } = await testApp();
    const call = electron.callFrom(own);
    expect(await electron.invoke(call, ASK, null)).toMatchObject({ refusal: { code: 'not-allowed' } });
    expect(await electron.invoke(call, 'wringwall:ask:remember', {})).toMatchObject({
      refusal: { code: 'not-allowed' },
    });
    electron.send(call, FOLLOW, 1, { job: jobOf() });
    electron.send(call, 'wringwall:stop:size', 1);
    expect(electron.window.webContents.sent).toEqual([]);
    expect(log).toEqual(
      [ASK, 'wringwall:ask:remember', FOLLOW, 'wringwall:stop:size'].map(
        (channel) => `refused ${channel}: The call does not come from the window.`,
      ),
    );
  });

  it('is refused when the window is closed', async () => {
    const { electron } = await testApp();
    electron.window.emit('closed');
    expect(await electron.invoke(electron.callFrom(), ASK, null)).toMatchObject({ refusal: { code: 'not-allowed' } });
  });

  it('by another name reaches nothing', async () => {
    const { electron } = await testApp();
    expect([...electron.handlers.keys()]).toEqual([ASK, 'wringwall:ask:remember', 'wringwall:ask:check']);
    expect([...electron.listeners.keys()]).toEqual([FOLLOW, 'wringwall:stop:size']);
  });

  it('with wrong arguments is refused, and the log says why', async () => {
    const { electron, log } = await testApp();
    const call = electron.callFrom();
    expect(await electron.invoke(call, ASK, 1)).toMatchObject({ refusal: { code: 'bad-arguments' } });
    expect(await electron.invoke(call, 'wringwall:ask:remember', new Map())).toMatchObject({
      refusal: { code: 'bad-arguments' },
    });
    expect(log).toHaveLength(2);
    expect(log[0]).toBe(`refused ${ASK}: This call takes no arguments; expected null.`);
  });

  it.each([0, -1, 1.5, '1', null, {}, NaN])('to follow under the number %s is refused', async (run) => {
    const { electron, log } = await testApp();
    electron.send(electron.callFrom(), FOLLOW, run, { job: jobOf() });
    const [[, , line] = []] = electron.window.webContents.sent;
    expect(line).toMatchObject({ refusal: { code: 'bad-arguments' } });
    expect(log).toEqual([`refused ${FOLLOW}: The run has no number of its own.`]);
  });

  it('to follow under a number that is in use is refused', async () => {
    const { electron, log } = await testApp();
    electron.send(electron.callFrom(), FOLLOW, 1, { job: jobOf() });
    electron.send(electron.callFrom(), FOLLOW, 1, { job: jobOf() });
    expect(log).toEqual([`refused ${FOLLOW}: The run has no number of its own.`]);
  });

  it('to follow with wrong arguments is refused, and frees its number', async () => {
    const { electron, log } = await testApp();
    electron.send(electron.callFrom(), FOLLOW, 1, { work: 1 });
    electron.send(electron.callFrom(), FOLLOW, 1, null);
    expect(electron.window.webContents.sent.map(([, run]) => run)).toEqual([1, 1]);
    expect(log).toEqual([
      `refused ${FOLLOW}: Expected an object with a job and nothing else.`,
      `refused ${FOLLOW}: Expected an object with a job.`,
    ]);
  });

  it('to stop what does not run does nothing', async () => {
    const { electron, log } = await testApp();
    electron.send(electron.callFrom(), 'wringwall:stop:size', 9);
    electron.send(electron.callFrom(), 'wringwall:stop:size', { toString: null });
    expect(log).toEqual([]);
  });
});

it('a page that is loaded anew hears nothing of the runs before it', async () => {
  const { electron } = await testApp();
  const page = electron.window.webContents;
  const job = jobOf({ materials: metals(40), loads: loadCases(30) });
  electron.send(electron.callFrom(), FOLLOW, 1, { job });
  page.emit('did-navigate');
  const heard = page.sent.length;
  electron.send(electron.callFrom(), FOLLOW, 1, { job: jobOf() });
  await vi.waitFor(() => {
    expect(page.sent.slice(heard).some(([, , line]) => 'end' in (line as object))).toBe(true);
  });
  const ends = page.sent.slice(heard).flatMap(([, , line]) => ('end' in (line as object) ? [line] : []));
  expect(ends).toMatchObject([{ end: { kind: 'report' } }]);
});
