import type { Rectangle } from './bounds.js';

/** The part of an event that the desk looks at. */
export interface Refusable {
  preventDefault(): void;
}

/** A frame of a page, as far as it tells who speaks. */
export interface FrameApi {
  readonly url: string;
  readonly parent: FrameApi | null;
}

/** A call from a page. */
export interface IpcCall {
  readonly sender: WebContentsApi;
  /** null where the frame is gone already */
  readonly senderFrame: FrameApi | null;
}

/** The page of a window. */
export interface WebContentsApi {
  readonly id: number;
  isDestroyed(): boolean;
  send(channel: string, ...args: readonly unknown[]): void;
  setWindowOpenHandler(handler: () => { action: 'deny' }): void;
  on(event: 'will-navigate' | 'will-attach-webview', listener: (event: Refusable) => void): unknown;
  on(event: 'did-navigate' | 'destroyed', listener: () => void): unknown;
}

/** How a window is made. */
export interface WindowOptions extends Partial<Rectangle> {
  readonly width: number;
  readonly height: number;
  readonly minWidth: number;
  readonly minHeight: number;
  readonly title: string;
  readonly show: boolean;
  readonly autoHideMenuBar: boolean;
  readonly webPreferences: {
    readonly preload: string;
    readonly contextIsolation: boolean;
    readonly sandbox: boolean;
    readonly nodeIntegration: boolean;
    readonly nodeIntegrationInWorker: boolean;
    readonly nodeIntegrationInSubFrames: boolean;
    readonly webSecurity: boolean;
    readonly allowRunningInsecureContent: boolean;
    readonly webviewTag: boolean;
    readonly spellcheck: boolean;
  };
}

/** A window. */
export interface BrowserWindowApi {
  readonly webContents: WebContentsApi;
  loadURL(url: string): Promise<void>;
  show(): void;
  focus(): void;
  restore(): void;
  isMinimized(): boolean;
  isMaximized(): boolean;
  maximize(): void;
  getNormalBounds(): Rectangle;
  on(event: 'close' | 'closed', listener: () => void): unknown;
  once(event: 'ready-to-show', listener: () => void): unknown;
}

/** What is told of a page that asks for a power, such as the camera. */
export interface SessionApi {
  setPermissionRequestHandler(
    handler: (webContents: unknown, permission: string, callback: (granted: boolean) => void) => void,
  ): void;
  setPermissionCheckHandler(handler: () => boolean): void;
  setDevicePermissionHandler(handler: () => boolean): void;
  on(event: 'will-download', listener: (event: Refusable) => void): unknown;
}

/** An entry of a menu, by the role that the system knows. */
export interface MenuEntry {
  readonly role: 'appMenu' | 'editMenu' | 'windowMenu';
}

/** What the desk uses of Electron, and no more: a test stands in for it. */
export interface ElectronApi {
  readonly app: {
    requestSingleInstanceLock(): boolean;
    quit(): void;
    exit(code: number): void;
    setPath(name: 'userData', path: string): void;
    enableSandbox(): void;
    whenReady(): Promise<void>;
    on(event: 'second-instance' | 'window-all-closed', listener: () => void): unknown;
    on(event: 'before-quit', listener: (event: Refusable) => void): unknown;
  };
  readonly BrowserWindow: new (options: WindowOptions) => BrowserWindowApi;
  readonly ipcMain: {
    handle(channel: string, listener: (call: IpcCall, ...args: readonly unknown[]) => Promise<unknown>): void;
    on(channel: string, listener: (call: IpcCall, ...args: readonly unknown[]) => void): unknown;
  };
  readonly protocol: {
    registerSchemesAsPrivileged(
      schemes: { scheme: string; privileges: { standard: boolean; secure: boolean } }[],
    ): void;
    handle(scheme: string, handler: (request: { readonly url: string; readonly method: string }) => Response): void;
  };
  readonly session: { readonly defaultSession: SessionApi };
  readonly screen: { getDisplayMatching(rectangle: Rectangle): { readonly workArea: Rectangle } };
  readonly Menu: {
    setApplicationMenu(menu: null): void;
    macMenu(entries: readonly MenuEntry[]): void;
  };
}
