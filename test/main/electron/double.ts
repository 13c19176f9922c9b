import type {
  BrowserWindowApi,
  ElectronApi,
  FrameApi,
  IpcCall,
  MenuEntry,
  Refusable,
  SessionApi,
  WebContentsApi,
  WindowOptions,
} from '../../../main/electron/electronApi.js';
import type { Rectangle } from '../../../main/electron/bounds.js';
import type { PreloadIpc } from '../../../main/electron/exposed.js';
import { PAGE } from '../../../main/electron/files.js';

type Listener = (...args: readonly never[]) => unknown;

/** Listeners by event, as every part of Electron has them. */
class Emitter {
  readonly #listeners = new Map<string, Listener[]>();

  on = (event: string, listener: Listener): void => {
    this.#listeners.set(event, [...(this.#listeners.get(event) ?? []), listener]);
  };

  once = this.on;

  emit(event: string, ...args: readonly unknown[]): void {
    for (const listener of this.#listeners.get(event) ?? []) listener(...(args as never[]));
  }

  /** Whether an event that may be refused was refused. */
  isRefused(event: string): boolean {
    let refused = false;
    const refusable: Refusable = {
      preventDefault: () => {
        refused = true;
      },
    };
    this.emit(event, refusable);
    return refused;
  }
}

/** A page that notes what is sent to it. */
export class PageDouble extends Emitter implements WebContentsApi {
  readonly sent: (readonly [channel: string, ...args: readonly unknown[]])[] = [];
  readonly frame: FrameApi = { url: PAGE, parent: null };
  readonly preloads: ((channel: string, args: readonly unknown[]) => void)[] = [];
  openHandler: (() => { action: 'deny' }) | null = null;
  destroyed = false;

  constructor(readonly id = 1) {
    super();
  }

  isDestroyed = (): boolean => this.destroyed;

  send = (channel: string, ...args: readonly unknown[]): void => {
    if (this.destroyed) throw new Error('Object has been destroyed');
    const crossed = structuredClone(args);
    this.sent.push([channel, ...crossed]);
    for (const preload of this.preloads) preload(channel, crossed);
  };

  setWindowOpenHandler = (handler: () => { action: 'deny' }): void => {
    this.openHandler = handler;
  };
}

/** A window that notes what is done to it. */
export class WindowDouble extends Emitter implements BrowserWindowApi {
  readonly webContents = new PageDouble();
  readonly done: string[] = [];
  minimized = false;
  maximized = false;
  bounds: Rectangle = { x: 10, y: 20, width: 1000, height: 700 };

  constructor(readonly options: WindowOptions) {
    super();
  }

  loadURL = (url: string): Promise<void> => {
    this.done.push(`load ${url}`);
    return Promise.resolve();
  };
  show = (): void => void this.done.push('show');
  focus = (): void => void this.done.push('focus');
  restore = (): void => void this.done.push('restore');
  maximize = (): void => void this.done.push('maximize');
  isMinimized = (): boolean => this.minimized;
  isMaximized = (): boolean => this.maximized;
  getNormalBounds = (): Rectangle => this.bounds;
}

class SessionDouble extends Emitter implements SessionApi {
  request: Parameters<SessionApi['setPermissionRequestHandler']>[0] | null = null;
  check: (() => boolean) | null = null;
  device: (() => boolean) | null = null;

  setPermissionRequestHandler: SessionApi['setPermissionRequestHandler'] = (handler) => {
    this.request = handler;
  };
  setPermissionCheckHandler: SessionApi['setPermissionCheckHandler'] = (handler) => {
    this.check = handler;
  };
  setDevicePermissionHandler: SessionApi['setDevicePermissionHandler'] = (handler) => {
    this.device = handler;
  };
}

class AppDouble extends Emitter {
  readonly done: string[] = [];
  isFirst = true;

  requestSingleInstanceLock = (): boolean => {
    this.done.push('lock');
    return this.isFirst;
  };
  /** as Electron does: asks first whether it may, then goes */
  quit = (): void => {
    this.done.push(this.isRefused('before-quit') ? 'stay' : 'quit');
  };
  exit = (code: number): void => void this.done.push(`exit ${String(code)}`);
  setPath = (name: string, path: string): void => void this.done.push(`path ${name} ${path}`);
  enableSandbox = (): void => void this.done.push('sandbox');
  whenReady = (): Promise<void> => {
    this.done.push('ready');
    return Promise.resolve();
  };
}

/** Electron, as far as the desk uses it: it notes what it is told, and a test plays the user and the page. */
export class ElectronDouble {
  readonly app = new AppDouble();
  readonly session = { defaultSession: new SessionDouble() };
  readonly windows: WindowDouble[] = [];
  readonly handlers = new Map<string, Parameters<ElectronApi['ipcMain']['handle']>[1]>();
  readonly listeners = new Map<string, Parameters<ElectronApi['ipcMain']['on']>[1]>();
  readonly schemes: unknown[] = [];
  readonly menus: (readonly MenuEntry[] | null)[] = [];
  readonly protocols = new Map<string, Parameters<ElectronApi['protocol']['handle']>[1]>();
  workArea: Rectangle = { x: 0, y: 0, width: 1920, height: 1040 };

  readonly api: ElectronApi;

  constructor() {
    const note = (window: WindowDouble): void => void this.windows.push(window);
    this.api = {
      app: this.app,
      session: this.session,
      BrowserWindow: class extends WindowDouble {
        constructor(options: WindowOptions) {
          super(options);
          note(this);
        }
      },
      ipcMain: {
        handle: (channel, listener) => this.handlers.set(channel, listener),
        on: (channel, listener) => this.listeners.set(channel, listener),
      },
      protocol: {
        registerSchemesAsPrivileged: (schemes) => void this.schemes.push(...schemes),
        handle: (scheme, handler) => this.protocols.set(scheme, handler),
      },
      screen: { getDisplayMatching: () => ({ workArea: this.workArea }) },
      Menu: {
        setApplicationMenu: (menu) => void this.menus.push(menu),
        macMenu: (entries) => void this.menus.push(entries),
      },
    };
  }

  /** The one window that is open. */
  get window(): WindowDouble {
    const [window] = this.windows;
    if (window === undefined) throw new Error('no window was opened');
    return window;
  }

  /** A call from the page of the open window, or as a test would have it. */
  callFrom(own: Partial<IpcCall> = {}): IpcCall {
    const page = this.window.webContents;
    return { sender: page, senderFrame: page.frame, ...own };
  }

  async invoke(call: IpcCall, channel: string, ...args: readonly unknown[]): Promise<unknown> {
    const handler = this.handlers.get(channel);
    if (handler === undefined) throw new Error(`No handler registered for '${channel}'`);
    return structuredClone(await handler(call, ...structuredClone(args)));
  }

  send(call: IpcCall, channel: string, ...args: readonly unknown[]): void {
    this.listeners.get(channel)?.(call, ...structuredClone(args));
  }

  /** What the preload of the open window's page speaks to. */
  preloadIpc(): PreloadIpc {
    return {
      invoke: (channel, ...args) => this.invoke(this.callFrom(), channel, ...args),
      send: (channel, ...args) => {
        this.send(this.callFrom(), channel, ...args);
      },
      on: (channel, listener) =>
        this.window.webContents.preloads.push((heard, args) => {
          if (heard === channel) listener({}, ...args);
        }),
    };
  }
}
