import path from 'node:path';
import type { Desk, WindowService } from '../calls/desk.js';
import type { Memory } from '../calls/memory.js';
import type { WindowFiles } from '../windowFiles.js';
import type { BrowserWindowApi, ElectronApi } from './electronApi.js';
import { answerFrom, SCHEME } from './files.js';
import { handleCalls, openPage, stopAll, type OpenPage } from './handlers.js';
import { refusePowers } from './security.js';
import { bringForward, loadPage, makeWindow } from './window.js';

/** What the app is made of. */
export interface AppMeans {
  /** the app's own folder */
  readonly folder: string;
  /** full path of the built preload */
  readonly preload: string;
  readonly platform: NodeJS.Platform;
  readonly files: () => Promise<WindowFiles>;
  readonly desk: () => Promise<Desk>;
  /** where the window stood */
  readonly placement: Memory;
  readonly log: (line: string) => void;
}

interface Opened extends OpenPage {
  readonly window: BrowserWindowApi;
  readonly service: WindowService;
}

/** What must be settled before the app is ready. */
function prepare({ app, protocol, Menu }: ElectronApi, { platform }: AppMeans): void {
  app.enableSandbox();
  protocol.registerSchemesAsPrivileged([{ scheme: SCHEME, privileges: { standard: true, secure: true } }]);
  if (platform === 'darwin') Menu.macMenu([{ role: 'appMenu' }, { role: 'editMenu' }, { role: 'windowMenu' }]);
  else Menu.setApplicationMenu(null);
}

async function openWindow(api: ElectronApi, means: AppMeans, desk: Desk): Promise<Opened> {
  const window = await makeWindow(api, means.preload, means.placement);
  const service = desk.openWindow();
  const opened = { ...openPage(window.webContents, service), window, service };
  // a page that is loaded anew hears nothing of the runs of the one before it
  window.webContents.on('did-navigate', () => {
    stopAll(opened);
  });
  return opened;
}

/** Ends workers and writes what waits, then lets the app quit. */
function quitInOrder({ app }: ElectronApi, settle: () => Promise<unknown>): void {
  let isSettled = false;
  app.on('before-quit', (event) => {
    if (isSettled) return;
    event.preventDefault();
    void settle().finally(() => {
      isSettled = true;
      app.quit();
    });
  });
  app.on('window-all-closed', () => {
    app.quit();
  });
}

/** Runs the app: one instance, one window, until it is closed. */
export async function runApp(api: ElectronApi, means: AppMeans): Promise<void> {
  const { app, protocol, session, ipcMain } = api;
  // the lock lies in this folder, which is the browser's part of the app's own
  app.setPath('userData', path.join(means.folder, 'electron'));
  if (!app.requestSingleInstanceLock()) {
    app.quit();
    return;
  }
  let opened: Opened | null = null;
  const current = (): Opened | null => opened;
  prepare(api, means);
  app.on('second-instance', () => {
    if (opened !== null) bringForward(opened.window);
  });
  await app.whenReady();
  const [files, desk] = await Promise.all([means.files(), means.desk()]);
  refusePowers(session.defaultSession);
  protocol.handle(SCHEME, answerFrom(files));
  handleCalls(ipcMain, current, means.log);
  quitInOrder(api, () => Promise.all([current()?.service.close(), desk.settled(), means.placement.settled()]));
  opened = await openWindow(api, means, desk);
  opened.window.on('closed', () => {
    const gone = opened;
    opened = null;
    if (gone === null) return;
    stopAll(gone);
    void gone.service.close();
  });
  await loadPage(opened.window);
}
