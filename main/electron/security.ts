import type { IpcCall, SessionApi, WebContentsApi, WindowOptions } from './electronApi.js';
import { isOwnPage } from './files.js';

/** How the window's page runs: apart from the preload, in the system's sandbox, without Node. */
export function webPreferences(preload: string): WindowOptions['webPreferences'] {
  return {
    preload,
    contextIsolation: true,
    sandbox: true,
    nodeIntegration: false,
    nodeIntegrationInWorker: false,
    nodeIntegrationInSubFrames: false,
    webSecurity: true,
    allowRunningInsecureContent: false,
    webviewTag: false,
    spellcheck: false,
  };
}

/** Refuses every power and every download: the window needs none. */
export function refusePowers(session: SessionApi): void {
  session.setPermissionRequestHandler((_webContents, _permission, callback) => {
    callback(false);
  });
  session.setPermissionCheckHandler(() => false);
  session.setDevicePermissionHandler(() => false);
  session.on('will-download', (event) => {
    event.preventDefault();
  });
}

/** Keeps a page where it is: no other address, no other window, no page within the page. */
export function holdStill(page: WebContentsApi): void {
  page.setWindowOpenHandler(() => ({ action: 'deny' }));
  page.on('will-navigate', (event) => {
    event.preventDefault();
  });
  page.on('will-attach-webview', (event) => {
    event.preventDefault();
  });
}

/** Whether a call comes from the main frame of a window's own page. */
export function isOwnCall({ sender, senderFrame }: IpcCall, page: WebContentsApi): boolean {
  return sender === page && senderFrame !== null && senderFrame.parent === null && isOwnPage(senderFrame.url);
}
